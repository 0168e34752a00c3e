import type { PlannedRoster, Problem, Requirement } from '../../problem';
import type { SolvedRoster } from '../roster-outcome';

/** Loosening of one or two members of a knot, and what the problem gives then. */
export interface WayOut {
  readonly changes: readonly Requirement[];
  /** What each change loosens, in the same order. */
  readonly words: readonly string[];
  /** step: by its least step, one person or shift or hour. dropped: as if it had not been asked for. */
  readonly size: 'step' | 'dropped';
  /** Binds a person, who is asked first: never changed by itself. */
  readonly asksPerson: boolean;
  /** Tested in whole shifts: the other members of the knot hold then. null: not tested in time. */
  readonly undoesKnot: boolean | null;
  /** null: no time was left to try it. */
  readonly effect: WayOutEffect | null;
}

/** Between two figures: what no roster can beat, and what a roster reaches. */
export interface Bracket {
  readonly least: number;
  readonly most: number;
}

/** Against the roster today; the cost also pays for shifts that are no longer missing. */
export interface WayOutEffect {
  readonly shortageMinutes: Bracket;
  readonly costCents: Bracket;
  readonly shortageChangeMinutes: Bracket;
  readonly costChangeCents: Bracket;
  /** Shortage and cost are proven least; otherwise the brackets are an estimate of the best roster. */
  readonly isProven: boolean;
}

/** Finds the best roster of a problem within a time; `start` is a lawful roster. null: none was found. */
export type RosterSearch = (
  problem: Problem,
  options: { readonly limitSeconds: number; readonly start: PlannedRoster | null },
) => (FoundFigures & { readonly isProven: boolean }) | null;

type FoundFigures = Pick<
  SolvedRoster,
  'shortageMinutes' | 'shortageBoundMinutes' | 'costCents' | 'boundCents'
>;

export interface WaysOutOptions {
  readonly limitSeconds: number;
  /** The best roster of the problem as it stands. */
  readonly today: Pick<SolvedRoster, 'roster' | 'shortageMinutes' | 'costCents'>;
  /** Ways at most; of a knot with more members those at which today's roster is short come first. */
  readonly mostWays: number;
  /** Law-based limits are tried only when this is set, by somebody who may decide so. */
  readonly triesLawBased: boolean;
}
