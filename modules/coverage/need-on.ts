import { type LocalDate, weekdayOf } from '../units';
import { type Floor, holidayColumn } from './floor';

/** Whether a floor holds on a date: its first and last day are both included, no last day is open. */
export function isInForce(
  floor: Pick<Floor, 'effectiveFrom' | 'effectiveTo'>,
  date: LocalDate,
): boolean {
  return floor.effectiveFrom <= date && (floor.effectiveTo === null || date <= floor.effectiveTo);
}

/**
 * Least people a floor asks for on a date: the date's own number if it differs, else the holiday
 * column, else the weekday. 0 where the floor is not in force, even for a date that differs.
 */
export function needOn(
  floor: Pick<Floor, 'effectiveFrom' | 'effectiveTo' | 'needs' | 'dates'>,
  date: LocalDate,
  isHoliday: boolean,
): number {
  if (!isInForce(floor, date)) return 0;
  const own = floor.dates.find((entry) => entry.date === date);
  return own?.people ?? floor.needs[isHoliday ? holidayColumn : weekdayOf(date)] ?? 0;
}
