import type { PlannedRoster } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { centsPerPoint, problemOf, tableOf } from './adapt-instance';
import type { Instance } from './instance';
import { scoreRoster } from './score-roster';

/**
 * The objective of a roster, on which the scorer, the proof and whoever made the roster must agree. Throws
 * on a broken rule and on any difference: it is a bug in one of them.
 */
export function agreedObjective(
  instance: Instance,
  { roster, costCents }: { readonly roster: PlannedRoster; readonly costCents: number },
): number {
  const score = scoreRoster(instance, tableOf(instance, roster));
  const proof = proveRoster(problemOf(instance), roster);
  const breaches = [...score.breaches, ...proof.breaches.map(({ sentence }) => sentence)];
  if (breaches.length > 0) throw new Error(`The roster is not lawful: ${breaches.join(' ')}`);
  const cents = [score.objective * centsPerPoint, proof.costCents, costCents];
  if (new Set(cents).size === 1) return score.objective;
  throw new Error(`Scorer, proof and engine disagree on the cost in cents: ${cents.join(', ')}.`);
}
