/** A smallest set of needs that cannot all be met together, in the words of who entered them. */
export interface KnotView {
  /** Hours or people needed against those there are; null when counting does not show the knot. */
  readonly sentence: string | null;
  readonly members: readonly {
    readonly words: string;
    /** Binds one person, who is asked before it is changed. */
    readonly asksPerson: boolean;
  }[];
  /** Verified: without any one of them the others can be met. */
  readonly isMinimal: boolean;
}

export interface KnotsView {
  readonly knots: readonly KnotView[];
  /** Verified: with these knots undone everything else can be met. */
  readonly isComplete: boolean;
}

/** Between two figures: what no roster can be better than, and what a roster reaches. */
export interface Bracket {
  readonly least: number;
  readonly most: number;
}

/** A way out of a knot: what would be changed and what a roster gains by it. Never made by itself. */
export interface WayOutView {
  readonly changes: readonly {
    readonly words: string;
    /** Whom it must be asked. */
    readonly ask: string;
    readonly asksPerson: boolean;
  }[];
  /** Whether the other members of the knot hold then; null: not tested in time. */
  readonly undoesKnot: boolean | null;
  /** Against the roster of the run; null: not worked out in time. */
  readonly effect: {
    readonly shortageChangeMinutes: Bracket;
    /** null for those who may not see pay. */
    readonly costChangeCents: Bracket | null;
    /** Otherwise the brackets are an estimate. */
    readonly isProven: boolean;
  } | null;
}
