import { type LinearModel, objectiveOf } from './linear-model';
import {
  columnNamesOf,
  commentsOf,
  constantName,
  objectiveNameOf,
  objectiveTerms,
  rowNamesOf,
} from './model-text';

const termsPerLine = 8;

/**
 * The model with one objective in the CPLEX LP format, in the common ground of CBC, GLPK and HiGHS: a
 * row with two bounds becomes two rows, the constant of the objective a fixed column, names keep only
 * letters, figures and underscores and stay unique. Legend lines become comments.
 */
export function writeLp(model: LinearModel, objectiveName: string): string {
  const objective = objectiveOf(model, objectiveName);
  const columns = columnNamesOf(model);
  const terms = objectiveTerms(columns, objective).map(([name, value]) => term(value, name));
  const lines = [
    ...commentsOf(model, objectiveName).map((line) => `\\ ${line}`),
    objective.sense === 'minimise' ? 'Minimize' : 'Maximize',
    ...wrap(`${objectiveNameOf(objectiveName)}:`, terms),
    'Subject To',
    ...writeRows(model, columns),
    'Bounds',
    ` ${constantName} = 1`,
    ...columns.map((name, column) => writeBounds(model, column, name)),
    ...writeIntegers(model, columns),
    'End',
  ];
  return `${lines.join('\n')}\n`;
}

function writeRows(model: LinearModel, columns: readonly string[]): string[] {
  return rowNamesOf(model).flatMap((name, row) => {
    const lower = model.rowLower[row] ?? Number.NEGATIVE_INFINITY;
    const upper = model.rowUpper[row] ?? Number.POSITIVE_INFINITY;
    const terms = termsOf(model, row, columns);
    if (lower === upper) return wrap(`${name}:`, terms, `= ${number(lower)}`);
    const isRange = Number.isFinite(lower) && Number.isFinite(upper);
    return [
      ...(Number.isFinite(lower)
        ? wrap(`${name}${isRange ? '_from' : ''}:`, terms, `>= ${number(lower)}`)
        : []),
      ...(Number.isFinite(upper)
        ? wrap(`${name}${isRange ? '_to' : ''}:`, terms, `<= ${number(upper)}`)
        : []),
    ];
  });
}

/** A row without entries names the first column with 0, since the format has no empty rows. */
function termsOf(model: LinearModel, row: number, columns: readonly string[]): string[] {
  const from = model.starts[row] ?? 0;
  const to = model.starts[row + 1] ?? 0;
  if (from === to) return [term(0, columns[0] ?? constantName)];
  return Array.from(model.indices.subarray(from, to), (column, index) =>
    term(model.values[from + index] ?? 0, columns[column] ?? ''),
  );
}

function writeBounds(model: LinearModel, column: number, name: string): string {
  const lower = model.columnLower[column] ?? 0;
  const upper = model.columnUpper[column] ?? Number.POSITIVE_INFINITY;
  if (lower === upper) return ` ${name} = ${number(lower)}`;
  if (!Number.isFinite(lower) && !Number.isFinite(upper)) return ` ${name} free`;
  const from = Number.isFinite(lower) ? number(lower) : '-inf';
  return Number.isFinite(upper)
    ? ` ${from} <= ${name} <= ${number(upper)}`
    : ` ${name} >= ${number(lower)}`;
}

function writeIntegers(model: LinearModel, columns: readonly string[]): string[] {
  const integers = columns.filter((_, column) => model.isInteger[column] === 1);
  return integers.length === 0 ? [] : ['General', ...wrap('', integers)];
}

const number = (value: number): string => String(value);

const term = (value: number, name: string): string =>
  `${value < 0 ? '-' : '+'} ${number(Math.abs(value))} ${name}`;

/** Breaks terms over lines: some readers refuse long lines. */
function wrap(head: string, terms: readonly string[], tail = ''): string[] {
  const lines: string[] = [];
  for (let from = 0; from < terms.length; from += termsPerLine) {
    lines.push(terms.slice(from, from + termsPerLine).join(' '));
  }
  return lines.map((line, index) =>
    [
      ' ',
      ...(index === 0 && head ? [head] : []),
      line,
      ...(index === lines.length - 1 && tail ? [tail] : []),
    ].join(' '),
  );
}
