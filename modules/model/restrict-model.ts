import type { LinearModel, Objective } from './linear-model';

/** A part of a model: the columns that stay free; all others keep their values. */
export interface RestrictedModel {
  readonly linear: LinearModel;
  /** Column of the whole model by column of the part. */
  readonly columns: Int32Array;
}

/**
 * The part of a model that is left when the chosen whole-number columns are free and the other ones keep
 * the values of a solution. Continuous columns in touched rows go free with them. Rows without a free
 * column, and rows without a bound, are left out; the fixed part goes into bounds and offsets.
 */
export function restrictModel(
  linear: LinearModel,
  values: Float64Array,
  isChosen: Uint8Array,
): RestrictedModel {
  const isFree = isChosen.slice();
  freeTouched(linear, isFree);
  const columns = Int32Array.from(isFree.keys()).filter((column) => isFree[column] === 1);
  const placeOf = new Int32Array(isFree.length).fill(-1);
  columns.forEach((column, place) => {
    placeOf[column] = place;
  });
  const pick = (array: Float64Array) => Float64Array.from(columns, (column) => array[column] ?? 0);
  return {
    columns,
    linear: {
      name: linear.name,
      legend: [],
      columnNames: Array.from(columns, (column) => linear.columnNames[column] ?? ''),
      columnLower: pick(linear.columnLower),
      columnUpper: pick(linear.columnUpper),
      isInteger: Uint8Array.from(columns, (column) => linear.isInteger[column] ?? 0),
      ...pickRows(linear, values, placeOf),
      objectives: Object.fromEntries(
        Object.entries(linear.objectives).map(([name, objective]) => [
          name,
          pickObjective(objective, values, isFree, columns),
        ]),
      ),
    },
  };
}

/** Columns that take fractions and share a row with a chosen column are free too. */
function freeTouched({ starts, indices, isInteger, rowNames }: LinearModel, isFree: Uint8Array) {
  for (let row = 0; row < rowNames.length; row += 1) {
    const [from, to] = [starts[row] ?? 0, starts[row + 1] ?? 0];
    let isTouched = false;
    for (let at = from; at < to && !isTouched; at += 1) {
      const column = indices[at] ?? 0;
      isTouched = isFree[column] === 1 && isInteger[column] === 1;
    }
    if (!isTouched) continue;
    for (let at = from; at < to; at += 1) {
      const column = indices[at] ?? 0;
      if (isInteger[column] === 0) isFree[column] = 1;
    }
  }
}

type Rows = Pick<
  LinearModel,
  'rowNames' | 'rowLower' | 'rowUpper' | 'starts' | 'indices' | 'values'
>;

function pickRows(linear: LinearModel, values: Float64Array, placeOf: Int32Array): Rows {
  const rowNames: string[] = [];
  const rowLower: number[] = [];
  const rowUpper: number[] = [];
  const starts = [0];
  const indices: number[] = [];
  const entries: number[] = [];
  linear.rowNames.forEach((name, row) => {
    const lower = linear.rowLower[row] ?? Number.NEGATIVE_INFINITY;
    const upper = linear.rowUpper[row] ?? Number.POSITIVE_INFINITY;
    if (!Number.isFinite(lower) && !Number.isFinite(upper)) return;
    let fixed = 0;
    const before = indices.length;
    for (let at = linear.starts[row] ?? 0; at < (linear.starts[row + 1] ?? 0); at += 1) {
      const column = linear.indices[at] ?? 0;
      const place = placeOf[column] ?? -1;
      const value = linear.values[at] ?? 0;
      if (place < 0) fixed += value * (values[column] ?? 0);
      else {
        indices.push(place);
        entries.push(value);
      }
    }
    if (indices.length === before) return;
    rowNames.push(name);
    rowLower.push(lower - fixed);
    rowUpper.push(upper - fixed);
    starts.push(indices.length);
  });
  return {
    rowNames,
    rowLower: Float64Array.from(rowLower),
    rowUpper: Float64Array.from(rowUpper),
    starts: Int32Array.from(starts),
    indices: Int32Array.from(indices),
    values: Float64Array.from(entries),
  };
}

function pickObjective(
  { sense, offset, costs }: Objective,
  values: Float64Array,
  isFree: Uint8Array,
  columns: Int32Array,
): Objective {
  let fixed = offset;
  costs.forEach((cost, column) => {
    if (isFree[column] === 0) fixed += cost * (values[column] ?? 0);
  });
  return { sense, offset: fixed, costs: Float64Array.from(columns, (c) => costs[c] ?? 0) };
}
