import type { CalendarFrame } from '@/modules/roster';
import { addDays, type LocalDate, weekdayOf } from '@/modules/units';

export type Period = CalendarFrame['periods'][number];

/** The period that a date lies in. */
export const periodOn = (periods: readonly Period[], date: LocalDate): Period | null =>
  periods.find(({ startsOn, endsOn }) => startsOn <= date && date <= endsOn) ?? null;

/** The periods that share a day with a range. */
export const periodsIn = (periods: readonly Period[], from: LocalDate, to: LocalDate): Period[] =>
  periods.filter(({ startsOn, endsOn }) => startsOn <= to && from <= endsOn);

/**
 * Where the edge of a period runs around a day in a month of Monday-first rows: above it when the day a
 * week before belongs elsewhere, left of it when the day before does. Together they draw one step-line.
 */
export function edgesOf(
  periods: readonly Period[],
  date: LocalDate,
): { readonly above: boolean; readonly left: boolean } {
  const own = periodOn(periods, date);
  return {
    above: periodOn(periods, addDays(date, -7)) !== own,
    left: weekdayOf(date) > 0 && periodOn(periods, addDays(date, -1)) !== own,
  };
}
