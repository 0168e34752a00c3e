import type { Proof } from '../proof';
import type { RunEvent } from './views';

/** A proof for eyes that may not see pay: every money field is 0. */
export const withoutPay = (proof: Proof): Proof => ({
  ...proof,
  costCents: 0,
  contractPayCents: 0,
  premiumPayCents: 0,
  overtimePayCents: 0,
  wishedShortageCents: 0,
});

/** A report of a run for eyes that may not see pay. */
export const eventWithoutPay = (event: RunEvent): RunEvent => ({
  ...event,
  bestCostCents: null,
  boundCents: null,
});
