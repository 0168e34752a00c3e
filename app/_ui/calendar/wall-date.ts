import { format } from 'date-fns';
import type { LocalDate } from '@/modules/units';

/*
 * The calendar package computes with Date in the viewer's zone. We give it only dates, at noon, where no
 * zone changes its clock, and read only dates back; hours are placed and written by us.
 */

/** Noon of a date in the viewer's zone. */
export const noonOf = (date: LocalDate): Date => wallDate(date, 720);

/** The moment at which the viewer's wall clock shows what the team's clock shows. */
export function wallDate(date: LocalDate, minute: number): Date {
  const [year = 0, month = 1, day = 1] = date.split('-').map(Number);
  return new Date(year, month - 1, day, 0, minute);
}

/** The date of a moment in the viewer's zone. */
export const dateOf = (moment: Date): LocalDate => format(moment, 'yyyy-MM-dd');
