import type { Proof } from '../proof';
import type { RunEvent } from './views';

/**
 * A proof for eyes that may not see pay: every money field is 0, the units of broken rules of the team
 * too, since a budget is broken in money, sentences that tell of pay leave it out, and the bound is gone.
 */
export const withoutPay = ({ bound: _bound, ...proof }: Proof): Proof => ({
  ...proof,
  costCents: 0,
  contractPayCents: 0,
  premiumPayCents: 0,
  overtimePayCents: 0,
  wishedShortageCents: 0,
  pricedSurplusCents: 0,
  teamRuleUnits: 0,
  teamRuleCents: 0,
  refusedWishCents: 0,
  spreadCents: 0,
  shareCents: 0,
  breaches: proof.breaches.map(({ sentenceWithoutPay, ...breach }) => ({
    ...breach,
    sentence: sentenceWithoutPay ?? breach.sentence,
  })),
});

/** A report of a run for eyes that may not see pay. */
export const eventWithoutPay = (event: RunEvent): RunEvent => ({
  ...event,
  bestCostCents: null,
  boundCents: null,
});
