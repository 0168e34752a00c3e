import type { RosterModel } from '../../model';

/**
 * What the rows that join people cost by their value: the sum of coefficient x (person on shift). A row is
 * kept by elastic columns (people missing, people too many, units of a broken rule), the cheapest first,
 * so its cost is a convex function of the value. Whole values are looked up in a table.
 */
export interface RowCosts {
  readonly count: number;
  /** The row of the model. */
  readonly modelRows: Int32Array;
  /** cost of value v of row r: `table[offsets[r] + v - least[r]]`. */
  readonly offsets: Int32Array;
  readonly least: Int32Array;
  readonly table: Float64Array;
  /**
   * 1 for the dearest elastic column of a row on either side. People never use more of it than its bound
   * allows; relaxations leave the bound out, or it would earn a dual beyond what the row costs.
   */
  readonly isUnbounded: Uint8Array;
}

interface Step {
  readonly column: number;
  readonly units: number;
  readonly price: number;
}

/** Reads the elastic columns of the rows and tabulates their cheapest use. */
export function readRowCosts(
  model: RosterModel,
  costs: Float64Array,
  rows: readonly number[],
): RowCosts {
  const { linear } = model;
  const isWork = new Uint8Array(linear.columnNames.length);
  for (const { columns } of model.works) for (const { column } of columns) isWork[column] = 1;
  const offsets = new Int32Array(rows.length);
  const least = new Int32Array(rows.length);
  const table: number[] = [];
  const isUnbounded = new Uint8Array(linear.columnNames.length);
  rows.forEach((row, position) => {
    const below: Step[] = [];
    const above: Step[] = [];
    let [from, to] = [0, 0];
    for (let at = linear.starts[row] ?? 0; at < (linear.starts[row + 1] ?? 0); at += 1) {
      const column = linear.indices[at] ?? 0;
      const value = linear.values[at] ?? 0;
      if (isWork[column]) {
        if (value > 0) to += value;
        else from += value;
        continue;
      }
      const units = (linear.columnUpper[column] ?? 0) * Math.abs(value);
      const price = (costs[column] ?? 0) / Math.abs(value);
      (value > 0 ? below : above).push({ column, units, price });
    }
    for (const steps of [below, above]) {
      const [dearest] = [...steps].sort((one, other) => other.price - one.price);
      if (dearest) isUnbounded[dearest.column] = 1;
    }
    const cost = costOf(
      linear.rowLower[row] ?? Number.NEGATIVE_INFINITY,
      linear.rowUpper[row] ?? Number.POSITIVE_INFINITY,
      below,
      above,
    );
    offsets[position] = table.length;
    // One beyond either end, so that the price of one step more or less can always be looked up.
    least[position] = from - 1;
    for (let value = from - 1; value <= to + 1; value += 1) table.push(cost(value));
  });
  return {
    count: rows.length,
    modelRows: Int32Array.from(rows),
    offsets,
    least,
    table: Float64Array.from(table),
    isUnbounded,
  };
}

function costOf(
  lower: number,
  upper: number,
  below: readonly Step[],
  above: readonly Step[],
): (value: number) => number {
  const byPrice = (one: Step, other: Step) => one.price - other.price;
  const under = [...below].sort(byPrice);
  const over = [...above].sort(byPrice);
  return (value) => fill(under, lower - value) + fill(over, value - upper);
}

/** Price of so many units, the cheapest first; beyond all steps the dearest goes on. */
function fill(steps: readonly Step[], units: number): number {
  let open = Math.max(0, units);
  let cost = 0;
  for (const step of steps) {
    const used = Math.min(open, step.units);
    cost += used === 0 ? 0 : used * step.price;
    open -= used;
  }
  return open === 0 ? cost : cost + open * (steps.at(-1)?.price ?? 0);
}
