import type { Problem } from '../problem';
import {
  addDays,
  datesOf,
  elapsedMinutes,
  type LocalDate,
  toInstant,
  type UtcMilliseconds,
  type Zone,
} from '../units';

/** The first date of a problem and the instant of its local midnight, minute 0 of the time axis. */
export function originOf(problem: Pick<Problem, 'days' | 'zone'>): {
  readonly date: LocalDate;
  readonly instant: UtcMilliseconds;
} {
  const date = problem.days[0]?.date;
  if (date === undefined) throw new Error('A problem without days');
  return { date, instant: toInstant(date, 0, problem.zone) };
}

/**
 * The days of a period on the time axis: minutes that truly elapse from its first local midnight, so
 * that a day of a clock change is an hour shorter or longer.
 */
export function periodDays(
  startsOn: LocalDate,
  endsOn: LocalDate,
  zone: Zone,
): { readonly date: LocalDate; readonly startMinute: number; readonly endMinute: number }[] {
  const origin = toInstant(startsOn, 0, zone);
  const minuteOf = (date: LocalDate) => elapsedMinutes(origin, toInstant(date, 0, zone));
  return datesOf(startsOn, endsOn).map((date) => ({
    date,
    startMinute: minuteOf(date),
    endMinute: minuteOf(addDays(date, 1)),
  }));
}
