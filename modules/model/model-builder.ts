import type { LinearModel, Objective } from './linear-model';
import { SparseRows } from './sparse-rows';

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
  readonly #rowNames: string[] = [];
  readonly #rowLower: number[] = [];
  readonly #rowUpper: number[] = [];
  readonly #entries = new SparseRows();
  readonly #legend: string[] = [];
  readonly #offsets = new Map<string, number>();
  readonly #senses: Map<string, Objective['sense']>;

  constructor(
    readonly name: string,
    senses: { readonly [objective: string]: Objective['sense'] },
  ) {
    this.#senses = new Map(Object.entries(senses));
  }

  /** Adds a column and answers its index. */
  addColumn(column: ColumnInput): number {
    return this.#columns.push(column) - 1;
  }

  /** Adds a row and answers its index. */
  addRow({ name, lower, upper, entries }: RowInput): number {
    this.#entries.addRow(entries);
    this.#rowLower.push(lower ?? Number.NEGATIVE_INFINITY);
    this.#rowUpper.push(upper ?? Number.POSITIVE_INFINITY);
    return this.#rowNames.push(name) - 1;
  }

  /** Adds an objective; costs that columns have under its name count from now on. */
  addObjective(objective: string, sense: Objective['sense']): void {
    this.#senses.set(objective, sense);
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
    return {
      name: this.name,
      legend: this.#legend,
      columnNames: columns.map(({ name }) => name),
      columnLower: Float64Array.from(columns, ({ lower }) => lower ?? 0),
      columnUpper: Float64Array.from(columns, ({ upper }) => upper ?? Number.POSITIVE_INFINITY),
      isInteger: Uint8Array.from(columns, ({ isInteger }) => (isInteger ? 1 : 0)),
      rowNames: this.#rowNames,
      rowLower: Float64Array.from(this.#rowLower),
      rowUpper: Float64Array.from(this.#rowUpper),
      ...this.#entries.pack(),
      objectives: this.#buildObjectives(),
    };
  }

  #buildObjectives(): LinearModel['objectives'] {
    return Object.fromEntries(
      [...this.#senses].map(([name, sense]) => {
        const costs = Float64Array.from(this.#columns, (column) => column.costs?.[name] ?? 0);
        return [name, { sense, offset: this.#offsets.get(name) ?? 0, costs }];
      }),
    );
  }
}
