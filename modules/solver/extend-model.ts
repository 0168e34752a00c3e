import { type ColumnInput, type LinearModel, ModelBuilder, type RowInput } from '../model';

/** More columns and rows for a model; entries count the new columns on from the last of the model. */
export interface Extension {
  readonly columns: readonly ColumnInput[];
  readonly rows: readonly RowInput[];
  /** Names of new objectives, to be made least. */
  readonly objectives: readonly string[];
}

/** The model with more columns, rows and objectives; what it had keeps its place. */
export function extendModel(linear: LinearModel, extension: Extension): LinearModel {
  const senses = Object.entries(linear.objectives).map(
    ([name, { sense }]) => [name, sense] as const,
  );
  const added = extension.objectives.map((name) => [name, 'minimise'] as const);
  const builder = new ModelBuilder(linear.name, Object.fromEntries([...senses, ...added]));
  for (const line of linear.legend) builder.explain(line);
  for (const [name, { offset }] of Object.entries(linear.objectives))
    builder.addOffset(name, offset);
  linear.columnNames.forEach((name, column) => {
    builder.addColumn({
      name,
      lower: linear.columnLower[column] ?? 0,
      upper: linear.columnUpper[column] ?? Number.POSITIVE_INFINITY,
      isInteger: linear.isInteger[column] === 1,
      costs: costsOf(linear, column),
    });
  });
  for (const column of extension.columns) builder.addColumn(column);
  linear.rowNames.forEach((name, row) => {
    const [from, to] = [linear.starts[row] ?? 0, linear.starts[row + 1] ?? 0];
    builder.addRow({
      name,
      lower: linear.rowLower[row] ?? Number.NEGATIVE_INFINITY,
      upper: linear.rowUpper[row] ?? Number.POSITIVE_INFINITY,
      entries: Array.from({ length: to - from }, (_, at) => [
        linear.indices[from + at] ?? 0,
        linear.values[from + at] ?? 0,
      ]),
    });
  });
  for (const row of extension.rows) builder.addRow(row);
  return builder.build();
}

function costsOf({ objectives }: LinearModel, column: number): { [objective: string]: number } {
  const costs: { [objective: string]: number } = {};
  for (const [name, objective] of Object.entries(objectives)) {
    const cost = objective.costs[column] ?? 0;
    if (cost !== 0) costs[name] = cost;
  }
  return costs;
}
