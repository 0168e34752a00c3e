import type { Problem } from '../problem';
import { addDays, formatClock, type LocalDate, toInstant, toLocal, weekdayOf } from '../units';

const weekdays = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** `Thu 11 Feb` of 2027-02-11. */
export function dateWords(date: LocalDate): string {
  const [, month, day] = date.split('-');
  return `${weekdays[weekdayOf(date)]} ${Number(day)} ${months[Number(month) - 1]}`;
}

/** `8 h`, `10 h 59 min` or `59 min`. */
export function durationWords(minutes: number): string {
  const hours = Math.floor(minutes / 60);
  const rest = minutes % 60;
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`;
}

/** `1 night` or `3 nights`. */
export const countWords = (count: number, noun: string): string =>
  `${count} ${noun}${count === 1 ? '' : 's'}`;

/** The date of a day of the period; days before it have negative indexes. */
export function dateOfDay(problem: Problem, dayIndex: number): LocalDate {
  return problem.days[dayIndex]?.date ?? addDays(firstDate(problem), dayIndex);
}

/** What the wall clock of the team shows at a minute of the time axis, e.g. `23:00`. */
export function clockWords(problem: Problem, minute: number): string {
  const origin = toInstant(firstDate(problem), 0, problem.zone);
  return formatClock(toLocal(origin + minute * 60_000, problem.zone).minute);
}

/** The first date of the period, minute 0 of its time axis. */
export function firstDate(problem: Problem): LocalDate {
  const [first] = problem.days;
  if (!first) throw new Error('A problem has at least one day.');
  return first.date;
}
