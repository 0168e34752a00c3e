/** A point of a linear model and its value. */
export interface LinearSolution {
  readonly objective: number;
  /** By column. Whole-number columns may be off by the solver's tolerance. */
  readonly values: Float64Array;
}

/** Change of the objective for one unit more on the right-hand side of each row; plain programs only. */
export interface LinearDuals {
  readonly rowDuals: Float64Array;
}

/**
 * How a solve of a linear model ended. Always look at `kind` first: an infeasible model has an objective
 * value too, and it means nothing. `bound` is what no solution can beat.
 */
export type LinearOutcome =
  | ({ readonly kind: 'optimal'; readonly bound: number; readonly duals: LinearDuals | null } & {
      readonly solution: LinearSolution;
    })
  | {
      /** Within the relative gap that was asked for. */
      readonly kind: 'good-enough';
      readonly solution: LinearSolution;
      readonly bound: number;
      readonly gap: number;
    }
  | { readonly kind: 'infeasible' }
  | { readonly kind: 'unbounded' }
  | {
      readonly kind: 'out-of-time' | 'interrupted';
      readonly solution: LinearSolution | null;
      readonly bound: number;
    }
  | { readonly kind: 'failed'; readonly message: string };
