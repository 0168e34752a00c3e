import type { LinearOutcome } from './linear-outcome';
import type { LinearOptions } from './linear-solver';

/** Columns to add to a model that is being solved again and again; entries as in `LinearModel` but by column. */
export interface NewColumns {
  readonly costs: readonly number[];
  readonly lower: readonly number[];
  readonly upper: readonly number[];
  /** Column `i` holds the entries `starts[i]` to `starts[i + 1]`. */
  readonly starts: readonly number[];
  readonly rows: readonly number[];
  readonly values: readonly number[];
}

/**
 * A linear program kept in the solver between solves, so that each starts from the last basis. Always close
 * it: the memory of the solver is not collected.
 */
export interface LinearSession {
  addColumns(columns: NewColumns): void;
  changeRowBounds(row: number, lower: number, upper: number): void;
  changeCosts(columns: Int32Array, costs: Float64Array): void;
  solve(options: SessionOptions): LinearOutcome;
  close(): void;
}

export interface SessionOptions
  extends Pick<LinearOptions, 'limitSeconds' | 'shouldStop' | 'onIterations'> {
  /** Simplex iterations at most; no limit unless given. */
  readonly iterationLimit?: number;
  /** primal after new columns, dual after new bounds; interior without basis for a large first solve. */
  readonly method: 'primal' | 'dual' | 'interior';
}
