import type { MasterPrices } from './pattern-master';
import type { SearchSpace } from './search-space';

/**
 * Lower bound of every roster's cost for any prices (Lagrangian relaxation: Geoffrion, Mathematical
 * Programming Study 2, 1974, 82-114): everybody's cheapest line when cover earns its price, and each row
 * at the value that is cheapest when it pays that price.
 *   L = sum over people of least line + sum over rows of min over v of (cost(v) + price x v) + spreads
 */
export function lagrangianBound(
  space: SearchSpace,
  prices: MasterPrices,
  leastLines: number,
): number {
  let bound = leastLines;
  for (let row = 0; row < space.rows.count; row += 1) {
    bound += leastOfRow(space, row, prices.rows[row] ?? 0);
  }
  return bound + spreadTerms(space, prices);
}

function leastOfRow({ rows }: SearchSpace, row: number, price: number): number {
  const from = rows.offsets[row] ?? 0;
  const to = rows.offsets[row + 1] ?? rows.table.length;
  const first = rows.least[row] ?? 0;
  let least = Number.POSITIVE_INFINITY;
  // The table goes one beyond what the people of the row can reach at either end.
  for (let at = from + 1; at < to - 1; at += 1) {
    least = Math.min(least, (rows.table[at] ?? 0) + price * (first + at - from));
  }
  return least;
}

/**
 * most x (price - sum of shares) and least x (sum of shares - price) at their cheapest: a count lies
 * between 0 and the number of days.
 */
function spreadTerms({ spreads, lines, dayCount }: SearchSpace, prices: MasterPrices): number {
  const people = lines.length;
  return spreads.reduce((sum, { priceCents }, index) => {
    const own = (shares: Float64Array) =>
      shares.subarray(index * people, (index + 1) * people).reduce((all, one) => all + one, 0);
    const most = priceCents - own(prices.most);
    const least = own(prices.least) - priceCents;
    return sum + Math.min(0, most * dayCount) + Math.min(0, least * dayCount);
  }, 0);
}
