import type { BoundRecord, FairnessMeasure, Problem } from '../../problem';

/** What one Night, one worked weekend and one refused wish more costs a person. */
export type UnitPrices = Readonly<Record<FairnessMeasure, number>>;

/** What the spread terms add to a bound, and how each person's line is priced by them. */
export interface SpreadBound {
  readonly cents: number;
  readonly magnitude: number;
  readonly unitPricesOf: ReadonlyMap<string, UnitPrices>;
}

export const noUnitPrices: UnitPrices = { nights: 0, weekends: 0, refusedWishes: 0 };

/**
 * A spread costs price x (most - least), where most >= each person's count >= least. Each person takes
 * shares m and l and pays (m - l) a unit. With M and L, the sums of the shares, what is left is at least
 * (price - M) x most - (price - L) x least, taken at the worst corner of 0 <= least <= most <= all. That
 * holds for any shares that are not negative; it is 0 when neither sum differs from the price.
 */
export function priceSpreads(problem: Problem, record: BoundRecord): SpreadBound {
  const unitPricesOf = new Map<string, UnitPrices>();
  let [cents, magnitude] = [0, 0];
  problem.fairness.forEach((term, index) => {
    if (term.kind !== 'spread') return;
    const shares = record.spreads.filter((spread) => spread.term === index);
    if (shares.length === 0) return;
    for (const { personId, mostCents, leastCents } of shares) {
      const before = unitPricesOf.get(personId) ?? noUnitPrices;
      const price = before[term.measure] + mostCents - leastCents;
      unitPricesOf.set(personId, { ...before, [term.measure]: price });
    }
    const most = shares.reduce((sum, { mostCents }) => sum + mostCents, 0);
    const least = shares.reduce((sum, { leastCents }) => sum + leastCents, 0);
    const all = mostUnits(problem, term.measure);
    cents += Math.min(0, (term.priceCents - most) * all, (least - most) * all);
    magnitude += term.priceCents * all;
  });
  return { cents, magnitude, unitPricesOf };
}

/** No person can have more of a measure. */
function mostUnits({ people, days }: Problem, measure: FairnessMeasure): number {
  return measure === 'refusedWishes'
    ? Math.max(0, ...people.map(({ wishes }) => wishes.length))
    : days.length;
}
