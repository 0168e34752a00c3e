import { z } from 'zod';

const cents = z.number();

/**
 * Multipliers from which a lower bound of the cost can be reckoned anew without any solver (Lagrangian
 * relaxation: Geoffrion, Mathematical Programming Study 2, 1974, 82-114). Any figures give a valid bound;
 * good ones give a close one. Cents may be fractions. Rows without an entry have multiplier 0.
 */
export const boundRecordSchema = z.strictObject({
  /** Price of one missing person-minute on firm floors of a priority. */
  shortage: z.array(z.strictObject({ priority: z.int(), centsPerMinute: cents.min(0) })),
  /** Price of one person-minute above a firm ceiling. */
  surplusCentsPerMinute: cents.min(0),
  /**
   * What one more person on duty all through [startMinute, endMinute) is worth. Seated floors of one skill
   * (or of any skill: null) stand together, so `id` is null; a shared floor or a ceiling stands alone, and
   * `id` is its floorId or ceilingId. No shift begins or ends inside a slice.
   */
  slices: z.array(
    z.strictObject({
      of: z.enum(['seated', 'shared', 'ceiling']),
      skillId: z.string().nullable(),
      id: z.string().nullable(),
      startMinute: z.int(),
      endMinute: z.int(),
      cents,
    }),
  ),
  /**
   * Team rules. `at`: the shiftIndex of `together`, the minute of `apart`, the dayIndex of `mostFree`, null
   * for `budget` and `linear`. `cents`: what one unit more on the rule's left-hand side is worth.
   */
  teamRules: z.array(z.strictObject({ ruleId: z.string(), at: z.int().nullable(), cents })),
  /** Spread terms, by position in problem.fairness: each person's share in the price of most and least. */
  spreads: z.array(
    z.strictObject({
      term: z.int().min(0),
      personId: z.string(),
      mostCents: cents.min(0),
      leastCents: cents.min(0),
    }),
  ),
});

export type BoundRecord = z.infer<typeof boundRecordSchema>;
