import type { Problem } from '../problem';
import { addDays, elapsedMinutes, type LocalDate, toInstant, weekdayOf } from '../units';
import type { Duty } from './duties';
import { dateOfDay, firstDate } from './words';

/**
 * Saturdays of the weekends a person works. A weekend is worked when a shift starts on its Saturday or
 * Sunday, or, if `weekendCountsFridayNight`, when a shift that starts on the Friday runs past Saturday
 * 00:00. Only shifts of this roster count: those before the period belonged to the period before.
 */
export function workedWeekends(problem: Problem, duties: readonly Duty[]): LocalDate[] {
  const saturdays = duties.flatMap(({ shift }): LocalDate[] => {
    const date = dateOfDay(problem, shift.dayIndex);
    const weekday = weekdayOf(date);
    if (weekday === 5) return [date];
    if (weekday === 6) return [addDays(date, -1)];
    const saturday = addDays(date, 1);
    const isLongFriday =
      weekday === 4 &&
      problem.rules.weekendCountsFridayNight &&
      shift.endMinute > midnightOf(problem, saturday);
    return isLongFriday ? [saturday] : [];
  });
  return [...new Set(saturdays)].sort();
}

/** Read from the zone, because the day after the last of the period is not among the problem's days. */
function midnightOf(problem: Problem, date: LocalDate): number {
  const origin = toInstant(firstDate(problem), 0, problem.zone);
  return elapsedMinutes(origin, toInstant(date, 0, problem.zone));
}
