import { z } from 'zod';
import { centsSchema } from '../units';

/** What a person would like on one day, and what not granting it weighs. */
export const wishSchema = z.strictObject({
  dayIndex: z.int().min(0),
  /** The shift wished for or against; null: any shift of the day. */
  shiftIndex: z.int().min(0).nullable(),
  /** on: to work it; off: not to. */
  wants: z.enum(['on', 'off']),
  /** Exchange rate: what the roster may cost more to grant it. */
  priceCents: centsSchema,
});

/** What is to be shared fairly: Nights worked, weekends worked, wishes not granted. */
export const fairnessMeasureSchema = z.enum(['nights', 'weekends', 'refusedWishes']);

/**
 * What fairness may cost. spread: a price for each unit between the person with most and the person with
 * least. share: each person who has n pays the sum over the steps of priceCents x max(0, n - above).
 * Outside cover is left out of both.
 */
export const fairnessTermSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('spread'),
    measure: fairnessMeasureSchema,
    priceCents: centsSchema,
  }),
  z.strictObject({
    kind: z.literal('share'),
    measure: z.enum(['nights', 'weekends']),
    steps: z.array(z.strictObject({ above: z.int().min(0), priceCents: centsSchema })).min(1),
  }),
]);

export type Wish = z.infer<typeof wishSchema>;
export type FairnessMeasure = z.infer<typeof fairnessMeasureSchema>;
export type FairnessTerm = z.infer<typeof fairnessTermSchema>;
