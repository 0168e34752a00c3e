import { greatestDivisor } from './levels';
import { objectiveOf } from './linear-model';
import type { RosterModel } from './roster-model';
import { roundingSlackCents } from './rounding-slack';

/** Every roster costs `baseCents` plus a whole multiple of `stepCents`. */
export interface CostGrid {
  readonly baseCents: number;
  readonly stepCents: number;
}

/**
 * The values a cost can take, so that a bound can be rounded up to the next: whole cents, or coarser when
 * every price is a multiple of something. Columns that take fractions (minutes of overtime) and sums that
 * are rounded leave whole cents.
 */
export function costGrid(model: RosterModel): CostGrid {
  const { costs, offset } = objectiveOf(model.linear, 'cost');
  const wholeCents = { baseCents: 0, stepCents: 1 };
  if (roundingSlackCents(model) > 0 || model.overtimes.some(({ length }) => length > 0)) {
    return wholeCents;
  }
  if (!Number.isInteger(offset) || !costs.every(Number.isInteger)) return wholeCents;
  const stepCents = costs.reduce(greatestDivisor, 0);
  return stepCents > 1 ? { baseCents: offset, stepCents } : wholeCents;
}
