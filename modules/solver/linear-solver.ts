import type { LinearModel } from '../model';
import type { LinearOutcome } from './linear-outcome';

export interface LinearOptions {
  /** Wall-clock seconds. */
  readonly limitSeconds: number;
  /** Relative distance of solution and bound at which to stop; 0 unless given. */
  readonly targetGap?: number;
  /** The same as an amount of the objective. */
  readonly absoluteGap?: number;
  readonly seed?: number;
  /** Simplex iterations at most; for plain programs. */
  readonly iterationLimit?: number;
  /** Nodes of the search tree at most; for a solve that must repeat itself. */
  readonly nodeLimit?: number;
  /** A point to start from, by column; ignored when it is no solution. */
  readonly start?: Float64Array;
  /** Values of some columns to start from; the solver completes them. */
  readonly startPart?: { readonly columns: Int32Array; readonly values: Float64Array };
  readonly onSolution?: (values: Float64Array) => void;
  readonly onBound?: (bound: number) => void;
  /** Told at the end: iterations of the simplex method, a measure of work. */
  readonly onIterations?: (iterations: number) => void;
  /** Asked many times a second; true ends the solve and keeps the best solution. */
  readonly shouldStop?: () => boolean;
}

/** Solves a linear model for one of its objectives. */
export type LinearSolver = (
  model: LinearModel,
  objectiveName: string,
  options: LinearOptions,
) => LinearOutcome;
