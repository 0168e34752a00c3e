import { z } from 'zod';

/** A calendar date without time or zone, `YYYY-MM-DD`. */
export type LocalDate = string;

const dayMilliseconds = 86_400_000;
const toUtc = (date: LocalDate): number => Date.parse(`${date}T00:00:00Z`);

/** True for a date that exists: `2027-02-29` does not. */
export function isLocalDate(text: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
  const milliseconds = toUtc(text);
  return !Number.isNaN(milliseconds) && new Date(milliseconds).toISOString().startsWith(text);
}

/** Zod type of a calendar date. */
export const localDateSchema = z
  .string()
  .refine(isLocalDate, 'Write an existing date as YYYY-MM-DD, for example 2027-02-01.');

/** The date `days` later (earlier when negative). `addDays('2027-02-28', 1)` is `2027-03-01`. */
export function addDays(date: LocalDate, days: number): LocalDate {
  return new Date(toUtc(date) + days * dayMilliseconds).toISOString().slice(0, 10);
}

/** Whole days from one date to another; negative when `to` is earlier. */
export function daysBetween(from: LocalDate, to: LocalDate): number {
  return Math.round((toUtc(to) - toUtc(from)) / dayMilliseconds);
}

/** All dates from `from` to `to`, both included; empty when `to` is earlier. */
export function datesOf(from: LocalDate, to: LocalDate): LocalDate[] {
  const count = Math.max(0, daysBetween(from, to) + 1);
  return Array.from({ length: count }, (_, index) => addDays(from, index));
}

/** Weekday with Monday 0 to Sunday 6, as in ISO 8601 less one. */
export function weekdayOf(date: LocalDate): number {
  return (new Date(toUtc(date)).getUTCDay() + 6) % 7;
}

/** The Monday of the date's ISO week. */
export const mondayOf = (date: LocalDate): LocalDate => addDays(date, -weekdayOf(date));

/** Short names of the weekdays, Monday first. */
export const weekdayNames = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
const monthNames = 'Jan Feb Mar Apr May Jun Jul Aug Sep Oct Nov Dec'.split(' ');

/** A date for people without its year. `formatDay('2027-02-11')` is `Thu 11 Feb`. */
export function formatDay(date: LocalDate): string {
  const month = monthNames[Number(date.slice(5, 7)) - 1];
  return `${weekdayNames[weekdayOf(date)]} ${Number(date.slice(8))} ${month}`;
}
