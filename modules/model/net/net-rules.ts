import { type Problem, type ProblemPerson, rulesOf } from '../../problem';
import { weekdayOf } from '../../units';
import { type KindGroups, mayFollow, restReachDays } from './kind-groups';
import { countExactly } from './kind-limits';

/**
 * The rules of one person as numbers: what `stepState` needs to tell which group may follow which
 * history. Two people with equal rules share one net.
 */
export interface NetRules {
  readonly dayCount: number;
  readonly groups: KindGroups;
  /** 0 is Monday, by day. */
  readonly weekdays: Uint8Array;
  /** Days after a shift on which its rest can still stand in the way of another. */
  readonly reachDays: number;
  /**
   * Whether a group may start on a day in a follow class: by (class x days + day) x groups + group. Class 0
   * hinders nothing; class 1 + (age - 1) x (groupCount - 1) + (group - 1) says that the last shift was of
   * that group, `age` days ago.
   */
  readonly isAllowed: Uint8Array;
  /** Longest and shortest run of days with a shift; Infinity and 1 without a limit. */
  readonly longestRun: number;
  readonly shortestRun: number;
  readonly shortestFree: number;
  readonly longestNights: number;
  /** Most Nights and weekends, and whether they are counted at all. */
  readonly mostNights: number;
  readonly mostWeekends: number;
  readonly countsNights: boolean;
  readonly countsWeekends: boolean;
  /** Limited kinds counted exactly in the net, by position in kindLimits. */
  readonly counted: readonly { readonly limit: number; readonly most: number }[];
  /** Worked minutes are counted in these units. */
  readonly minuteUnit: number;
  readonly leastMinutes: number;
  readonly mostMinutes: number;
  readonly runBefore: number;
  readonly nightsBefore: number;
  readonly runAfter: number;
  readonly nightsAfter: number;
  /** A run of days, and of Nights, is counted up to where one more makes no difference. */
  readonly runCap: number;
  readonly nightCap: number;
}

/** Which counts have a price, so that the end of a line must know them. */
export interface CountedMeasures {
  readonly nights: boolean;
  readonly weekends: boolean;
}

/** Compiles the rules of one person over the given groups. */
export function compileRules(
  problem: Problem,
  person: ProblemPerson,
  groups: KindGroups,
  measures: CountedMeasures,
): NetRules {
  const rules = rulesOf(problem, person);
  const dayCount = problem.days.length;
  const reachDays = restReachDays(problem, person);
  const mostNights = Math.min(rules.nightsPerPeriod ?? dayCount, dayCount);
  const mostWeekends = rules.weekendsPerPeriod ?? dayCount;
  const runs = neighbouringRuns(person, dayCount);
  const longestRun = rules.longestRunDays ?? Number.POSITIVE_INFINITY;
  const longestNights = rules.longestRunNights ?? Number.POSITIVE_INFINITY;
  const shortestRun = rules.shortestRunDays ?? 1;
  return {
    dayCount,
    groups,
    weekdays: Uint8Array.from(problem.days, ({ date }) => weekdayOf(date)),
    reachDays,
    isAllowed: allowTable(problem, person, groups, reachDays),
    longestRun,
    shortestRun,
    shortestFree: rules.shortestRunFreeDays ?? 1,
    longestNights,
    mostNights,
    mostWeekends,
    countsNights: rules.nightsPerPeriod !== null || measures.nights,
    countsWeekends: rules.weekendsPerPeriod !== null || measures.weekends,
    counted: countExactly(person, groups, dayCount),
    minuteUnit: Math.max(1, groups.minutes.reduce(greatestDivisor, 0)),
    leastMinutes: person.minimumMinutes - person.creditMinutes,
    mostMinutes: person.maximumMinutes - person.creditMinutes,
    ...runs,
    runCap: Number.isFinite(longestRun) ? Math.max(longestRun, runs.runBefore) : shortestRun,
    nightCap: Number.isFinite(longestNights) ? Math.max(longestNights, runs.nightsBefore) : 0,
  };
}

/** Follow class of a group worked `age` days ago; 0 when that is too long ago to matter. */
export function followClass(rules: NetRules, group: number, age: number): number {
  if (group === 0 || age > rules.reachDays) return 0;
  return 1 + (age - 1) * (rules.groups.groupCount - 1) + (group - 1);
}

function allowTable(
  problem: Problem,
  person: ProblemPerson,
  groups: KindGroups,
  reachDays: number,
): Uint8Array {
  const { groupCount } = groups;
  const dayCount = problem.days.length;
  const classCount = 1 + reachDays * (groupCount - 1);
  const table = new Uint8Array(classCount * dayCount * groupCount).fill(1);
  for (let follow = 1; follow < classCount; follow += 1) {
    const age = 1 + Math.floor((follow - 1) / (groupCount - 1));
    const group = 1 + ((follow - 1) % (groupCount - 1));
    for (let day = age; day < dayCount; day += 1) {
      const before = groups.shiftOn(group, day - age);
      for (let next = 1; before && next < groupCount; next += 1) {
        const after = groups.shiftOn(next, day);
        if (after && !mayFollow(problem, person, before, after)) {
          table[(follow * dayCount + day) * groupCount + next] = 0;
        }
      }
    }
  }
  return table;
}

function neighbouringRuns(
  { history, following }: ProblemPerson,
  dayCount: number,
): Pick<NetRules, 'runBefore' | 'nightsBefore' | 'runAfter' | 'nightsAfter'> {
  const nights = history.filter(({ isNight }) => isNight);
  const nightsNext = following.filter(({ isNight }) => isNight);
  return {
    runBefore: runFrom(history, -1, -1),
    nightsBefore: runFrom(nights, -1, -1),
    runAfter: runFrom(following, dayCount, 1),
    nightsAfter: runFrom(nightsNext, dayCount, 1),
  };
}

function runFrom(shifts: ProblemPerson['history'], first: number, step: 1 | -1): number {
  const days = new Set(shifts.map(({ dayIndex }) => dayIndex));
  let length = 0;
  while (days.has(first + step * length)) length += 1;
  return length;
}

function greatestDivisor(one: number, other: number): number {
  return other === 0 ? Math.abs(one) : greatestDivisor(other, one % other);
}
