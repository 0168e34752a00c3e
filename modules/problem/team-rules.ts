import { z } from 'zod';
import { centsSchema } from '../units';

const common = {
  id: z.string(),
  /** As the supervisor calls it; sentences name the rule so. */
  name: z.string(),
  /** null: firm. Otherwise the price of one unit by which it is broken. */
  priceCents: centsSchema.nullable(),
};

/**
 * Rules that join people, all of them linear in who is on which shift. A unit broken is one person on one
 * shift (`together`, `apart`), one person on one day (`mostFree`), one minor currency unit (`budget`), or
 * one unit of the sum (`linear`).
 */
export const teamRuleSchema = z.discriminatedUnion('kind', [
  /** Whenever one of the two is on a shift, so is the other. */
  z.strictObject({
    ...common,
    kind: z.literal('together'),
    personIds: z.tuple([z.string(), z.string()]),
  }),
  /** At most one of them is on duty at any time. */
  z.strictObject({
    ...common,
    kind: z.literal('apart'),
    personIds: z.array(z.string()).min(2),
  }),
  /** On every day, at most so many of them start no shift. */
  z.strictObject({
    ...common,
    kind: z.literal('mostFree'),
    personIds: z.array(z.string()).min(1),
    most: z.int().min(0),
  }),
  /** Pay of the whole roster: ordinary, premiums and overtime, without prices of wishes and floors. */
  z.strictObject({ ...common, kind: z.literal('budget'), mostCents: centsSchema }),
  /** least <= sum of coefficient x (person on shift, in any post) <= most. */
  z.strictObject({
    ...common,
    kind: z.literal('linear'),
    terms: z
      .array(
        z.strictObject({
          personId: z.string(),
          shiftIndex: z.int().min(0),
          coefficient: z.int(),
        }),
      )
      .min(1),
    least: z.int().nullable(),
    most: z.int().nullable(),
  }),
]);

export type TeamRule = z.infer<typeof teamRuleSchema>;
export type TeamRuleKind = TeamRule['kind'];
