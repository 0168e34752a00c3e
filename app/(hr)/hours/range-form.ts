import { z } from 'zod';
import { dateRangeSchema } from '@/modules/units';

/** Team and dates as the fields give them: a date is empty while it is missing or does not exist. */
const typedSchema = z.object({
  teamId: z.string(),
  from: z.string().min(1, 'Give a whole date that exists: day, month and year.'),
  to: z.string().min(1, 'Give a whole date that exists: day, month and year.'),
});
export type TypedChoice = z.infer<typeof typedSchema>;

/** Reads the fields and checks the dates with the schema that the route shares. */
export const rangeFormSchema = typedSchema.pipe(
  z.intersection(z.object({ teamId: z.string() }), dateRangeSchema),
);
