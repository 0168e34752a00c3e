import { type LinearModel, type RosterModel, withRowBounds } from '@/modules/model';

/** Least value of one objective of a model, or null when it has no solution. */
export type LeastValue = (model: LinearModel, objective: string) => number | null;

/** Room for the arithmetic of a solver where a level is kept at its least. */
const tolerance = 1e-6;

/**
 * Least values of the levels, one after the other with those before kept, and of the cost; null when a
 * person has no lawful line.
 */
export function solveLevels(
  { linear, levels }: RosterModel,
  least: LeastValue,
): readonly number[] | null {
  const values: number[] = [];
  let fixed = linear;
  for (const { objective, row } of levels) {
    const value = least(fixed, objective);
    if (value === null) return null;
    values.push(value);
    fixed = withRowBounds(fixed, row, Number.NEGATIVE_INFINITY, value + tolerance);
  }
  const cost = least(fixed, 'cost');
  return cost === null ? null : [...values, cost];
}
