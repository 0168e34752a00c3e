import type { LinearModel, Objective } from './linear-model';

/*
 * What the text forms of a model share: names that every reader takes, comments, and the constant of the
 * objective as a fixed column, which CBC, GLPK and HiGHS all read alike.
 */

/** Column of value 1 that carries the constant of the objective. */
export const constantName = 'constant_part';

/** Column names: letters, figures and underscores only, and unique. */
export const columnNamesOf = ({ columnNames }: LinearModel): string[] =>
  safeNames(columnNames, 'x_');

/** Row names, in the same way. */
export const rowNamesOf = ({ rowNames }: LinearModel): string[] => safeNames(rowNames, 'r_');

/** Name of an objective, in the same way. */
export const objectiveNameOf = (name: string): string => safeName(name, 'o_');

/** What stands in the comments: the model, the objective and the legend. */
export const commentsOf = (model: LinearModel, objectiveName: string): string[] =>
  [`${model.name}, objective ${objectiveName}`, ...model.legend].map(plainText);

/** Columns that the objective counts, with their costs; the constant last. */
export function objectiveTerms(
  columns: readonly string[],
  { costs, offset }: Objective,
): (readonly [name: string, value: number])[] {
  const terms: (readonly [string, number])[] = [];
  costs.forEach((cost, column) => {
    if (cost !== 0) terms.push([columns[column] ?? '', cost]);
  });
  return [...terms, [constantName, offset]];
}

const lineLength = 200;

/** Plain ASCII on one short line, so that every reader skips it. */
const plainText = (line: string): string =>
  line
    .normalize('NFKD')
    .replace(/[^\x20-\x7e]/g, '')
    .slice(0, lineLength);

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
