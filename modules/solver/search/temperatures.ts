import type { Ground } from './first-roster';

/** Cents at which an annealing begins and ends. */
export interface Temperatures {
  readonly hotCents: number;
  readonly coldCents: number;
}

/**
 * Temperatures by the scale of the problem: from the better half to a hundredth of what the dearer choices cost,
 * read off the costs of shifts and the steps of the rows, levels left out. Found by trial on problems of
 * both kinds, many small wishes and few large premiums.
 */
export function temperatures({ space }: Ground): Temperatures {
  const { columns, rows } = space;
  const amounts: number[] = [];
  columns.cost.forEach((cost, column) => {
    if (columns.isWork[column] === 1 && cost !== 0) amounts.push(Math.abs(cost));
  });
  for (let at = 1; at < rows.table.length; at += 1) {
    const step = Math.abs((rows.table[at] ?? 0) - (rows.table[at - 1] ?? 0));
    if (step > 0 && step < levelScale) amounts.push(step);
  }
  if (amounts.length === 0) return { hotCents: 100, coldCents: 1 };
  amounts.sort((one, other) => one - other);
  const dear = amounts[Math.floor(0.9 * (amounts.length - 1))] ?? 1;
  return { hotCents: dear * 0.6, coldCents: dear * 0.01 };
}

/** Steps of this many cents belong to a level, not to the cost. */
const levelScale = 1e5;
