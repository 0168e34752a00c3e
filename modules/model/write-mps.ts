import { type LinearModel, objectiveOf } from './linear-model';
import {
  columnNamesOf,
  commentsOf,
  constantName,
  objectiveNameOf,
  objectiveTerms,
  rowNamesOf,
} from './model-text';

/**
 * The model with one objective in the free MPS format, in the common ground of CBC, GLPK and HiGHS: names
 * as in the LP file, a row with two bounds in the section of ranges, rows without bounds left out, the
 * constant of the objective a fixed column, every bound written, since readers differ on the usual ones
 * of whole-number columns. The format knows no sense: an objective to be made greatest is written with
 * the opposite signs.
 */
export function writeMps(model: LinearModel, objectiveName: string): string {
  const objective = objectiveOf(model, objectiveName);
  const sign = objective.sense === 'minimise' ? 1 : -1;
  // Objective and rows share their names here, and a level has both.
  const cost = `objective_${objectiveNameOf(objectiveName)}`;
  const columns = columnNamesOf(model);
  const rows = readRows(model);
  const costs = new Map(
    objectiveTerms(columns, objective).map(([name, value]) => [name, sign * value]),
  );
  const lines = [
    ...commentsOf(model, objectiveName).map((line) => `* ${line}`),
    'NAME roster FREE',
    'ROWS',
    ` N ${cost}`,
    ...rows.map(({ kind, name }) => ` ${kind} ${name}`),
    'COLUMNS',
    ...writeColumns(model, columns, rows, (name) => {
      const value = costs.get(name);
      return value === undefined ? [] : [` ${name} ${cost} ${value}`];
    }),
    'RHS',
    ...rows.flatMap(({ name, side }) => (side === 0 ? [] : [` RHS ${name} ${side}`])),
    'RANGES',
    ...rows.flatMap(({ name, range }) => (range === null ? [] : [` RNG ${name} ${range}`])),
    'BOUNDS',
    ` FX BND ${constantName} 1`,
    ...columns.flatMap((name, column) => writeBounds(model, column, name)),
    'ENDATA',
  ];
  return `${lines.join('\n')}\n`;
}

interface MpsRow {
  readonly index: number;
  readonly name: string;
  /** E: equal, G: at least, L: at most. */
  readonly kind: 'E' | 'G' | 'L';
  readonly side: number;
  /** How far a row with two bounds reaches from its side. */
  readonly range: number | null;
}

function readRows(model: LinearModel): MpsRow[] {
  return rowNamesOf(model).flatMap((name, index): MpsRow[] => {
    const lower = model.rowLower[index] ?? Number.NEGATIVE_INFINITY;
    const upper = model.rowUpper[index] ?? Number.POSITIVE_INFINITY;
    if (lower === upper) return [{ index, name, kind: 'E', side: lower, range: null }];
    if (Number.isFinite(lower)) {
      const range = Number.isFinite(upper) ? upper - lower : null;
      return [{ index, name, kind: 'G', side: lower, range }];
    }
    return Number.isFinite(upper) ? [{ index, name, kind: 'L', side: upper, range: null }] : [];
  });
}

/** Column by column, those of whole numbers between markers. */
function writeColumns(
  model: LinearModel,
  columns: readonly string[],
  rows: readonly MpsRow[],
  writeCost: (name: string) => string[],
): string[] {
  const cells = columns.map((name) => writeCost(name));
  for (const { index, name: row } of rows) {
    const to = model.starts[index + 1] ?? 0;
    for (let at = model.starts[index] ?? 0; at < to; at += 1) {
      const column = model.indices[at] ?? 0;
      cells[column]?.push(` ${columns[column]} ${row} ${model.values[at]}`);
    }
  }
  // A column without any entry must be named all the same.
  const [anyRow] = rows;
  const lines = cells.map((own, column) =>
    own.length > 0 || !anyRow ? own : [` ${columns[column]} ${anyRow.name} 0`],
  );
  const of = (isInteger: 0 | 1) =>
    lines.filter((_, column) => model.isInteger[column] === isInteger);
  return [
    ...of(0).flat(),
    ...writeCost(constantName),
    " M1 'MARKER' 'INTORG'",
    ...of(1).flat(),
    " M2 'MARKER' 'INTEND'",
  ];
}

function writeBounds(model: LinearModel, column: number, name: string): string[] {
  const lower = model.columnLower[column] ?? 0;
  const upper = model.columnUpper[column] ?? Number.POSITIVE_INFINITY;
  if (lower === upper) return [` FX BND ${name} ${lower}`];
  if (!Number.isFinite(lower) && !Number.isFinite(upper)) return [` FR BND ${name}`];
  return [
    Number.isFinite(lower) ? ` LO BND ${name} ${lower}` : ` MI BND ${name}`,
    Number.isFinite(upper) ? ` UP BND ${name} ${upper}` : ` PL BND ${name}`,
  ];
}
