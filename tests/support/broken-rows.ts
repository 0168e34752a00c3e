import { completeValues, placeRoster, type RosterModel } from '@/modules/model';
import type { PlannedRoster } from '@/modules/problem';

const tolerance = 1e-6;

/** Names of the rows of the model that a roster breaks, with every other column at its least. */
export function brokenRows(model: RosterModel, roster: PlannedRoster): string[] {
  const values = completeValues(model, placeRoster(model, roster));
  const { linear } = model;
  return linear.rowNames.filter((_, row) => {
    const from = linear.starts[row] ?? 0;
    const columns = linear.indices.subarray(from, linear.starts[row + 1]);
    const sum = columns.reduce(
      (total, column, index) => total + (values[column] ?? 0) * (linear.values[from + index] ?? 0),
      0,
    );
    const lower = linear.rowLower[row] ?? Number.NEGATIVE_INFINITY;
    const upper = linear.rowUpper[row] ?? Number.POSITIVE_INFINITY;
    return sum < lower - tolerance || sum > upper + tolerance;
  });
}

/** The families of the rows a roster breaks, each once: `rest` of `rest(p0,d0,900)`. */
export const brokenFamilies = (model: RosterModel, roster: PlannedRoster): string[] => [
  ...new Set(brokenRows(model, roster).map((name) => name.replace(/\(.*/, ''))),
];
