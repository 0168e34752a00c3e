import type { Floor, Holiday, ShiftKind } from '../coverage';
import type { Leave, Person, Skill } from '../people';
import type { PayRules, RuleSet } from '../rules';
import type { LocalDate, PersonId, ShiftKindId, SkillId, UtcMilliseconds, Zone } from '../units';
import type { Problem } from './problem';

/** A planned or worked shift of the days before the period, or a published one of the days after it. */
export interface NeighbourShift {
  readonly personId: PersonId;
  /** The local date on which it starts. */
  readonly date: LocalDate;
  readonly startsAtUtc: UtcMilliseconds;
  readonly endsAtUtc: UtcMilliseconds;
  readonly isNight: boolean;
  readonly postSkillId: SkillId;
}

/** A cell of the roster that a run has to keep; no kind: a day off. */
export interface PinnedCell {
  readonly personId: PersonId;
  readonly date: LocalDate;
  readonly kindId: ShiftKindId | null;
  readonly postSkillId: SkillId | null;
}

/** Everything a problem is made of, as the other modules keep it. */
export interface ProblemParts {
  readonly team: { readonly name: string; readonly zone: Zone; readonly currency: string };
  readonly startsOn: LocalDate;
  /** Included. */
  readonly endsOn: LocalDate;
  readonly skills: readonly Skill[];
  /** Kinds that may be planned: leave retired ones out, unless an old roster is judged. */
  readonly shiftKinds: readonly ShiftKind[];
  readonly floors: readonly Floor[];
  /** Of the period and the days around it, for shifts that run past midnight. */
  readonly holidays: readonly Holiday[];
  readonly people: readonly Person[];
  /** That touches the period or the day after it. */
  readonly leave: readonly Leave[];
  /** Shifts of the `historyDays` before the period; others are ignored. */
  readonly history: readonly NeighbourShift[];
  /** Published shifts of the `historyDays` after the period; others are ignored. */
  readonly following: readonly NeighbourShift[];
  readonly pins: readonly PinnedCell[];
  readonly rules: RuleSet;
  readonly pay: PayRules;
}

/** A problem and, in sentences, what had to be left out of it. */
export interface AssembledProblem {
  readonly problem: Problem;
  readonly notes: readonly string[];
}

/**
 * Days before and after a period whose shifts matter to it: a week, or as long as the longest run
 * allowed.
 */
export const historyDays = (rules: RuleSet): number =>
  Math.max(7, rules.longestRunDays ?? 0, rules.longestRunNights ?? 0);
