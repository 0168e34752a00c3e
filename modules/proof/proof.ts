/** One stretch of a period in which a floor is not held. */
export interface ProvenShortage {
  /** Floors that ask for this cover; several when seated floors of one skill add up. */
  readonly floorIds: readonly string[];
  readonly skillId: string | null;
  /** The day the floor belongs to: a window that runs past midnight stays with the day it starts on. */
  readonly date: string;
  /** On the problem's time axis, half-open. */
  readonly startMinute: number;
  readonly endMinute: number;
  readonly missingPeople: number;
  readonly isFirm: boolean;
}

/** A rule that the roster breaks, with a sentence that names person, date and figures. */
export interface Breach {
  readonly rule: string;
  readonly personId: string;
  readonly date: string;
  readonly sentence: string;
}

/** What the independent re-check found. Recomputed from the problem and the roster alone. */
export interface Proof {
  readonly costCents: number;
  /** Ordinary pay: contract hours of people paid by contract, worked hours of the others. */
  readonly contractPayCents: number;
  readonly premiumPayCents: number;
  readonly overtimePayCents: number;
  readonly overtimeMinutes: number;
  /** Price of wished floors that are not held; part of costCents. */
  readonly wishedShortageCents: number;
  /** Missing person-minutes on firm floors. */
  readonly shortageMinutes: number;
  readonly wishedShortageMinutes: number;
  readonly shortages: readonly ProvenShortage[];
  /** Empty for every roster that may be stored. */
  readonly breaches: readonly Breach[];
  /** Every rule that was re-checked, and how many cases of it. */
  readonly checked: readonly { readonly rule: string; readonly cases: number }[];
  /** Contract, worked and overtime minutes, nights and weekends of each person. */
  readonly people: readonly {
    readonly personId: string;
    readonly workedMinutes: number;
    readonly overtimeMinutes: number;
    readonly nights: number;
    readonly weekends: number;
  }[];
}
