import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { levelWeight, roundingSlackCents } from '@/modules/model';
import type { Problem } from '@/modules/problem';
import { proveBound } from '@/modules/proof';
import { writeBoundRecord } from '@/modules/solver/lines/bound-record';
import { pricingBy } from '@/modules/solver/lines/column-generation';
import { lagrangianBound } from '@/modules/solver/lines/lagrangian-bound';
import type { MasterPrices } from '@/modules/solver/lines/pattern-master';
import { seededRandom } from '@/modules/solver/lines/random';
import { findClashes, type Ground, prepareGround } from '@/modules/solver/search/first-roster';
import { annealFor, anyProblem, layGround, roomFor } from './any-ground';

const anySeed = fc.nat(1_000_000);

/** Shares of the price of each spread for those who take part; together they are the price, as duals are. */
function drawShares({ space }: Ground, random: () => number): Float64Array {
  const people = space.lines.length;
  const shares = new Float64Array(space.spreads.length * people);
  space.spreads.forEach(({ priceCents, takesPart }, index) => {
    const drawn = Array.from(takesPart, (isIn) => (isIn ? random() : 0));
    const all = drawn.reduce((sum, one) => sum + one, 0);
    shares.set(
      drawn.map((one) => (one / all) * priceCents),
      index * people,
    );
  });
  return shares;
}

/** Prices of rows between the slopes of their costs, where duals lie, and now and then far beyond. */
function drawPrices(ground: Ground, seed: number, beyond: number): MasterPrices {
  const { space } = ground;
  const random = seededRandom(seed);
  const { rows } = space;
  return {
    rows: Float64Array.from({ length: rows.count }, (_, row) => {
      const from = rows.offsets[row] ?? 0;
      const to = rows.offsets[row + 1] ?? rows.table.length;
      const slope = (at: number) => (rows.table[at + 1] ?? 0) - (rows.table[at] ?? 0);
      // One more is worth what it takes off the cost: the steepest fall and the steepest rise.
      const [most, least] = [-slope(from), -slope(to - 2)];
      const price = least + random() * (most - least);
      return random() < beyond ? 3 * price - most : price;
    }),
    people: new Float64Array(space.lines.length),
    most: drawShares(ground, random),
    least: drawShares(ground, random),
  };
}

function boundBy({ space, refill, offset }: Ground, prices: MasterPrices): number {
  const pricing = pricingBy(space, prices);
  const least = space.lines.reduce(
    (sum, _, person) => sum + refill.cheapestLines(person, pricing, 0).least,
    0,
  );
  return lagrangianBound(space, prices, least) + offset;
}

const noShortage = (problem: Problem) => ({
  surplusMinutes: 0,
  shortageByPriority: [...new Set(problem.floors.map(({ priority }) => priority))].map(
    (priority) => ({
      priority,
      minutes: 0,
    }),
  ),
});

describe('the bound at any prices', () => {
  it('is never above the blend of a roster', () => {
    let laid = 0;
    let closest = 0;
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        laid += 1;
        const bounds = [0, 1, 2, 3, 4, 5].map((more) =>
          boundBy(ground, drawPrices(ground, seed + more, more % 2 ? 0.3 : 0)),
        );
        const best = Math.max(...bounds);
        const compare = () => {
          const cost = ground.lines.total + ground.offset;
          expect(best).toBeLessThanOrEqual(cost + roomFor(cost, ...bounds));
          closest = Math.max(closest, cost === 0 ? 0 : best / cost);
        };
        annealFor(ground, 6, seed, compare);
        compare();
      }),
      { numRuns: 150 },
    );
    expect(laid).toBeGreaterThan(20);
    // Some of the bounds are good ones: a bound of nothing would prove nothing here.
    expect(closest).toBeGreaterThan(0.9);
  });

  it('is what the proof reckons from its record', () => {
    let compared = 0;
    let equal = 0;
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const ground = prepareGround(problem);
        if (findClashes(ground).length > 0) return;
        const prices = drawPrices(ground, seed, 0);
        const bound = boundBy(ground, prices);
        const record = writeBoundRecord(ground.space, prices);
        const proven = proveBound(problem, record, noShortage(problem));
        if (proven.kind === 'refused') {
          expect(proven.sentence).toMatch(/^No roster can keep the rule /);
          return;
        }
        // The proof drops limits whose product is larger; the search prices them, so it may prove more.
        const isCounted = problem.people.every(
          ({ kindLimits }) => kindLimits.reduce((all, { most }) => all * (most + 1), 1) <= 32,
        );
        if (!isCounted) return;
        compared += 1;
        const room = 2 * roundingSlackCents(ground.model) + 1 + roomFor(bound, ...prices.rows);
        expect(proven.boundCents).toBeGreaterThanOrEqual(Math.max(0, bound) - room);
        // The proof may know better how many can count in a slice (pins, say), but that is seldom.
        if (proven.boundCents <= Math.max(0, bound) + room) equal += 1;
      }),
      { numRuns: 150 },
    );
    expect(compared).toBeGreaterThan(20);
    expect(equal / compared).toBeGreaterThan(0.8);
  });

  it('charges a missing minute at the weight of its priority', () => {
    fc.assert(
      fc.property(anyProblem, (problem) => {
        const ground = prepareGround(problem);
        const { levels } = ground.model;
        const prices = drawPrices(ground, 1, 0);
        const { shortage, surplusCentsPerMinute } = writeBoundRecord(ground.space, prices);
        levels.forEach(({ name, priority }, position) => {
          const weight = levelWeight(levels, position);
          if (name === 'surplus') expect(surplusCentsPerMinute).toBe(weight);
          if (name !== 'shortage') return;
          expect(shortage).toContainEqual({ priority, centsPerMinute: weight });
        });
      }),
      { numRuns: 20 },
    );
  });
});
