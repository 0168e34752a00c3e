import type { BoundRecord, PlannedRoster, SizingAnswer } from '../problem';

/** One report of a running solve. What is not known yet is null. */
export interface RosterProgress {
  /** 1: can the floors be held? 2: what is the cheapest roster that holds them as far as can be? */
  readonly stage: 1 | 2;
  readonly elapsedMs: number;
  /** Missing person-minutes on firm floors in the best roster so far. */
  readonly shortageMinutes: number | null;
  /** No roster that keeps the levels before the floors as well is short of less than this. */
  readonly shortageBoundMinutes: number | null;
  readonly bestCostCents: number | null;
  /** No roster as well covered as the best one costs less than this. */
  readonly boundCents: number | null;
}

/** A roster and how good it is known to be. */
export interface SolvedRoster {
  readonly roster: PlannedRoster;
  readonly shortageMinutes: number;
  readonly shortageBoundMinutes: number;
  readonly costCents: number;
  /** Whole cents: no roster that is short of at most as much costs less. Never above the cost. */
  readonly boundCents: number;
  /** (cost - bound) / cost; 0 when nothing is paid. */
  readonly gap: number;
  /** Firm team rules, firm ceilings and firm floors by priority, in the order of the model's levels. */
  readonly levels: readonly number[];
  /** What a bound can be reckoned anew from without a solver; null when there is none for this roster. */
  readonly boundRecord: BoundRecord | null;
  /** The bound by that record; a search tree may have proven a higher `boundCents`. */
  readonly recordedBoundCents: number | null;
}

/** Why a person has no lawful roster at all, whatever the floors ask. */
export interface PersonClash {
  readonly personId: string;
  readonly sentence: string;
}

/**
 * How a run ends. `optimal`: the shortage is proven least and no roster with it is cheaper, but for the
 * rounding of pay to whole cents. `good-enough`: the shortage is proven least and the cost is within
 * the gap that was asked for. `out-of-time` and `stopped` keep the best roster found.
 */
export type RosterOutcome =
  | ({ readonly kind: 'optimal' | 'good-enough' | 'out-of-time' } & SolvedRoster)
  | { readonly kind: 'stopped'; readonly best: SolvedRoster | null }
  | { readonly kind: 'impossible'; readonly clashes: readonly PersonClash[] }
  | SolverFailure;

/** `message` is a sentence for people; the cause belongs in the log. */
export interface SolverFailure {
  readonly kind: 'failed';
  readonly message: string;
  readonly cause?: unknown;
}

/** How a sizing ends; an answer that is not proven says so itself. */
export type SizingOutcome =
  | { readonly kind: 'answered'; readonly answer: SizingAnswer }
  | { readonly kind: 'out-of-time' }
  | { readonly kind: 'stopped' }
  | SolverFailure;
