/** A floor whose price is asked for: on one day, or on every day on which it stands. Firm floors only. */
export interface PriceQuestion {
  readonly floorId: string;
  /** null: one more, or one less, on all its days at once. */
  readonly dayIndex: number | null;
}

/** What a change of floors or people does, by the relaxation: an estimate. */
export interface EstimatedChange {
  /** About this much; a minus sign saves. */
  readonly costCents: number;
  /**
   * Between these: the estimate, and the gap between the best roster and the relaxation on either side. null
   * without a best roster to compare with.
   */
  readonly bracket: { readonly leastCents: number; readonly mostCents: number } | null;
  /** Change of the least missing person-minutes of firm floors; where it is not 0, the cost alone misleads. */
  readonly shortageMinutes: number;
}

export interface FloorPrice extends PriceQuestion {
  readonly oneMore: EstimatedChange;
  readonly oneLess: EstimatedChange;
}

/** One point of a staffing curve. */
export interface CurvePoint {
  /** People more (or less) than today, on each floor or in the team. */
  readonly change: number;
  /** No roster costs less. Rounded down to whole cents. */
  readonly leastCostCents: number;
  /** No roster is short of less, in person-minutes of firm floors. */
  readonly leastShortageMinutes: number;
}

export interface PriceOptions {
  readonly limitSeconds: number;
  /** Cost of the best roster known, for the bracket. */
  readonly bestCostCents: number | null;
}
