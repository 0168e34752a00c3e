import { hours } from '@/app/_ui/clock';
import type { StandingFigure } from '@/app/_ui/title-block';
import { type Coverage, needOn } from '@/modules/coverage';
import { datesOf, elapsedMinutes, formatDay, toInstant, type Zone } from '@/modules/units';
import type { FloorRow } from './floor-rows';
import type { Period } from './period';

/** The foot of the sheet: what the floors of the period ask for, and its public holidays. */
export function standingFigures(
  { team, holidays }: Coverage,
  rows: readonly FloorRow[],
  period: Period,
): StandingFigure[] {
  const inPeriod = holidays.filter(({ date }) => period.startsOn <= date && date <= period.endsOn);
  const holidayDates = new Set(inPeriod.map(({ date }) => date));
  const { shifts, windows, minutes } = countNeed(rows, period, holidayDates, team.zone);
  const parts = [
    ...(shifts > 0 ? [`${shifts.toLocaleString('en-GB')} shifts`] : []),
    ...(windows > 0 ? [`${windows.toLocaleString('en-GB')} other windows`] : []),
    `${hours(minutes)} on duty`,
  ];
  return [
    { label: 'Floors', value: rows.length > 0 ? parts.join(', ') : 'none yet' },
    {
      label: inPeriod.length > 1 ? 'Public holidays' : 'Public holiday',
      value: inPeriod.map(({ date, name }) => `${formatDay(date)}, ${name}`).join('; ') || 'none',
    },
  ];
}

/**
 * Person-windows that firm seated floors ask for, apart by whether a shift kind has the same hours, and
 * the minutes that truly elapse in them. Shared floors count people whom others count already.
 */
export function countNeed(
  rows: readonly FloorRow[],
  period: Pick<Period, 'startsOn' | 'endsOn'>,
  holidayDates: ReadonlySet<string>,
  zone: Zone,
) {
  const sum = { shifts: 0, windows: 0, minutes: 0 };
  const firm = rows.filter(
    ({ floor }) => floor.counting === 'seated' && floor.priceCentsPerHour === null,
  );
  for (const { floor, kind } of firm) {
    for (const date of datesOf(period.startsOn, period.endsOn)) {
      const people = needOn(floor, date, holidayDates.has(date));
      if (people === 0) continue;
      const from = toInstant(date, floor.startMinute, zone);
      sum.minutes += people * elapsedMinutes(from, toInstant(date, floor.endMinute, zone));
      sum[kind ? 'shifts' : 'windows'] += people;
    }
  }
  return sum;
}
