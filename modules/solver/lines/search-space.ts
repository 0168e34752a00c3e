import {
  buildPersonLines,
  type LinearModel,
  objectiveOf,
  type PersonLines,
  type RosterModel,
} from '../../model';
import { endCosts } from './end-costs';
import { type RowCosts, readRowCosts } from './row-costs';

/**
 * A roster model as the search over lines reads it: everybody's net, the work columns as flat arrays, and
 * what each value of a row that joins people costs. Costs are of one blended objective in cents: levels
 * count with weights so great that they come first in practice; what is kept is compared level by level.
 */
export interface SearchSpace {
  readonly model: RosterModel;
  readonly lines: readonly PersonLines[];
  readonly dayCount: number;
  readonly columns: ColumnArrays;
  readonly rows: RowCosts;
  /** By person: extra cost of each end node. */
  readonly ends: readonly Float64Array[];
  readonly spreads: readonly SpreadTerm[];
}

/** By work column (columns of the model that are no work have no person). */
export interface ColumnArrays {
  readonly cost: Float64Array;
  /** Its group in the net of its person; -1 for a column that no line can use. */
  readonly group: Int16Array;
  /** 1 for a work column. */
  readonly isWork: Uint8Array;
  /** Rows of column c: `rows[starts[c]]` to `rows[starts[c + 1]]`, as positions in `RowCosts`. */
  readonly starts: Int32Array;
  readonly rows: Int32Array;
  readonly coefficients: Float64Array;
}

/** A price on the distance between most and least of a count that the ends of lines know. */
export interface SpreadTerm {
  /** Position in problem.fairness. */
  readonly termIndex: number;
  readonly measure: 'nights' | 'weekends';
  readonly priceCents: number;
  /** By person: whether they take part. */
  readonly takesPart: Uint8Array;
}

/** Makes the space of a model for a blended objective of that name. */
export function makeSearchSpace(model: RosterModel, objectiveName: string): SearchSpace {
  const { problem, linear } = model;
  const costs = objectiveOf(linear, objectiveName).costs;
  // Overtime in a budget is no elastic column: what it comes to depends on whole lines.
  const teamRows = model.teamRows.filter(({ others }) => others.length === 0);
  const coupling = [...model.floors, ...model.ceilings, ...teamRows]
    .map(({ row }) => row)
    .filter((row) => isNarrow(model, row));
  const lines = buildPersonLines(problem, model.works);
  return {
    model,
    lines,
    dayCount: problem.days.length,
    columns: readColumns(model, lines, costs, coupling),
    rows: readRowCosts(model, costs, coupling),
    ends: lines.map((own) => endCosts(problem, own)),
    spreads: readSpreads(model),
  };
}

/** Spread terms that a line's end can tell; with fewer than two people there is nothing to compare. */
function readSpreads({ problem }: RosterModel): SpreadTerm[] {
  const takesPart = Uint8Array.from(problem.people, ({ isOutside }) => (isOutside ? 0 : 1));
  const count = takesPart.reduce((sum, one) => sum + one, 0);
  if (count < 2) return [];
  return problem.fairness.flatMap((term, termIndex) =>
    term.kind === 'spread' && term.measure !== 'refusedWishes'
      ? [{ termIndex, measure: term.measure, priceCents: term.priceCents, takesPart }]
      : [],
  );
}

/** Rows of wide range (a budget in cents) are left to the compact model: no table could hold them. */
const widestRow = 4096;

function isNarrow({ linear, works }: RosterModel, row: number): boolean {
  const first = linear.starts[row] ?? 0;
  const last = linear.starts[row + 1] ?? 0;
  const values = linear.values.subarray(first, last);
  const range = values.reduce((sum, value) => sum + Math.abs(value), 0);
  return range <= widestRow + works.length && values.every(Number.isInteger);
}

function readColumns(
  { linear, works }: RosterModel,
  lines: readonly PersonLines[],
  costs: Float64Array,
  coupling: readonly number[],
): ColumnArrays {
  const count = linear.columnNames.length;
  const group = new Int16Array(count).fill(-1);
  const isWork = new Uint8Array(count);
  for (const { columns } of works) for (const { column } of columns) isWork[column] = 1;
  for (const { options, net } of lines) {
    options.forEach((works, at) => {
      for (const { column } of works) group[column] = at % net.groupCount;
    });
  }
  const starts = new Int32Array(count + 1);
  eachEntry(linear, coupling, (column) => {
    starts[column + 1] = (starts[column + 1] ?? 0) + 1;
  });
  for (let column = 0; column < count; column += 1) {
    starts[column + 1] = (starts[column + 1] ?? 0) + (starts[column] ?? 0);
  }
  const filled = starts.slice(0, count);
  const rows = new Int32Array(starts[count] ?? 0);
  const coefficients = new Float64Array(rows.length);
  eachEntry(linear, coupling, (column, value, position) => {
    const at = filled[column] ?? 0;
    filled[column] = at + 1;
    rows[at] = position;
    coefficients[at] = value;
  });
  return { cost: costs, group, isWork, starts, rows, coefficients };
}

function eachEntry(
  { starts, indices, values }: LinearModel,
  rows: readonly number[],
  visit: (column: number, value: number, position: number) => void,
): void {
  rows.forEach((row, position) => {
    for (let at = starts[row] ?? 0; at < (starts[row + 1] ?? 0); at += 1) {
      visit(indices[at] ?? 0, values[at] ?? 0, position);
    }
  });
}
