import { type Problem, type ProblemPerson, rulesOf } from '../../problem';
import type { LineDay, LineOption } from './line-options';
import { blockedBelow, type RestStarts, readRestStarts } from './rest-starts';

/** What the rules ask to know of the days before today, sums over the period aside. */
export interface LineMemory {
  /** No shift that starts at this minute or before may follow, for rest; -Infinity when all may. */
  readonly blockedThrough: number;
  /** Kind of the shift of yesterday, where it bars some kind today. */
  readonly lastKindId: string | null;
  /** Days in a row with a shift up to yesterday, those before the period included; counted to the limit. */
  readonly run: number;
  /** Days that must still be like yesterday, for shortest runs. */
  readonly due: number;
  readonly nightRun: number;
  /** Whether the weekend of today is counted as worked already. */
  readonly hasWeekend: boolean;
}

/** The rules of one person that look from day to day. */
export interface LineRules {
  readonly start: LineMemory;
  readonly restMinutes: number;
  readonly longestRun: number;
  readonly longestNightRun: number;
  /** A run is counted up to here: without a limit all that may matter is whether there is one. */
  readonly countedRun: number;
  readonly countedNightRun: number;
  readonly shortestRun: number;
  readonly shortestFree: number;
  /** Kinds that may not come on the day after a kind. */
  readonly barredAfter: ReadonlyMap<string, ReadonlySet<string>>;
  /** Days and Nights in a row that follow the period. */
  readonly runAfter: number;
  readonly nightRunAfter: number;
  readonly starts: RestStarts;
  /** Whether the day after belongs to the same weekend, by day. */
  readonly isInWeekend: readonly boolean[];
}

/** Reads the rules of a person and what the days before the period leave behind. */
export function readLineRules(
  problem: Problem,
  person: ProblemPerson,
  days: readonly LineDay[],
  isInWeekend: readonly boolean[],
): LineRules {
  const rules = rulesOf(problem, person);
  const longestRun = rules.longestRunDays ?? Number.POSITIVE_INFINITY;
  const longestNightRun = rules.longestRunNights ?? Number.POSITIVE_INFINITY;
  const barredAfter = new Map<string, Set<string>>();
  for (const { kindId, nextKindId } of rules.kindsThatMayNotFollow) {
    barredAfter.set(kindId, new Set([...(barredAfter.get(kindId) ?? []), nextKindId]));
  }
  const nights = (stints: ProblemPerson['history']) => stints.filter(({ isNight }) => isNight);
  const shortestRun = rules.shortestRunDays ?? 1;
  const shortestFree = rules.shortestRunFreeDays ?? 1;
  const countedRun = rules.longestRunDays ?? (Math.max(shortestRun, shortestFree) > 1 ? 1 : 0);
  const countedNightRun = rules.longestRunNights ?? 0;
  return {
    start: {
      blockedThrough: Number.NEGATIVE_INFINITY,
      lastKindId: null,
      run: Math.min(runFrom(person.history, -1, -1), countedRun),
      due: 0,
      nightRun: Math.min(runFrom(nights(person.history), -1, -1), countedNightRun),
      hasWeekend: false,
    },
    restMinutes: rules.restMinutes,
    longestRun,
    longestNightRun,
    countedRun,
    countedNightRun,
    shortestRun,
    shortestFree,
    barredAfter,
    runAfter: runFrom(person.following, days.length, 1),
    nightRunAfter: runFrom(nights(person.following), days.length, 1),
    starts: readRestStarts(days),
    isInWeekend,
  };
}

/** The memory after a day with this shift, or without one; null when a rule bars it. */
export function stepMemory(
  rules: LineRules,
  before: LineMemory,
  dayIndex: number,
  option: LineOption | null,
): LineMemory | null {
  return option ? work(rules, before, dayIndex, option) : rest(rules, before, dayIndex);
}

/** Whether the period may end so: with the days after it no run may be too long. */
export const mayEnd = (rules: LineRules, { run, nightRun }: LineMemory): boolean =>
  (run === 0 || run + rules.runAfter <= rules.longestRun) &&
  (nightRun === 0 || nightRun + rules.nightRunAfter <= rules.longestNightRun);

function work(
  rules: LineRules,
  before: LineMemory,
  dayIndex: number,
  { shift, marksWeekend }: LineOption,
): LineMemory | null {
  const goesOn = before.run > 0 || dayIndex === 0;
  const nightRun = shift.isNight ? before.nightRun + 1 : 0;
  const isBarred =
    shift.startMinute <= before.blockedThrough ||
    (before.lastKindId !== null &&
      rules.barredAfter.get(before.lastKindId)?.has(shift.kindId) === true) ||
    before.run + 1 > rules.longestRun ||
    nightRun > rules.longestNightRun ||
    (!goesOn && before.due > 0);
  if (isBarred) return null;
  const hasWeekend = before.hasWeekend || marksWeekend;
  return {
    blockedThrough: blockedBelow(rules.starts, dayIndex, shift.endMinute + rules.restMinutes),
    lastKindId: rules.barredAfter.has(shift.kindId) ? shift.kindId : null,
    run: Math.min(before.run + 1, rules.countedRun),
    due: goesOn ? Math.max(0, before.due - 1) : rules.shortestRun - 1,
    nightRun: Math.min(nightRun, rules.countedNightRun),
    hasWeekend: hasWeekend && rules.isInWeekend[dayIndex] === true,
  };
}

function rest(rules: LineRules, before: LineMemory, dayIndex: number): LineMemory | null {
  const goesOn = before.run === 0 || dayIndex === 0;
  if (!goesOn && before.due > 0) return null;
  return {
    blockedThrough: blockedBelow(rules.starts, dayIndex, before.blockedThrough + 1),
    lastKindId: null,
    run: 0,
    due: goesOn ? Math.max(0, before.due - 1) : rules.shortestFree - 1,
    nightRun: 0,
    hasWeekend: before.hasWeekend && rules.isInWeekend[dayIndex] === true,
  };
}

/** Days in a row from `first` on, forwards or backwards. */
function runFrom(stints: ProblemPerson['history'], first: number, step: 1 | -1): number {
  const days = new Set(stints.map(({ dayIndex }) => dayIndex));
  let length = 0;
  while (days.has(first + step * length)) length += 1;
  return length;
}
