import type { LinearModel, Objective } from './linear-model';

export interface ColumnInput {
  readonly name: string;
  /** 0 unless given. */
  readonly lower?: number;
  /** No limit unless given. */
  readonly upper?: number;
  readonly isInteger?: boolean;
  /** Cost by name of objective; a name that is left out costs nothing. */
  readonly costs?: { readonly [objective: string]: number };
}

/** A column and its coefficient. */
export type Entry = readonly [column: number, value: number];

export interface RowInput {
  readonly name: string;
  /** No limit unless given. */
  readonly lower?: number;
  readonly upper?: number;
  readonly entries: readonly Entry[];
}

/** Collects columns and rows one by one and packs them into typed arrays. */
export class ModelBuilder {
  readonly #columns: ColumnInput[] = [];
  readonly #rows: RowInput[] = [];
  readonly #legend: string[] = [];
  readonly #offsets = new Map<string, number>();
  readonly #senses: { readonly [objective: string]: Objective['sense'] };

  constructor(
    readonly name: string,
    senses: { readonly [objective: string]: Objective['sense'] },
  ) {
    this.#senses = senses;
  }

  /** Adds a column and answers its index. */
  addColumn(column: ColumnInput): number {
    return this.#columns.push(column) - 1;
  }

  /** Adds a row and answers its index. */
  addRow(row: RowInput): number {
    return this.#rows.push(row) - 1;
  }

  /** Adds a constant to an objective. */
  addOffset(objective: string, amount: number): void {
    this.#offsets.set(objective, (this.#offsets.get(objective) ?? 0) + amount);
  }

  /** Adds a line that explains names. */
  explain(line: string): void {
    this.#legend.push(line);
  }

  build(): LinearModel {
    const columns = this.#columns;
    const rows = this.#rows;
    return {
      name: this.name,
      legend: this.#legend,
      columnNames: columns.map(({ name }) => name),
      columnLower: Float64Array.from(columns, ({ lower }) => lower ?? 0),
      columnUpper: Float64Array.from(columns, ({ upper }) => upper ?? Number.POSITIVE_INFINITY),
      isInteger: Uint8Array.from(columns, ({ isInteger }) => (isInteger ? 1 : 0)),
      rowNames: rows.map(({ name }) => name),
      rowLower: Float64Array.from(rows, ({ lower }) => lower ?? Number.NEGATIVE_INFINITY),
      rowUpper: Float64Array.from(rows, ({ upper }) => upper ?? Number.POSITIVE_INFINITY),
      ...packRows(rows),
      objectives: this.#buildObjectives(),
    };
  }

  #buildObjectives(): LinearModel['objectives'] {
    return Object.fromEntries(
      Object.entries(this.#senses).map(([name, sense]) => {
        const costs = Float64Array.from(this.#columns, (column) => column.costs?.[name] ?? 0);
        return [name, { sense, offset: this.#offsets.get(name) ?? 0, costs }];
      }),
    );
  }
}

function packRows(rows: readonly RowInput[]): Pick<LinearModel, 'starts' | 'indices' | 'values'> {
  const starts = new Int32Array(rows.length + 1);
  rows.forEach((row, index) => {
    starts[index + 1] = (starts[index] ?? 0) + row.entries.length;
  });
  const count = starts[rows.length] ?? 0;
  const indices = new Int32Array(count);
  const values = new Float64Array(count);
  let position = 0;
  for (const row of rows) {
    for (const [column, value] of row.entries) {
      indices[position] = column;
      values[position] = value;
      position += 1;
    }
  }
  return { starts, indices, values };
}
