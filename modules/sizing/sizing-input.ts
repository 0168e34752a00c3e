import { z } from 'zod';
import { centsSchema } from '../units';

const weekday = z.int().min(0).max(6);

/** One line of the sizing table: people who work `daysOn` days in a row each week on one shift kind. */
export const sizingLineSchema = z.strictObject({
  /** Unique within the table, e.g. `full-time`. */
  id: z.string().trim().min(1).max(40),
  name: z.string().trim().min(1, 'Give the pattern a name, for example Full time.').max(60),
  shiftKindId: z.string(),
  /** The skill these people count in; null: they count for floors of any skill only. */
  skillId: z.string().nullable(),
  daysOn: z
    .int('Write a whole number of days.')
    .min(1, 'At least 1 day.')
    .max(7, 'At most 7 days.'),
  /** Weekdays (Monday 0) on which the run of days may begin. */
  startWeekdays: z.array(weekday).min(1, 'Choose at least one first day.').max(7),
  /** Pay of one day worked. */
  weekdayCents: centsSchema,
  saturdayCents: centsSchema,
  sundayCents: centsSchema,
  /** Replaces the pay of each day beyond the fifth in a row; null: paid as any other day. */
  extraDayCents: centsSchema.nullable(),
  /** Most people on this line; null: no limit. */
  mostPeople: z.int().min(0).nullable(),
  /** Most percent of all people on this line; null: no limit. */
  mostPercent: z.int().min(0).max(100).nullable(),
});
export type SizingLine = z.infer<typeof sizingLineSchema>;

/** What a user enters on the sizing sheet. */
export const sizingInputSchema = z.strictObject({
  /** The week whose floors are taken, by its Monday, so that effective dates are respected. */
  weekOf: z.string(),
  /** A whole week, or one weekday that repeats. */
  span: z.union([z.literal('week'), weekday]),
  objective: z.enum(['people', 'pay']),
  lines: z.array(sizingLineSchema).min(1, 'Add at least one pattern.').max(60),
  /** Most people altogether; null: no limit. */
  mostPeople: z.int().min(0).nullable(),
});
export type SizingInput = z.infer<typeof sizingInputSchema>;
