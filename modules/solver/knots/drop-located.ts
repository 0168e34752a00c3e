import { type Requirement, requirementKey } from '../../problem';

/** All but the limits of the whole team, which may be part of several knots; those if there is nothing else. */
export function locatedIn(members: readonly Requirement[]): readonly Requirement[] {
  const located = members.filter(({ kind }) => kind !== 'limit' && kind !== 'teamRule');
  return located.length > 0 ? located : members;
}

/** Positions of requirements without those of `dropped`. */
export function dropFrom(
  requirements: readonly Requirement[],
  kept: ReadonlySet<number>,
  dropped: readonly Requirement[],
): Set<number> {
  const keys = new Set(dropped.map(requirementKey));
  return new Set(
    [...kept].filter((index) => {
      const requirement = requirements[index];
      return requirement !== undefined && !keys.has(requirementKey(requirement));
    }),
  );
}
