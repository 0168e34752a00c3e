import type { TeamId } from '../units';
import type { Actor, Role } from './actor';

/**
 * Who may do what: the one table. Every page, route and use-case names a need from it. Needs of the
 * team apply to the teams of the role; owner and hr act in every team of their organisation.
 */
export const needs = {
  'floors.read': ['owner', 'supervisor'],
  'floors.write': ['owner', 'supervisor'],
  'rosters.read': ['owner', 'supervisor', 'hr'],
  'rosters.write': ['owner', 'supervisor'],
  'rosters.publish': ['owner', 'supervisor'],
  'sizing.run': ['owner', 'supervisor'],
  'pay.read': ['owner', 'supervisor', 'hr'],
  'own-shifts.read': ['staff'],
  'own-shifts.confirm': ['staff'],
  'hours.read': ['owner', 'hr'],
  'mail.read': ['owner', 'supervisor'],
  'members.write': ['owner'],
} as const satisfies Record<string, readonly Role[]>;

export type Need = keyof typeof needs;

const isWide = (role: Role): boolean => role === 'owner' || role === 'hr';

/** Whether the actor has the need anywhere: opens a page, says nothing about rows. */
export function can(actor: Actor, need: Need): boolean {
  const allowed: readonly Role[] = needs[need];
  return actor.memberships.some(({ role }) => allowed.includes(role));
}

/** Whether the actor has the need in this team of their own organisation. */
export function canInTeam(
  actor: Actor,
  need: Need,
  team: { readonly id: TeamId; readonly organisationId: string },
): boolean {
  const allowed: readonly Role[] = needs[need];
  return (
    team.organisationId === actor.organisationId &&
    actor.memberships.some(
      ({ role, teamId }) => allowed.includes(role) && (isWide(role) || teamId === team.id),
    )
  );
}
