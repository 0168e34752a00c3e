import type { PlannedRoster, Problem } from '@/modules/problem';
import type { Scale } from './figure';

/** What a process of its own is asked to solve, so that its memory is that of one method alone. */
export interface CaseOrder {
  /** The engine, or HiGHS on the compact model with one blended objective. */
  readonly method: 'engine' | 'highs';
  readonly problem: Problem;
  readonly scale: Scale;
  readonly limitSeconds: number;
  readonly seed: number;
}

/** Relative gaps whose first proof is timed. */
export const timedGaps = [0.05, 0.01, 0.005, 0.001] as const;

/** How a method did; null: not known, or not reached. */
export interface CaseAnswer {
  readonly roster: PlannedRoster | null;
  /** The cost that the method itself claims. */
  readonly costCents: number | null;
  /** Figures are those of `figureOf`. */
  readonly bound: number | null;
  readonly seconds: number;
  readonly at: Readonly<Record<string, number | null>>;
  /** Until the first roster that misses nothing. */
  readonly secondsToFirst: number | null;
  /** By gap. */
  readonly secondsToGap: Readonly<Record<string, number | null>>;
  readonly peakMegabytes: number | null;
  /** Why there is no roster. */
  readonly failure: string | null;
}
