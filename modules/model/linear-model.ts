/**
 * A linear program, plain or with whole-number columns: bounds on columns and rows, a sparse matrix
 * stored row by row (row `i` holds the entries `starts[i]` to `starts[i + 1]`), and named objectives of
 * which one is chosen when it is solved or written. A missing bound is an infinity.
 */
export interface LinearModel {
  readonly name: string;
  /** What the short names of columns and rows stand for, a line each; comments of the LP file. */
  readonly legend: readonly string[];
  readonly columnNames: readonly string[];
  readonly columnLower: Float64Array;
  readonly columnUpper: Float64Array;
  /** 1: whole numbers only. */
  readonly isInteger: Uint8Array;
  readonly rowNames: readonly string[];
  readonly rowLower: Float64Array;
  readonly rowUpper: Float64Array;
  readonly starts: Int32Array;
  readonly indices: Int32Array;
  readonly values: Float64Array;
  readonly objectives: { readonly [name: string]: Objective };
}

/** Sum of `costs[column] x value[column]`, plus a constant. */
export interface Objective {
  readonly sense: 'minimise' | 'maximise';
  readonly offset: number;
  readonly costs: Float64Array;
}

/** The objective of that name; an unknown name is a bug of the caller and throws. */
export function objectiveOf(model: LinearModel, name: string): Objective {
  const objective = model.objectives[name];
  if (!objective) throw new Error(`The model ${model.name} has no objective ${name}.`);
  return objective;
}

/** The same model with other bounds on one row. */
export function withRowBounds(
  model: LinearModel,
  row: number,
  lower: number,
  upper: number,
): LinearModel {
  const rowLower = model.rowLower.slice();
  const rowUpper = model.rowUpper.slice();
  rowLower[row] = lower;
  rowUpper[row] = upper;
  return { ...model, rowLower, rowUpper };
}

/**
 * The same model with one more objective to be made least: the sum of weight x objective. With great
 * weights some come first, but only nearly: proofs need them one after the other.
 */
export function withBlend(
  model: LinearModel,
  name: string,
  parts: readonly (readonly [objective: string, weight: number])[],
): LinearModel {
  const costs = new Float64Array(model.columnNames.length);
  let offset = 0;
  for (const [part, weight] of parts) {
    const objective = objectiveOf(model, part);
    offset += weight * objective.offset;
    for (const [column, cost] of objective.costs.entries()) {
      costs[column] = (costs[column] ?? 0) + weight * cost;
    }
  }
  return {
    ...model,
    objectives: { ...model.objectives, [name]: { sense: 'minimise', offset, costs } },
  };
}

/** The linear relaxation: every column may take fractions. */
export function relaxed(model: LinearModel): LinearModel {
  return { ...model, isInteger: new Uint8Array(model.isInteger.length) };
}
