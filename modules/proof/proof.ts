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

/** One stretch of a period with more people than a ceiling takes. */
export interface ProvenSurplus {
  readonly ceilingId: string;
  readonly skillId: string | null;
  /** The day the ceiling belongs to. */
  readonly date: string;
  /** On the problem's time axis, half-open. */
  readonly startMinute: number;
  readonly endMinute: number;
  readonly surplusPeople: number;
  readonly isFirm: boolean;
}

/** A rule that the roster breaks, with a sentence that names person, date and figures. */
export interface Breach {
  readonly rule: string;
  /** Of a rule that joins people: the first of those concerned; empty when it is about nobody in person. */
  readonly personId: string;
  readonly date: string;
  readonly sentence: string;
  /** Set where the sentence tells of pay: what those who may not see pay read instead. */
  readonly sentenceWithoutPay?: string;
}

/** Missing person-minutes on the firm floors of one priority. */
export interface PriorityShortage {
  readonly priority: number;
  readonly minutes: number;
}

/** Worked and overtime minutes, nights, weekends and wishes not granted of one person. */
export interface ProvenPerson {
  readonly personId: string;
  readonly workedMinutes: number;
  readonly overtimeMinutes: number;
  readonly nights: number;
  readonly weekends: number;
  readonly refusedWishes: number;
}

/** What became of the bound of the cost when it was reckoned anew. */
export interface CheckedBound {
  /** Whole cents, from the record of the solver's prices; null: not reckoned anew. */
  readonly recheckedCents: number | null;
  /** The bound that the solver gives; a search tree may have raised it above its record. */
  readonly solverCents: number | null;
  /** Which of the two holds and why. It tells of pay. */
  readonly sentence: string;
}

/** What the independent re-check found. Recomputed from the problem and the roster alone. */
export interface Proof {
  /** Pay, wished floors, priced ceilings, priced rules of the team, wishes not granted and fairness. */
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
  /** The same for each priority that a firm floor has, the first to hold first. */
  readonly shortageByPriority: readonly PriorityShortage[];
  readonly wishedShortageMinutes: number;
  readonly shortages: readonly ProvenShortage[];
  /** Person-minutes above firm ceilings. */
  readonly surplusMinutes: number;
  readonly pricedSurplusMinutes: number;
  /** Price of the person-minutes above ceilings that have one; part of costCents. */
  readonly pricedSurplusCents: number;
  readonly surpluses: readonly ProvenSurplus[];
  /** Units by which firm rules of the team are broken; a budget is broken in cents. */
  readonly teamRuleUnits: number;
  /** Price of the rules of the team that have one and are broken; part of costCents. */
  readonly teamRuleCents: number;
  readonly refusedWishes: number;
  /** Price of the wishes not granted; part of costCents. */
  readonly refusedWishCents: number;
  /** Price of the spread between people; part of costCents. */
  readonly spreadCents: number;
  /** Price of what each person has beyond a share; part of costCents. */
  readonly shareCents: number;
  /** Empty for every roster that may be stored. */
  readonly breaches: readonly Breach[];
  /** Every rule that was re-checked, and how many cases of it. */
  readonly checked: readonly { readonly rule: string; readonly cases: number }[];
  readonly people: readonly ProvenPerson[];
  /** Of the roster of a run; left out where no run stands behind the roster, and in older proofs. */
  readonly bound?: CheckedBound;
}
