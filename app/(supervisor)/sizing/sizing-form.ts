import { z } from 'zod';
import { readAmount, writeAmount } from '@/app/_ui/amount';
import type { ShiftKind } from '@/modules/coverage';
import { type SizingInput, type SizingLine, sizingInputSchema } from '@/modules/sizing';

/** A line as it is typed: text until it is read, so that nothing typed is lost. */
export interface LineForm {
  id: string;
  name: string;
  shiftKindId: string;
  /** Empty: any skill. */
  skillId: string;
  daysOn: string;
  startWeekdays: string[];
  weekdayCents: string;
  saturdayCents: string;
  sundayCents: string;
  extraDayCents: string;
  mostPeople: string;
  mostPercent: string;
}

/** The sheet as it is typed. Fields are named as in `SizingInput`, so that its errors find them. */
export interface SizingForm {
  weekOf: string;
  span: string;
  objective: 'people' | 'pay';
  mostPeople: string;
  lines: LineForm[];
}

/** Reads what was typed and checks it with the schema that the route and the use-case share. */
export const sizingFormSchema = z
  .custom<SizingForm>()
  .transform(
    (form): SizingInput => ({
      weekOf: form.weekOf,
      span: form.span === 'week' ? 'week' : Number(form.span),
      objective: form.objective,
      mostPeople: readCount(form.mostPeople),
      lines: form.lines.map(readLine),
    }),
  )
  .pipe(sizingInputSchema);

/** What stands in the fields for an input; money with minor units, no limit as an empty field. */
export function toForm(input: SizingInput): SizingForm {
  return {
    weekOf: input.weekOf,
    span: String(input.span),
    objective: input.objective,
    mostPeople: writeCount(input.mostPeople),
    lines: input.lines.map((line) => ({
      ...line,
      skillId: line.skillId ?? '',
      daysOn: String(line.daysOn),
      startWeekdays: line.startWeekdays.map(String),
      weekdayCents: writeAmount(line.weekdayCents),
      saturdayCents: writeAmount(line.saturdayCents),
      sundayCents: writeAmount(line.sundayCents),
      extraDayCents: writeAmount(line.extraDayCents),
      mostPeople: writeCount(line.mostPeople),
      mostPercent: writeCount(line.mostPercent),
    })),
  };
}

/** A new line: the first shift kind, five days on, no pay yet. Its id is free in the table. */
export function emptyLine(lines: readonly LineForm[], kinds: readonly ShiftKind[]): LineForm {
  const numbers = lines.map(({ id }) => Number(/^line-(\d+)$/.exec(id)?.[1] ?? 0));
  return {
    id: `line-${Math.max(0, ...numbers) + 1}`,
    name: '',
    shiftKindId: kinds[0]?.id ?? '',
    skillId: '',
    daysOn: '5',
    startWeekdays: ['0', '1', '2', '3', '4', '5', '6'],
    weekdayCents: '',
    saturdayCents: '',
    sundayCents: '',
    extraDayCents: '',
    mostPeople: '',
    mostPercent: '',
  };
}

function readLine(line: LineForm): SizingLine {
  return {
    id: line.id,
    name: line.name,
    shiftKindId: line.shiftKindId,
    skillId: line.skillId || null,
    daysOn: readNumber(line.daysOn),
    startWeekdays: line.startWeekdays.map(Number),
    weekdayCents: readAmount(line.weekdayCents),
    saturdayCents: readAmount(line.saturdayCents),
    sundayCents: readAmount(line.sundayCents),
    extraDayCents: line.extraDayCents.trim() ? readAmount(line.extraDayCents) : null,
    mostPeople: readCount(line.mostPeople),
    mostPercent: readCount(line.mostPercent),
  };
}

/** NaN for anything but a number: the schema then names the field. */
const readNumber = (text: string): number => (text.trim() ? Number(text) : Number.NaN);

const readCount = (text: string): number | null => (text.trim() ? Number(text) : null);

const writeCount = (count: number | null): string => (count === null ? '' : String(count));
