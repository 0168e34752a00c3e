import type { ShiftKind } from '../coverage';
import type { SizingCap, SizingPattern, SizingProblem } from '../problem';
import {
  addDays,
  type FieldError,
  formatDay,
  mondayOf,
  type Outcome,
  ok,
  refuse,
  weekdayNames,
} from '../units';
import { placeOnCircle } from './circle';
import { cycleOf, expandFloors, type FloorSource } from './expand-floors';
import { findLineErrors } from './find-line-errors';
import type { SizingInput, SizingLine } from './sizing-input';

/** What a table of lines is read against: the team's shift kinds in use, its skills and its floors. */
export interface SizingSource extends FloorSource {
  readonly kinds: readonly ShiftKind[];
}

/** Days in a row that are paid as ordinary days; later ones may have their own pay. */
const ordinaryRunDays = 5;

/**
 * Turns the table into the covering model: one pattern for each line and first weekday, the floors of
 * a normal week (see `expandFloors`), and the limits on people. Minutes are of the wall clock, pay is
 * cents for one cycle. Refuses as `invalid` with one error a field when a line does not fit the team or
 * no floor asks for anybody. Model: set covering as in Dantzig's reply to Edie, JORSA 2(3), 1954.
 */
export function expandLines(input: SizingInput, source: SizingSource): Outcome<SizingProblem> {
  const floors = expandFloors(input, source);
  const errors = [...findLineErrors(input, source), ...findFloorErrors(input, floors.length)];
  if (errors.length > 0) {
    return refuse('invalid', errors.map(({ message }) => message).join(' '), errors);
  }
  return ok({
    version: 1,
    cycleMinutes: cycleOf(input.span),
    objective: input.objective,
    floors,
    patterns: input.lines.flatMap((line) => patternsOf(line, input.span, source.kinds)),
    caps: capsOf(input),
  });
}

function findFloorErrors({ span, weekOf }: SizingInput, floorCount: number): FieldError[] {
  if (floorCount > 0) return [];
  const when = formatDay(span === 'week' ? mondayOf(weekOf) : addDays(mondayOf(weekOf), span));
  return [
    {
      path: 'weekOf',
      message: `No floor asks for anybody ${span === 'week' ? 'in the week of' : 'on'} ${when}. Choose another week, or add floors.`,
    },
  ];
}

function patternsOf(
  line: SizingLine,
  span: SizingInput['span'],
  kinds: readonly ShiftKind[],
): SizingPattern[] {
  const kind = kinds.find(({ id }) => id === line.shiftKindId);
  if (!kind) return [];
  const patterns = line.startWeekdays
    .filter((first) => span === 'week' || first === span)
    .sort((one, other) => one - other)
    .map((first) => patternFrom(line, first, span, kind));
  return line.daysOn < 7 ? patterns : keepCheapest(patterns, line);
}

function patternFrom(
  line: SizingLine,
  first: number,
  span: SizingInput['span'],
  kind: ShiftKind,
): SizingPattern {
  const cycle = cycleOf(span);
  const days = Array.from({ length: line.daysOn }, (_, index) => (first + index) % 7);
  return {
    id: `${line.id}/${first}`,
    lineId: line.id,
    label: span === 'week' ? `${line.name}, from ${weekdayNames[first]}` : line.name,
    skillId: line.skillId,
    duties: days.map((day) =>
      placeOnCircle(day * 1440 + kind.startMinute, day * 1440 + kind.endMinute, cycle),
    ),
    costCents: days.reduce((sum, day, index) => sum + payOfDay(line, day, index), 0),
  };
}

/** Pay of one day: by weekday, or the pay of an extra day beyond the fifth in a row. */
function payOfDay(line: SizingLine, weekday: number, indexInRun: number): number {
  if (indexInRun >= ordinaryRunDays && line.extraDayCents !== null) return line.extraDayCents;
  if (weekday === 5) return line.saturdayCents;
  return weekday === 6 ? line.sundayCents : line.weekdayCents;
}

/** Seven days on is one pattern whatever the first day is; the first day that pays least stands for it. */
function keepCheapest(patterns: readonly SizingPattern[], line: SizingLine): SizingPattern[] {
  const [first, ...rest] = patterns;
  if (!first) return [];
  const cheapest = rest.reduce(
    (least, one) => (one.costCents < least.costCents ? one : least),
    first,
  );
  return [{ ...cheapest, label: `${line.name}, every day` }];
}

function capsOf(input: SizingInput): SizingCap[] {
  const everybody: SizingCap[] =
    input.mostPeople === null
      ? []
      : [
          {
            label: `At most ${input.mostPeople} people altogether`,
            lineIds: input.lines.map(({ id }) => id),
            limit: { people: input.mostPeople },
          },
        ];
  return [...everybody, ...input.lines.flatMap(capsOfLine)];
}

function capsOfLine({ id, name, mostPeople, mostPercent }: SizingLine): SizingCap[] {
  const people: SizingCap[] =
    mostPeople === null
      ? []
      : [
          {
            label: `At most ${mostPeople} people on ${name}`,
            lineIds: [id],
            limit: { people: mostPeople },
          },
        ];
  const percent: SizingCap[] =
    mostPercent === null
      ? []
      : [
          {
            label: `At most ${mostPercent} % of everybody on ${name}`,
            lineIds: [id],
            limit: { percentOfAll: mostPercent },
          },
        ];
  return [...people, ...percent];
}
