import { isBarred, isOver, isPostable } from './duty-bars';
import {
  type Problem,
  type ProblemFloor,
  type ProblemPerson,
  type ProblemShift,
  rulesOf,
} from './problem';
import type { Requirement } from './requirement';

/** Floors of some skills on some days. */
export interface NeedWindow {
  readonly firstDay: number;
  readonly lastDay: number;
  readonly floors: readonly ProblemFloor[];
  readonly skillIds: readonly string[];
  /** By shift: minutes at which any of the floors asks for somebody. */
  readonly usefulMinutes: ReadonlyMap<number, number>;
}

/** Floors of some skills, with what each shift can do for them. */
export function needWindow(
  problem: Problem,
  skillIds: readonly string[],
  floors: readonly ProblemFloor[],
  [firstDay, lastDay]: readonly [number, number],
): NeedWindow {
  const near = problem.shifts.filter(
    ({ dayIndex }) => dayIndex >= firstDay - 1 && dayIndex <= lastDay + 1,
  );
  const sorted = [...floors].sort((one, other) => one.startMinute - other.startMinute);
  const usefulMinutes = new Map(near.map((shift) => [shift.index, usefulIn(shift, sorted)]));
  return { firstDay, lastDay, floors, skillIds, usefulMinutes };
}

/** The most that one person can be on duty for some floors, and what keeps it from being more. */
export interface MostDuty {
  readonly minutes: number;
  readonly limitedBy: readonly Requirement[];
}

/** Person-minutes on duty that floors need. */
export const dutyNeeded = (floors: readonly ProblemFloor[]): number =>
  floors.reduce(
    (sum, { startMinute, endMinute, people }) => sum + (endMinute - startMinute) * people,
    0,
  );

/**
 * An upper bound of a person's minutes on duty within the floors: the best shift of each day that absences,
 * Nights and posts allow, as many days as the longest run allows, and no more than the contract's hours.
 * Rest, Nights in a row and weekends are not looked at: the truth may be less, never more.
 */
export function mostDuty(problem: Problem, person: ProblemPerson, window: NeedWindow): MostDuty {
  const longest = rulesOf(problem, person).longestRunDays;
  const gains = gainsByDay(problem, person, window, false);
  const free = gainsByDay(problem, person, window, true);
  const byRuns = bestWithRuns(gains, longest);
  const byHours = hoursAsDuty(problem, person);
  const { id: personId, rules } = person;
  const minutes = Math.min(byRuns, byHours);
  const limits: Requirement[] = [];
  if (byHours < sum(gains)) limits.push({ kind: 'mostHours', personId });
  if (byRuns < sum(gains)) {
    limits.push(
      rules
        ? { kind: 'ownLimit', personId, limit: 'longestRunDays' }
        : { kind: 'limit', limit: 'longestRunDays' },
    );
  }
  if (sum(gains) < sum(free)) limits.push(...standInTheWay(problem, person, window));
  return { minutes, limitedBy: limits };
}

/** Most useful minutes of each day from the one before the window on: its shifts may reach into it. */
function gainsByDay(
  problem: Problem,
  person: ProblemPerson,
  { firstDay, lastDay, skillIds, usefulMinutes }: NeedWindow,
  isFree: boolean,
): number[] {
  const from = Math.max(0, firstDay - 1);
  const gains = Array.from({ length: problem.days.length - from }, () => 0);
  const to = Math.min(problem.days.length - 1, lastDay + 1);
  for (const shift of problem.shifts) {
    const { dayIndex } = shift;
    if (dayIndex < from || dayIndex > to || !isPostable(person, shift, skillIds)) continue;
    if (!isFree && isBarred(person, shift)) continue;
    const best = Math.max(gains[dayIndex - from] ?? 0, usefulMinutes.get(shift.index) ?? 0);
    gains[dayIndex - from] = best;
  }
  return gains;
}

function usefulIn(shift: ProblemShift, floorsByStart: readonly ProblemFloor[]): number {
  let minutes = 0;
  let reached = shift.startMinute;
  for (const { startMinute, endMinute } of floorsByStart) {
    const to = Math.min(endMinute, shift.endMinute);
    minutes += Math.max(0, to - Math.max(startMinute, reached));
    reached = Math.max(reached, to);
  }
  return minutes;
}

/** Largest sum of gains over days of which never more than `longest` in a row are chosen. */
function bestWithRuns(gains: readonly number[], longest: number | null): number {
  if (longest === null) return sum(gains);
  let byRun = [0];
  for (const gain of gains) {
    const off = Math.max(...byRun);
    const on = byRun.slice(0, longest).map((best) => best + gain);
    byRun = [off, ...on];
  }
  return Math.max(...byRun);
}

/** Contract hours are paid minutes: on duty they last as long as the breaks of the shifts make them. */
function hoursAsDuty({ shifts }: Problem, person: ProblemPerson): number {
  const paid = Math.max(0, person.maximumMinutes - person.creditMinutes);
  const stretch = shifts
    .filter(({ paidMinutes }) => paidMinutes > 0)
    .map(({ startMinute, endMinute, paidMinutes }) => (endMinute - startMinute) / paidMinutes);
  const isUnpaid = stretch.length < shifts.length;
  return isUnpaid ? Number.POSITIVE_INFINITY : Math.floor(paid * Math.max(1, ...stretch));
}

/** Absences and missing Nights that bar shifts useful in the window. */
function standInTheWay(
  problem: Problem,
  person: ProblemPerson,
  { usefulMinutes }: NeedWindow,
): Requirement[] {
  const useful = problem.shifts.filter(({ index }) => (usefulMinutes.get(index) ?? 0) > 0);
  const { id: personId } = person;
  const absences = person.absences
    .filter((absence) => useful.some((shift) => isOver(absence, shift)))
    .map(
      ({ startMinute, endMinute }): Requirement => ({
        kind: 'absence',
        personId,
        startMinute,
        endMinute,
      }),
    );
  const barsNights = !person.mayWorkNights && useful.some(({ isNight }) => isNight);
  return barsNights ? [...absences, { kind: 'noNights', personId }] : absences;
}

const sum = (amounts: readonly number[]): number =>
  amounts.reduce((total, amount) => total + amount, 0);
