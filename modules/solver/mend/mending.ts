import type { PlannedAssignment, PlannedRoster } from '../../problem';

/** Somebody cannot come: half-open on the problem's time axis. */
export interface NewAbsence {
  readonly personId: string;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly reason: string;
}

export interface MendOptions {
  /** Shifts that start before this stay as they are. */
  readonly fromMinute: number;
  /** And so do those that start at this or later. */
  readonly untilMinute: number;
  readonly absences: readonly NewAbsence[];
  readonly limitSeconds: number;
  readonly seed: number;
}

/** What changes for one person on one day; null: free. */
export interface Move {
  readonly personId: string;
  readonly dayIndex: number;
  readonly before: PlannedAssignment | null;
  readonly after: PlannedAssignment | null;
}

/** One way to fill one open shift: somebody takes it over, or changes to it and another takes theirs. */
export interface TakeOver {
  readonly shiftIndex: number;
  readonly postSkillId: string;
  readonly moves: readonly Move[];
  /** Of all firm floors, with this take-over alone. */
  readonly shortageMinutes: number;
  /** Against the roster with the shift left open. */
  readonly costChangeCents: number;
}

/** One aim of a mending, in strict order; no mending that is as good on those before goes below the bound. */
export interface MendAim {
  /** A level of the model, or `touched` people, `moved` shifts or `cost` in cents. */
  readonly name: string;
  readonly value: number;
  readonly bound: number;
}

export interface MendedRoster {
  readonly roster: PlannedRoster;
  /** People with a move. Those who are newly absent count only for what goes beyond their absence. */
  readonly touched: readonly string[];
  readonly moves: readonly Move[];
  readonly shortageMinutes: number;
  readonly costCents: number;
  /** Against the roster before, with the absent still on duty. */
  readonly costChangeCents: number;
  /** Levels of the model, touched, moved, cost. */
  readonly aims: readonly MendAim[];
  /** Every aim is proven least. */
  readonly isProven: boolean;
}

export type MendOutcome =
  | ({ readonly kind: 'mended'; readonly takeOvers: readonly TakeOver[] } & MendedRoster)
  | { readonly kind: 'impossible'; readonly sentence: string }
  | { readonly kind: 'out-of-time' };
