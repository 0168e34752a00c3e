import type { Membership, Role } from '@/modules/access';
import type { TeamId } from '@/modules/units';

/** A team by its name. */
export interface TeamName {
  readonly id: TeamId;
  readonly name: string;
}

/** One box to tick: a role, in a team or in the whole organisation. */
export interface RoleChoice extends Membership {
  readonly key: string;
  readonly label: string;
}

/** Boxes that belong together under a team's name; the whole organisation comes first. */
export interface RoleGroup {
  readonly name: string;
  readonly choices: readonly RoleChoice[];
}

const labels: Record<Role, string> = {
  owner: 'Owner',
  hr: 'HR',
  supervisor: 'Supervisor',
  staff: 'Staff',
};

/** Every role that can be given, by the part of the organisation it counts in. */
export function roleGroups(teams: readonly TeamName[]): RoleGroup[] {
  const choices = (roles: readonly Role[], teamId: TeamId | null): RoleChoice[] =>
    roles.map((role) => ({
      role,
      teamId,
      key: keyOf({ role, teamId }),
      label: labels[role],
    }));
  return [
    { name: 'Whole organisation', choices: choices(['owner', 'hr'], null) },
    ...teams.map(({ id, name }) => ({ name, choices: choices(['supervisor', 'staff'], id) })),
  ];
}

/** Keys of the boxes that are ticked for some memberships. */
export const keysOf = (memberships: readonly Membership[]): string[] => memberships.map(keyOf);

/** The memberships of ticked boxes, in the order of the boxes. */
export const membershipsOf = (
  keys: readonly string[],
  groups: readonly RoleGroup[],
): Membership[] =>
  groups
    .flatMap(({ choices }) => choices)
    .filter(({ key }) => keys.includes(key))
    .map(({ role, teamId }) => ({ role, teamId }));

/** `Owner`, or `Supervisor in Animal care`; one line for each role. */
export const roleLines = (
  memberships: readonly Membership[],
  groups: readonly RoleGroup[],
): string[] => {
  const keys = keysOf(memberships);
  return groups.flatMap(({ name, choices }) =>
    choices
      .filter(({ key }) => keys.includes(key))
      .map(({ label, teamId }) => (teamId === null ? label : `${label} in ${name}`)),
  );
};

const keyOf = ({ role, teamId }: Membership): string => `${role} ${teamId ?? ''}`.trim();
