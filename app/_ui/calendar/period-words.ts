import type { DateRange } from '@/modules/units';
import { dateRange } from '../clock';
import { type Period, periodsIn } from './period-edges';

/** The periods in view: `Period 4–31 January published, 1–28 February draft.` */
export function periodWords(periods: readonly Period[], { from, to }: DateRange): string {
  const inView = periodsIn(periods, from, to);
  if (inView.length === 0) return 'No roster for these days yet.';
  const words = inView.map(
    ({ startsOn, endsOn, isPublished }) =>
      `${dateRange(startsOn, endsOn)} ${isPublished ? 'published' : 'draft'}`,
  );
  return `${inView.length > 1 ? 'Periods' : 'Period'} ${words.join(', ')}.`;
}

/** Whose clock the times are by: `Times are those of Europe/Dublin.` */
export const zoneWords = (zone: string): string => `Times are by the team's clock, ${zone}.`;
