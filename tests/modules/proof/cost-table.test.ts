import fc from 'fast-check';
import { expect, it } from 'vitest';
import { CostTable } from '@/modules/proof/bound/cost-table';

/** Small keys that come again, and keys that agree in their lower 32 bits. */
const key = fc.oneof(
  fc.nat(20),
  fc.nat(20).map((high) => high * 2 ** 32 + 7),
  fc.nat(2 ** 30),
);
const entries = fc.array(fc.tuple(key, fc.integer()), { maxLength: 1500 });

it('keeps the least cost of every history', () => {
  fc.assert(
    fc.property(entries, fc.nat(20), (noted, other) => {
      const table = new CostTable();
      const plain = new Map<number, number>();
      for (const [place, cost] of noted) {
        table.lower(place, cost);
        plain.set(place, Math.min(cost, plain.get(place) ?? cost));
      }
      expect(table.count).toBe(plain.size);
      for (let place = 0; place < table.count; place += 1) {
        expect(table.costAt(place)).toBe(plain.get(table.keyAt(place)));
      }
      expect(table.costOf(other)).toBe(plain.get(other) ?? Number.POSITIVE_INFINITY);
    }),
    { numRuns: 50 },
  );
});

it('grows, and is empty once cleared', () => {
  const table = new CostTable();
  for (let place = 0; place < 5000; place += 1) table.lower(place * 3, -place);
  expect([table.count, table.costOf(3 * 4999), table.costOf(1)]).toEqual([
    5000,
    -4999,
    Number.POSITIVE_INFINITY,
  ]);
  table.clear();
  expect([table.count, table.costOf(0)]).toEqual([0, Number.POSITIVE_INFINITY]);
});
