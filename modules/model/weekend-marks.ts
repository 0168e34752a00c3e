import type { Problem, ProblemShift } from '../problem';
import { addDays, elapsedMinutes, toInstant, weekdayOf } from '../units';

/**
 * Whether a shift makes its weekend a worked one: it starts on Saturday or Sunday, or, if
 * `weekendCountsFridayNight`, on Friday and runs past Saturday 00:00.
 */
export function marksWeekend(
  problem: Problem,
  countsFriday: boolean,
  shift: ProblemShift,
): boolean {
  const weekday = weekdayOf(problem.days[shift.dayIndex]?.date ?? '');
  if (weekday >= 5) return true;
  return weekday === 4 && countsFriday && shift.endMinute > endOfDay(problem, shift.dayIndex);
}

/** Local midnight after a day on the time axis, also after the last day of the period. */
export function endOfDay(problem: Problem, dayIndex: number): number {
  const next = problem.days[dayIndex + 1];
  if (next) return next.startMinute;
  const first = problem.days[0]?.date ?? '';
  const following = addDays(first, dayIndex + 1);
  return elapsedMinutes(toInstant(first, 0, problem.zone), toInstant(following, 0, problem.zone));
}
