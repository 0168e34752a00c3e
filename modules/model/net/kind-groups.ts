import { type Problem, type ProblemPerson, type ProblemShift, rulesOf } from '../../problem';
import { marksWeekend } from '../weekend-marks';

/**
 * Shift kinds that no rule of a person can tell apart, as one group: the same minutes and marks on every
 * day, the same kinds allowed before and after. Group 0 is a day off. Arrays are by day x group count +
 * group.
 */
export interface KindGroups {
  readonly groupCount: number;
  /** By shift index; -1 for a kind this person never works. */
  readonly groupOfShift: Int16Array;
  readonly minutes: Int32Array;
  readonly isNight: Uint8Array;
  readonly marksWeekend: Uint8Array;
  /** By group: the limited kind it consists of, as a position in the person's kindLimits, or -1. */
  readonly limitOf: Int16Array;
  /** A shift of the group on that day, or null: of group 0, or when no kind of it is offered. */
  readonly shiftOn: (group: number, dayIndex: number) => ProblemShift | null;
}

interface Kind {
  readonly kindId: string;
  readonly byDay: readonly (ProblemShift | null)[];
  readonly limit: number;
}

/** Groups the kinds a person may ever work. */
export function groupKinds(
  problem: Problem,
  person: ProblemPerson,
  workable: ReadonlySet<string>,
): KindGroups {
  const kinds = [...workable].map((kindId) => readKind(problem, person, kindId));
  const keys = kinds.map((kind) => keyOf(problem, person, kind, kinds));
  const countsFriday = rulesOf(problem, person).weekendCountsFridayNight;
  const groups = [...new Set(keys)];
  const groupCount = groups.length + 1;
  const members = groups.map((key) => kinds.filter((_, index) => keys[index] === key));
  const size = problem.days.length * groupCount;
  const made = {
    groupCount,
    groupOfShift: new Int16Array(problem.shifts.length).fill(-1),
    minutes: new Int32Array(size),
    isNight: new Uint8Array(size),
    marksWeekend: new Uint8Array(size),
    limitOf: Int16Array.from([-1, ...members.map(([kind]) => kind?.limit ?? -1)]),
  };
  const shifts: (ProblemShift | null)[] = new Array(size).fill(null);
  members.forEach((list, position) => {
    for (const shift of list.flatMap(({ byDay }) => byDay)) {
      if (!shift) continue;
      const at = shift.dayIndex * groupCount + position + 1;
      made.groupOfShift[shift.index] = position + 1;
      made.minutes[at] = shift.paidMinutes;
      made.isNight[at] = shift.isNight ? 1 : 0;
      made.marksWeekend[at] = marksWeekend(problem, countsFriday, shift) ? 1 : 0;
      shifts[at] ??= shift;
    }
  });
  return { ...made, shiftOn: (group, day) => shifts[day * groupCount + group] ?? null };
}

function readKind(problem: Problem, person: ProblemPerson, kindId: string): Kind {
  const byDay: (ProblemShift | null)[] = problem.days.map(() => null);
  for (const shift of problem.shifts) {
    if (shift.kindId === kindId) byDay[shift.dayIndex] = shift;
  }
  // Of several limits on one kind the tightest says it all.
  const limits = person.kindLimits
    .map((one, position) => ({ ...one, position }))
    .filter((one) => one.kindId === kindId && one.most < problem.days.length)
    .sort((one, other) => one.most - other.most);
  const limit = limits[0]?.position ?? -1;
  return { kindId, byDay, limit };
}

/** Two kinds with the same key are interchangeable: everything a rule reads of them, day by day. */
function keyOf(
  problem: Problem,
  person: ProblemPerson,
  kind: Kind,
  kinds: readonly Kind[],
): string {
  const countsFriday = rulesOf(problem, person).weekendCountsFridayNight;
  const reach = restReachDays(problem, person);
  const own = kind.byDay.map((shift) => {
    if (!shift) return '-';
    const isWeekend = marksWeekend(problem, countsFriday, shift);
    const around = neighbours(problem, person, shift, kinds, reach);
    return `${shift.paidMinutes},${shift.isNight},${isWeekend},${around}`;
  });
  return `${kind.limit}|${own.join(';')}`;
}

/** Which kinds may come before and after a shift, on the nearest days on which it matters. */
function neighbours(
  problem: Problem,
  person: ProblemPerson,
  shift: ProblemShift,
  kinds: readonly Kind[],
  reachDays: number,
): string {
  const flags: number[] = [];
  for (let distance = 1; distance <= reachDays; distance += 1) {
    for (const { byDay } of kinds) {
      const before = byDay[shift.dayIndex - distance];
      const after = byDay[shift.dayIndex + distance];
      flags.push(!before || mayFollow(problem, person, before, shift) ? 1 : 0);
      flags.push(!after || mayFollow(problem, person, shift, after) ? 1 : 0);
    }
  }
  return flags.join('');
}

/** How many days after a shift its rest can still stand in the way of another; at least one. */
export function restReachDays(problem: Problem, person: ProblemPerson): number {
  const { restMinutes } = rulesOf(problem, person);
  const starts = problem.days.map(({ startMinute }) => startMinute);
  const reach = problem.shifts.map(
    ({ dayIndex, endMinute }) =>
      starts.filter((start, day) => day > dayIndex && start < endMinute + restMinutes).length,
  );
  return Math.max(1, ...reach);
}

/** Rest, and kinds that may not follow each other on the next day. */
export function mayFollow(
  problem: Problem,
  person: ProblemPerson,
  before: ProblemShift,
  after: ProblemShift,
): boolean {
  const rules = rulesOf(problem, person);
  if (after.startMinute - before.endMinute < rules.restMinutes) return false;
  if (after.dayIndex !== before.dayIndex + 1) return true;
  return !rules.kindsThatMayNotFollow.some(
    ({ kindId, nextKindId }) => kindId === before.kindId && nextKindId === after.kindId,
  );
}
