import { z } from 'zod';
import { localDateSchema } from '../units';
import { floorDateSchema, holidayColumn, peopleSchema } from './floor';

/** What a user enters for a date that differs; the date itself stands in the address. */
export const floorDateInputSchema = floorDateSchema.omit({ date: true });

/** Cells of the floors table, saved together or not at all. A cell given twice takes the later number. */
export const floorNeedsSchema = z
  .array(
    z.strictObject({
      floorId: z.string(),
      day: z
        .int()
        .min(0, 'Days run from 0 (Monday) to 7 (holiday).')
        .max(holidayColumn, 'Days run from 0 (Monday) to 7 (holiday).'),
      people: peopleSchema,
    }),
  )
  .min(1, 'Change at least one cell.')
  .max(5000, 'Save at most 5000 cells at once.');
export type FloorNeeds = z.infer<typeof floorNeedsSchema>;

/** Lets the floors that hold on `from` hold through `to`. */
export const continueFloorsSchema = z
  .strictObject({ from: localDateSchema, to: localDateSchema })
  .refine(({ from, to }) => from <= to, {
    path: ['to'],
    message: 'The last day cannot be before the first day.',
  });
export type ContinueFloors = z.infer<typeof continueFloorsSchema>;
