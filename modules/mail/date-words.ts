import { format, parseISO } from 'date-fns';
import type { LocalDate } from '../units';

/** `Thu 11 Feb`. */
export const shortDay = (date: LocalDate): string => format(parseISO(date), 'EEE d MMM');

/** `Mon 18 January 2027`. */
export const longDay = (date: LocalDate): string => format(parseISO(date), 'EEE d MMMM yyyy');

/** `1 to 28 February 2027`, `29 March to 25 April 2027`, `28 December 2026 to 24 January 2027`. */
export function spanOfDates(from: LocalDate, to: LocalDate): string {
  const isSameYear = from.slice(0, 4) === to.slice(0, 4);
  const isSameMonth = from.slice(0, 7) === to.slice(0, 7);
  const start = isSameMonth ? 'd' : isSameYear ? 'd MMMM' : 'd MMMM yyyy';
  return `${format(parseISO(from), start)} to ${format(parseISO(to), 'd MMMM yyyy')}`;
}
