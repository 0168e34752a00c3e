import { type Problem, type ProblemPerson, type ProblemShift, rulesOf } from '../problem';
import { addDays, elapsedMinutes, type LocalDate, toInstant, weekdayOf } from '../units';
import type { Duty } from './duties';
import { dateOfDay, firstDate } from './words';

/**
 * Saturdays of the weekends a person works, earliest first. Only shifts of this roster count: those
 * before the period belonged to the period before.
 */
export function workedWeekends(
  problem: Problem,
  person: ProblemPerson,
  duties: readonly Duty[],
): LocalDate[] {
  const { weekendCountsFridayNight } = rulesOf(problem, person);
  const saturdays = duties.map(({ shift }) => weekendOf(problem, shift, weekendCountsFridayNight));
  return [...new Set(saturdays)].filter((saturday) => saturday !== null).sort();
}

/**
 * The Saturday of the weekend that a shift makes a worked one, or null. It does when it starts on the
 * Saturday or Sunday, or, where Friday nights count, on the Friday and runs past Saturday 00:00.
 */
export function weekendOf(
  problem: Problem,
  shift: ProblemShift,
  countsFridayNight: boolean,
): LocalDate | null {
  const date = dateOfDay(problem, shift.dayIndex);
  const weekday = weekdayOf(date);
  if (weekday === 5) return date;
  if (weekday === 6) return addDays(date, -1);
  const saturday = addDays(date, 1);
  const isLongFriday =
    weekday === 4 && countsFridayNight && shift.endMinute > midnightOf(problem, saturday);
  return isLongFriday ? saturday : null;
}

/** Read from the zone, because the day after the last of the period is not among the problem's days. */
function midnightOf(problem: Problem, date: LocalDate): number {
  const origin = toInstant(firstDate(problem), 0, problem.zone);
  return elapsedMinutes(origin, toInstant(date, 0, problem.zone));
}
