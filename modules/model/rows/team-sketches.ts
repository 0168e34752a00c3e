import type { Problem, TeamRule } from '../../problem';
import { assertNever } from '../../units';
import type { CoverIndex } from '../cover-index';
import type { Entry } from '../model-builder';
import { constantPay, shiftPay } from '../pay';
import type { PersonWork, WorkColumn } from '../work-columns';
import type { OvertimeColumn } from './hours-rows';
import type { TeamEntry, TeamRow } from './team-rows';

/** What team rules are made of. */
export interface TeamParts {
  readonly problem: Problem;
  readonly works: readonly PersonWork[];
  readonly index: CoverIndex;
  readonly overtimes: readonly (readonly OvertimeColumn[])[];
}

/** A row of a team rule before it is in the model. A missing bound is none. */
export type TeamSketch = Partial<Pick<TeamRow, 'lower' | 'upper' | 'others'>> &
  Pick<TeamRow, 'at' | 'entries'>;

/** The rows that a rule asks for; what each kind counts stands with its function. */
export function sketchTeamRows(rule: TeamRule, parts: TeamParts): TeamSketch[] {
  switch (rule.kind) {
    case 'together':
      return togetherRows(parts, rule.personIds);
    case 'apart':
      return apartRows(parts, rule.personIds);
    case 'mostFree':
      return freeRows(parts, rule.personIds, rule.most);
    case 'budget':
      return [budgetRow(parts, rule.mostCents)];
    case 'linear':
      return [linearRow(parts, rule)];
    default:
      return assertNever(rule);
  }
}

/** Together: on each shift work(first) - work(second) = 0. */
function togetherRows(
  { problem, index }: TeamParts,
  [first, second]: readonly [string, string],
): TeamSketch[] {
  const one = problem.people.findIndex(({ id }) => id === first);
  const other = problem.people.findIndex(({ id }) => id === second);
  return problem.shifts.flatMap((shift) => {
    const works = index.onShift(shift.index);
    const entries = works.flatMap((work): TeamEntry[] => {
      const sign = (work.personIndex === one ? 1 : 0) - (work.personIndex === other ? 1 : 0);
      return sign === 0 ? [] : [{ work, coefficient: sign }];
    });
    return entries.length === 0 ? [] : [{ at: shift.index, entries, lower: 0, upper: 0 }];
  });
}

/** Apart: at each minute at which a shift starts, sum of work on duty then <= 1. */
function apartRows({ problem, index }: TeamParts, personIds: readonly string[]): TeamSketch[] {
  const members = membersOf(problem, personIds);
  const minutes = [...new Set(problem.shifts.map(({ startMinute }) => startMinute))].sort(
    (one, other) => one - other,
  );
  return minutes.flatMap((startMinute) => {
    const covering = index.covering({ startMinute, endMinute: startMinute + 1 }, (work) =>
      members.has(work.personIndex),
    );
    if (new Set(covering.map(({ personIndex }) => personIndex)).size < 2) return [];
    return [{ at: startMinute, entries: countOnce(covering), upper: 1 }];
  });
}

/** Most free: on each day sum of work >= number of people - most. */
function freeRows({ problem, works }: TeamParts, personIds: readonly string[], most: number) {
  const members = membersOf(problem, personIds);
  const lower = members.size - most;
  if (lower <= 0) return [];
  return problem.days.map((_, dayIndex): TeamSketch => {
    const working = [...members].flatMap((person) => works[person]?.byDay[dayIndex] ?? []);
    return { at: dayIndex, entries: countOnce(working), lower };
  });
}

/** Budget: pay of shifts, contracts and overtime <= mostCents. Pay here is not rounded. */
function budgetRow({ problem, works, overtimes }: TeamParts, mostCents: number): TeamSketch {
  const entries = works.flatMap(({ person, columns }) =>
    columns.map((work) => ({ work, coefficient: shiftPay(problem, person, work.shift) })),
  );
  const others = overtimes.flat().map((step): Entry => [step.column, step.centsPerMinute]);
  const constant = works.reduce((sum, { person }) => sum + constantPay(person), 0);
  return {
    at: null,
    entries: entries.filter(({ coefficient }) => coefficient !== 0),
    others,
    upper: mostCents - constant,
  };
}

/** Linear: least <= sum of coefficient x work(person, shift, any post) <= most. */
function linearRow(
  { problem, works }: TeamParts,
  { terms, least, most }: Extract<TeamRule, { kind: 'linear' }>,
): TeamSketch {
  const indexOf = new Map(problem.people.map(({ id }, index) => [id, index]));
  const coefficients = new Map<WorkColumn, number>();
  for (const { personId, shiftIndex, coefficient } of terms) {
    const person = works[indexOf.get(personId) ?? -1];
    const dayIndex = problem.shifts[shiftIndex]?.dayIndex ?? -1;
    for (const work of person?.byDay[dayIndex] ?? []) {
      if (work.shift.index !== shiftIndex) continue;
      coefficients.set(work, (coefficients.get(work) ?? 0) + coefficient);
    }
  }
  return {
    at: null,
    entries: [...coefficients].map(([work, coefficient]) => ({ work, coefficient })),
    ...(least === null ? {} : { lower: least }),
    ...(most === null ? {} : { upper: most }),
  };
}

const membersOf = ({ people }: Problem, personIds: readonly string[]): Set<number> =>
  new Set(people.flatMap(({ id }, index) => (personIds.includes(id) ? [index] : [])));

const countOnce = (works: readonly WorkColumn[]): TeamEntry[] =>
  works.map((work) => ({ work, coefficient: 1 }));
