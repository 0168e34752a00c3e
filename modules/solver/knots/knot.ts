import type { Requirement } from '../../problem';

/** Requirements that cannot all hold, whatever the rest of the problem asks. */
export interface Knot {
  readonly members: readonly Requirement[];
  /** What each member is, in the same order. */
  readonly words: readonly string[];
  /** Verified: with any one member left out the others can be held in whole shifts. */
  readonly isMinimal: boolean;
  /** A capacity sum that proves the knot; null for a clash that takes more than counting to see. */
  readonly sentence: string | null;
}

export interface KnotsAnswer {
  /** Capacity sums first. Apart from these, no two share a floor, a pin, an absence or a person's limit. */
  readonly knots: readonly Knot[];
  /** Verified: with the located members of these knots dropped, everything else can be held. */
  readonly isComplete: boolean;
}

export interface KnotOptions {
  /** A few seconds are enough for most; a knot that is cut by the time says so. */
  readonly limitSeconds: number;
  /** Knots beyond capacity sums, at most. */
  readonly mostKnots: number;
  /** Minutes at which today's roster is short: floors far from them are left out first. */
  readonly shortAtMinutes: readonly number[];
}
