import { clockRange } from '@/app/_ui/clock';
import type { Floor, ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import { formatDay, formatMoney, type LocalDate } from '@/modules/units';

interface Dates {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
}

/** One row of the floors table. */
export interface FloorRow {
  readonly floor: Floor;
  readonly skillName: string;
  /** The shift kind whose hours the floor has, if any: people call the floor by it. */
  readonly kind: ShiftKind | null;
  readonly times: string;
  /** What sets the floor apart: wished, shared, holds only from or to a day. */
  readonly marks: readonly string[];
  readonly isFirstOfSkill: boolean;
}

/** Weekdays and the holiday column, in full. */
export const columnNames = [
  'Monday',
  'Tuesday',
  'Wednesday',
  'Thursday',
  'Friday',
  'Saturday',
  'Sunday',
  'Holiday',
] as const;

/** The floors that hold on any day of a period. */
export const floorsIn = (floors: readonly Floor[], { startsOn, endsOn }: Dates): Floor[] =>
  floors.filter(
    ({ effectiveFrom, effectiveTo }) =>
      effectiveFrom <= endsOn && (effectiveTo === null || startsOn <= effectiveTo),
  );

/** Rows in the order of the team's skills, floors for anybody last; within a skill as given. */
export function floorRows(
  floors: readonly Floor[],
  skills: readonly Skill[],
  kinds: readonly ShiftKind[],
  period: Dates,
  currency: string,
): FloorRow[] {
  return [...skills, null].flatMap((skill) =>
    floors
      .filter(({ skillId }) => skillId === (skill?.id ?? null))
      .map((floor, index) => ({
        floor,
        skillName: skill?.name ?? 'Anybody',
        kind: kindOf(floor, kinds),
        times: clockRange(floor.startMinute, floor.endMinute),
        marks: marksOf(floor, period, currency),
        isFirstOfSkill: index === 0,
      })),
  );
}

/** The shift kind with exactly the hours of a floor, or null. */
export const kindOf = (
  floor: Pick<Floor, 'startMinute' | 'endMinute'>,
  kinds: readonly ShiftKind[],
): ShiftKind | null =>
  kinds.find(
    ({ startMinute, endMinute }) =>
      startMinute === floor.startMinute && endMinute === floor.endMinute,
  ) ?? null;

/** A row in a sentence: `Vet Night 23:00–07:00`, with its marks where it has any. */
export function rowName({ skillName, kind, times, marks }: FloorRow): string {
  const name = [skillName, kind?.name, times].filter(Boolean).join(' ');
  return [name, ...marks].join(', ');
}

/** A cell in full: `Vet, Early 07:00–15:00, Monday, 1`. */
export function cellName(row: FloorRow, column: number, people: number): string {
  const window = row.kind ? `${row.kind.name} ${row.times}` : row.times;
  return [row.skillName, window, ...row.marks, columnNames[column], people].join(', ');
}

function marksOf(floor: Floor, period: Dates, currency: string): string[] {
  const marks: string[] = [];
  const { priceCentsPerHour: price, effectiveFrom, effectiveTo } = floor;
  if (price !== null) {
    const digits = price % 100 === 0 ? 0 : 2;
    marks.push(`wished, ${formatMoney(price, currency, 'en-GB', digits)} an hour`);
  }
  if (floor.counting === 'shared') marks.push('shared');
  if (effectiveFrom > period.startsOn) marks.push(`from ${formatDay(effectiveFrom)}`);
  if (effectiveTo !== null && effectiveTo < period.endsOn) {
    marks.push(`to ${formatDay(effectiveTo)}`);
  }
  return marks;
}
