import type { LinearModel } from './linear-model';

/** A column that takes whole numbers from 0 to 1, with its cost and its entries by row. */
export interface WholeColumn {
  readonly cost: number;
  readonly entries: ReadonlyMap<number, number>;
}

/** The model, which must have the objective `cost`, with columns added at its end. */
export function addWholeColumns(linear: LinearModel, added: readonly WholeColumn[]): LinearModel {
  const first = linear.columnNames.length;
  const byRow: [column: number, value: number][][] = linear.rowNames.map(() => []);
  added.forEach(({ entries }, index) => {
    for (const [row, value] of entries) if (value !== 0) byRow[row]?.push([first + index, value]);
  });
  const starts = [0];
  const indices: number[] = [];
  const values: number[] = [];
  byRow.forEach((entries, row) => {
    for (let at = linear.starts[row] ?? 0; at < (linear.starts[row + 1] ?? 0); at += 1) {
      indices.push(linear.indices[at] ?? 0);
      values.push(linear.values[at] ?? 0);
    }
    for (const [column, value] of entries) {
      indices.push(column);
      values.push(value);
    }
    starts.push(indices.length);
  });
  const cost = linear.objectives.cost;
  const costs = Float64Array.from([...(cost?.costs ?? []), ...added.map((column) => column.cost)]);
  const extend = (array: Float64Array, value: number) =>
    Float64Array.from([...array, ...added.map(() => value)]);
  return {
    ...linear,
    columnNames: [...linear.columnNames, ...added.map((_, index) => `pattern${index}`)],
    columnLower: extend(linear.columnLower, 0),
    columnUpper: extend(linear.columnUpper, 1),
    isInteger: Uint8Array.from([...linear.isInteger, ...added.map(() => 1)]),
    starts: Int32Array.from(starts),
    indices: Int32Array.from(indices),
    values: Float64Array.from(values),
    objectives: { cost: { sense: 'minimise', offset: cost?.offset ?? 0, costs } },
  };
}
