import { z } from 'zod';
import { daysBetween, localDateSchema } from './dates';

/**
 * Zod type of a date that can be planned or asked for. Years far off are refused: beyond 9999 a date has
 * another form, and clocks of long ago had odd offsets.
 */
export const plannedDateSchema = localDateSchema.refine(
  (date) => date >= '2000-01-01' && date < '2200-01-01',
  'Choose a date in the years 2000 to 2199.',
);

/** Longest range that is read at once: a year with its leap day. */
const mostDays = 366;

/** Zod type of a range of dates, both included, as the query of an address gives it. */
export const dateRangeSchema = z
  .object({ from: plannedDateSchema, to: plannedDateSchema })
  .refine(({ from, to }) => from <= to, {
    path: ['to'],
    message: 'The last day cannot be before the first day.',
  })
  .refine(({ from, to }) => daysBetween(from, to) < mostDays, {
    path: ['to'],
    message: `Ask for at most ${mostDays} days at once.`,
  });
export type DateRange = z.infer<typeof dateRangeSchema>;
