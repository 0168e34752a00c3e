import { type LinearModel, objectiveOf } from './linear-model';

const termsPerLine = 8;
const lineLength = 200;

/**
 * The model with one objective in the CPLEX LP format, in the common ground of CBC, GLPK and HiGHS: a
 * row with two bounds becomes two rows, the constant of the objective a fixed column, names keep only
 * letters, figures and underscores and stay unique. Legend lines become comments.
 */
export function writeLp(model: LinearModel, objectiveName: string): string {
  const objective = objectiveOf(model, objectiveName);
  const columns = safeNames(model.columnNames, 'x_');
  const constant = 'constant_part';
  const terms = [...objective.costs].flatMap((cost, column) =>
    cost === 0 ? [] : [term(cost, columns[column] ?? '')],
  );
  const comments = [`${model.name}, objective ${objectiveName}`, ...model.legend];
  const lines = [
    ...comments.map((line) => `\\ ${plainText(line)}`),
    objective.sense === 'minimise' ? 'Minimize' : 'Maximize',
    ...wrap(`${safeName(objectiveName, 'o_')}:`, [...terms, term(objective.offset, constant)]),
    'Subject To',
    ...writeRows(model, columns),
    'Bounds',
    ` ${constant} = 1`,
    ...columns.map((name, column) => writeBounds(model, column, name)),
    ...writeIntegers(model, columns),
    'End',
  ];
  return `${lines.join('\n')}\n`;
}

function writeRows(model: LinearModel, columns: readonly string[]): string[] {
  const names = safeNames(model.rowNames, 'r_');
  return names.flatMap((name, row) => {
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
  if (from === to) return [term(0, columns[0] ?? 'constant_part')];
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

const safeName = (name: string, prefix: string): string => {
  const kept = name.replace(/[^A-Za-z0-9]+/g, '_').replace(/^_+|_+$/g, '');
  // A name may not begin with a figure, and one like e12 would be read as a number.
  return /^[A-Za-z]/.test(kept) && !/^[eE][0-9]/.test(kept) ? kept : `${prefix}${kept}`;
};

function safeNames(names: readonly string[], prefix: string): string[] {
  const seen = new Set<string>();
  return names.map((name, index) => {
    const safe = safeName(name, prefix);
    const unique = seen.has(safe) ? `${safe}_${prefix}${index}` : safe;
    seen.add(unique);
    return unique;
  });
}

/** Comments in plain ASCII on one short line, so that every reader skips them. */
const plainText = (line: string): string =>
  line
    .normalize('NFKD')
    .replace(/[^\x20-\x7e]/g, '')
    .slice(0, lineLength);
