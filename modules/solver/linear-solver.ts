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
  /** A point to start from, by column; ignored when it is no solution. */
  readonly start?: Float64Array;
  readonly onSolution?: (values: Float64Array) => void;
  readonly onBound?: (bound: number) => void;
  /** Asked many times a second; true ends the solve and keeps the best solution. */
  readonly shouldStop?: () => boolean;
}

/** Solves a linear model for one of its objectives. */
export type LinearSolver = (
  model: LinearModel,
  objectiveName: string,
  options: LinearOptions,
) => LinearOutcome;
