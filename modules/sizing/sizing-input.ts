import { z } from 'zod';
import { localDateSchema } from '../units';

const weekday = z.int().min(0).max(6);

/** Largest pay of one day, so that a run of seven days stays an amount the product can hold. */
const mostDayPayCents = 100_000_000;
const dayPaySchema = z
  .int('Write an amount of money, for example 184.00.')
  .min(0, 'Pay cannot be below 0.')
  .max(mostDayPayCents, 'Pay of one day can be at most 1,000,000.');

const limitSchema = z
  .int('Write a whole number of people, or leave it empty.')
  .min(0, 'A limit cannot be below 0.')
  .max(100_000, 'A limit can be at most 100,000 people.')
  .nullable();

/** One line of the sizing table: people who work `daysOn` days in a row each week on one shift kind. */
export const sizingLineSchema = z.strictObject({
  /** Unique within the table, e.g. `full-time`. */
  id: z.string().trim().min(1).max(40),
  name: z
    .string()
    .trim()
    .min(1, 'Give the pattern a name, for example Full time.')
    .max(60, 'Keep the name under 60 characters.'),
  shiftKindId: z.string().min(1, 'Choose a shift kind.'),
  /** The skill these people count in; null: they count for floors of any skill only. */
  skillId: z.string().nullable(),
  daysOn: z
    .int('Write a whole number of days.')
    .min(1, 'At least 1 day.')
    .max(7, 'At most 7 days.'),
  /** Weekdays (Monday 0) on which the run of days may begin. */
  startWeekdays: z
    .array(weekday)
    .min(1, 'Choose at least one first day.')
    .max(7)
    .refine((days) => new Set(days).size === days.length, 'Name each first day once.'),
  /** Pay of one day worked. */
  weekdayCents: dayPaySchema,
  saturdayCents: dayPaySchema,
  sundayCents: dayPaySchema,
  /** Replaces the pay of each day beyond the fifth in a row; null: paid as any other day. */
  extraDayCents: dayPaySchema.nullable(),
  /** Most people on this line; null: no limit. */
  mostPeople: limitSchema,
  /** Most percent of all people on this line; null: no limit. */
  mostPercent: z
    .int('Write a whole number from 0 to 100, or leave it empty.')
    .min(0, 'A share is at least 0 %.')
    .max(100, 'A share is at most 100 %.')
    .nullable(),
});
export type SizingLine = z.infer<typeof sizingLineSchema>;

/** What a user enters on the sizing sheet. */
export const sizingInputSchema = z.strictObject({
  /** Any date of the week whose floors are taken, so that effective dates are respected. */
  weekOf: localDateSchema,
  /** A whole week, or one weekday that repeats. */
  span: z.union([z.literal('week'), weekday]),
  objective: z.enum(['people', 'pay']),
  lines: z
    .array(sizingLineSchema)
    .min(1, 'Add at least one pattern.')
    .max(60, 'Keep to 60 patterns.'),
  /** Most people altogether; null: no limit. */
  mostPeople: limitSchema,
});
export type SizingInput = z.infer<typeof sizingInputSchema>;
