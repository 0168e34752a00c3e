import { dateRangeWithYear } from '@/app/_ui/clock';
import type { StandingFigure } from '@/app/_ui/title-block';
import type { HoursView } from '@/modules/hours';
import { formatDay } from '@/modules/units';
import { columnFormat } from './format-hours';
import { countDays, sumPeople } from './sum-hours';

/** The foot of the sheet: dates, people, hours, and how far work is recorded. */
export function standingFigures({ from, to, today, people }: HoursView): StandingFigure[] {
  const { plannedMinutes, workedMinutes } = sumPeople(people);
  const { days, recorded } = countDays(people);
  const hours = (minutes: number) => `${columnFormat([minutes])(minutes)} h`;
  return [
    { label: 'Dates', value: dateRangeWithYear(from, to) },
    { label: 'People', value: people.length },
    { label: 'Planned', value: hours(plannedMinutes) },
    { label: 'Worked', value: hours(workedMinutes) },
    { label: 'Work recorded', value: `${recorded} of ${days} days` },
    { label: 'As of', value: formatDay(today), isLast: true },
  ];
}
