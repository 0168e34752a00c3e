import type { ProblemRules } from './problem-rules';

/** A limit that a person keeps by themselves, of the team's rules or of their own. */
export type LimitName = Exclude<keyof ProblemRules, 'weekendCountsFridayNight'>;

/**
 * One thing that a user entered and that may stand in the way of others: what a knot is made of. Firm
 * floors, ceilings and team rules only; wished and priced ones stand in nobody's way.
 */
export type Requirement =
  /** A floor on one day, in all its pieces. */
  | { readonly kind: 'floor'; readonly floorId: string; readonly dayIndex: number }
  | { readonly kind: 'ceiling'; readonly ceilingId: string; readonly dayIndex: number }
  | { readonly kind: 'teamRule'; readonly ruleId: string }
  /** A limit of everybody who has no rules of their own. */
  | { readonly kind: 'limit'; readonly limit: LimitName }
  | { readonly kind: 'ownLimit'; readonly personId: string; readonly limit: LimitName }
  | { readonly kind: 'leastHours' | 'mostHours' | 'noNights'; readonly personId: string }
  | { readonly kind: 'kindLimit'; readonly personId: string; readonly kindId: string }
  | {
      readonly kind: 'absence';
      readonly personId: string;
      readonly startMinute: number;
      readonly endMinute: number;
    }
  | { readonly kind: 'pin'; readonly personId: string; readonly dayIndex: number };

/** Equal for equal requirements. */
export const requirementKey = (requirement: Requirement): string =>
  Object.values(requirement).join('|');

/** Whether it binds one person: they are asked before it is changed, and it never changes by itself. */
export const asksPerson = (
  requirement: Requirement,
): requirement is Extract<Requirement, { personId: string }> => 'personId' in requirement;

/** Whether law stands behind it: rest between shifts (Directive 2003/88/EC, Art. 3). */
export const isLawBased = (requirement: Requirement): boolean =>
  (requirement.kind === 'limit' || requirement.kind === 'ownLimit') &&
  requirement.limit === 'restMinutes';

/** The limits in the order in which they are listed. */
export const limitNames: readonly LimitName[] = [
  'restMinutes',
  'longestRunDays',
  'longestRunNights',
  'nightsPerPeriod',
  'weekendsPerPeriod',
  'shortestRunDays',
  'shortestRunFreeDays',
  'kindsThatMayNotFollow',
];

/** Values at which a limit binds nobody. */
export const unlimited: Pick<ProblemRules, LimitName> = {
  restMinutes: 0,
  longestRunDays: null,
  longestRunNights: null,
  nightsPerPeriod: null,
  weekendsPerPeriod: null,
  shortestRunDays: null,
  shortestRunFreeDays: null,
  kindsThatMayNotFollow: [],
};
