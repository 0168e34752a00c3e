import { z } from 'zod';
import { ruleSetSchema } from '../rules';

/** Every limit a person keeps by themselves; null switches one off. */
export const problemRulesSchema = ruleSetSchema.extend({
  /**
   * Fewest days in a row with a shift. A run that touches the first or the last day of the period is
   * exempt: its other part lies outside.
   */
  shortestRunDays: z.int().min(1).nullable(),
  /** Fewest days off in a row; exempt in the same way. */
  shortestRunFreeDays: z.int().min(1).nullable(),
  /** The second kind may not start on the day after the first. */
  kindsThatMayNotFollow: z.array(z.strictObject({ kindId: z.string(), nextKindId: z.string() })),
});

export type ProblemRules = z.infer<typeof problemRulesSchema>;
