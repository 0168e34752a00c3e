import type { Problem, Requirement } from '../../problem';

/** Least informative first: policies, then hours, then what lies in one place. Rest is the last policy. */
const ranks: { readonly [kind in Requirement['kind']]: number } = {
  teamRule: 0,
  limit: 0,
  ownLimit: 1,
  kindLimit: 2,
  leastHours: 3,
  mostHours: 3,
  ceiling: 4,
  floor: 5,
  noNights: 6,
  absence: 7,
  pin: 8,
};

/**
 * Positions of requirements in the order in which knots try to do without them. Floors far from where the
 * roster is short go before those near it.
 */
export function orderRequirements(
  problem: Problem,
  requirements: readonly Requirement[],
  shortAtMinutes: readonly number[],
): number[] {
  const days = shortAtMinutes.map((minute) => dayAt(problem, minute));
  const keys = requirements.map((requirement) => [
    isRest(requirement) ? 2 : ranks[requirement.kind],
    'dayIndex' in requirement && days.length > 0
      ? -Math.min(...days.map((day) => Math.abs(day - requirement.dayIndex)))
      : 0,
  ]);
  return [...requirements.keys()].sort((one, other) => {
    const [rank = 0, distance = 0] = keys[one] ?? [];
    const [otherRank = 0, otherDistance = 0] = keys[other] ?? [];
    return rank - otherRank || distance - otherDistance || one - other;
  });
}

const isRest = (requirement: Requirement): boolean =>
  'limit' in requirement && requirement.limit === 'restMinutes';

const dayAt = ({ days }: Problem, minute: number): number =>
  Math.max(
    0,
    days.findLastIndex(({ startMinute }) => startMinute <= minute),
  );
