import type { CalendarFrame } from '@/modules/roster';
import { type LocalDate, weekdayOf } from '@/modules/units';
import { edgesOf } from './period-edges';

/** Class names of a day's ground in `calendar.css`: weekend, the chosen day, edges of the period. */
export function groundClass(
  { periods }: Pick<CalendarFrame, 'periods'>,
  date: LocalDate,
  selected: LocalDate | null,
): string {
  const edges = edgesOf(periods, date);
  return [
    weekdayOf(date) >= 5 ? 'is-weekend' : '',
    date === selected ? 'is-selected' : '',
    edges.above ? 'has-edge-above' : '',
    edges.left ? 'has-edge-left' : '',
  ]
    .filter(Boolean)
    .join(' ');
}
