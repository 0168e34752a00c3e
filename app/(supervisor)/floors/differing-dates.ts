import { type FloorDate, type Holiday, holidayColumn } from '@/modules/coverage';
import { formatDay, type LocalDate, weekdayOf } from '@/modules/units';
import { type FloorRow, rowName } from './floor-rows';

/** One floor on one date that differs from its pattern. */
export interface Difference {
  readonly row: FloorRow;
  readonly entry: FloorDate;
  /** What the pattern asks for on that date. */
  readonly usual: number;
}

/** A date of the list: a public holiday, floors that differ, or both. */
export interface DifferingDate {
  readonly date: LocalDate;
  readonly holidayName: string | null;
  readonly differences: readonly Difference[];
}

/** Public holidays and dates that differ within a period, earliest first. */
export function differingDates(
  rows: readonly FloorRow[],
  holidays: readonly Holiday[],
  period: { readonly startsOn: LocalDate; readonly endsOn: LocalDate },
): DifferingDate[] {
  const isInside = ({ date }: { readonly date: LocalDate }) =>
    period.startsOn <= date && date <= period.endsOn;
  const names = new Map(holidays.filter(isInside).map(({ date, name }) => [date, name]));
  const differences = rows.flatMap((row) =>
    row.floor.dates.filter(isInside).map((entry) => ({
      row,
      entry,
      usual: usualNeed(row, entry.date, names.has(entry.date)),
    })),
  );
  const dates = new Set([...names.keys(), ...differences.map(({ entry }) => entry.date)]);
  return [...dates].sort().map((date) => ({
    date,
    holidayName: names.get(date) ?? null,
    differences: differences.filter(({ entry }) => entry.date === date),
  }));
}

/** What the weekly pattern of a floor asks for on a date. */
export const usualNeed = ({ floor }: FloorRow, date: LocalDate, isHoliday: boolean): number =>
  floor.needs[isHoliday ? holidayColumn : weekdayOf(date)] ?? 0;

/** `Nurse Night 23:00–07:00, Wed 17 Feb`: for buttons that stand beside a difference. */
export const differenceName = ({ row, entry }: Difference): string =>
  `${rowName(row)}, ${formatDay(entry.date)}`;
