import { addDays, type DateRange, type LocalDate, mondayOf } from '@/modules/units';
import { dateRangeWithYear, longDay, monthName } from '../clock';

/** The views of a calendar. */
export const views = ['month', 'week', 'day', 'agenda'] as const;
export type View = (typeof views)[number];

/** Days that the agenda lists at once. */
export const agendaDays = 14;

/** The dates that a view shows around a date: whole weeks from Monday for a month. */
export function rangeOf(view: View, date: LocalDate): DateRange {
  switch (view) {
    case 'month': {
      const first = firstOfMonth(date);
      return { from: mondayOf(first), to: addDays(mondayOf(lastOfMonth(first)), 6) };
    }
    case 'week':
      return { from: mondayOf(date), to: addDays(mondayOf(date), 6) };
    case 'day':
      return { from: date, to: date };
    case 'agenda':
      return { from: date, to: addDays(date, agendaDays - 1) };
  }
}

/**
 * The dates to read for a view: whole months, so that the weeks and days of a month that was read need no
 * reading of their own.
 */
export function readRangeOf(view: View, date: LocalDate): DateRange {
  if (view === 'month') return rangeOf(view, date);
  const { from, to } = rangeOf(view, date);
  return { from: rangeOf('month', from).from, to: rangeOf('month', to).to };
}

/** The date to show after one step back (-1) or on (1). A month is entered on its first day. */
export function stepFrom(view: View, date: LocalDate, step: 1 | -1): LocalDate {
  switch (view) {
    case 'month':
      return step === 1
        ? addDays(lastOfMonth(date), 1)
        : firstOfMonth(addDays(firstOfMonth(date), -1));
    case 'week':
      return addDays(date, 7 * step);
    case 'day':
      return addDays(date, step);
    case 'agenda':
      return addDays(date, agendaDays * step);
  }
}

/** What a view is called: `February 2027`, `1–7 February 2027`, `Thursday 11 February 2027`. */
export function titleOf(view: View, date: LocalDate): string {
  if (view === 'month') return `${monthName(date)} ${date.slice(0, 4)}`;
  if (view === 'day') return `${longDay(date)} ${date.slice(0, 4)}`;
  const { from, to } = rangeOf(view, date);
  return dateRangeWithYear(from, to);
}

const firstOfMonth = (date: LocalDate): LocalDate => `${date.slice(0, 7)}-01`;

/** The last day: the day before the first of the month that contains the 32nd day from the first. */
const lastOfMonth = (date: LocalDate): LocalDate =>
  addDays(firstOfMonth(addDays(firstOfMonth(date), 31)), -1);
