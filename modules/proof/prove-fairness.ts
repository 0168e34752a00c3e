import type { FairnessTerm, Problem } from '../problem';
import type { ProvenPerson } from './proof';

/** What a roster costs in fairness, in whole cents. */
export interface FairnessFinding {
  readonly spreadCents: number;
  readonly shareCents: number;
}

/** Prices the terms of fairness over everybody but outside cover, whose place has no claim to fairness. */
export function proveFairness(problem: Problem, people: readonly ProvenPerson[]): FairnessFinding {
  const outside = new Set(problem.people.filter(({ isOutside }) => isOutside).map(({ id }) => id));
  const insiders = people.filter(({ personId }) => !outside.has(personId));
  const costOf = (kind: FairnessTerm['kind']): number =>
    problem.fairness
      .filter((term) => term.kind === kind)
      .reduce((sum, term) => sum + termCost(term, insiders), 0);
  return { spreadCents: costOf('spread'), shareCents: costOf('share') };
}

function termCost(term: FairnessTerm, insiders: readonly ProvenPerson[]): number {
  const counts = insiders.map((person) => person[term.measure]);
  if (term.kind === 'share') {
    return counts.reduce((sum, count) => sum + shareCost(term, count), 0);
  }
  if (counts.length < 2) return 0;
  return term.priceCents * (Math.max(...counts) - Math.min(...counts));
}

/** What one person who has so many pays by the steps of a share term. */
export const shareCost = (
  { steps }: Extract<FairnessTerm, { kind: 'share' }>,
  count: number,
): number =>
  steps.reduce((sum, { above, priceCents }) => sum + priceCents * Math.max(0, count - above), 0);
