import type { OrganisationId, PersonId, SessionId, TeamId, UserId } from '../units';

/** owner and hr belong to the whole organisation; supervisor and staff to a team. */
export const roles = ['owner', 'supervisor', 'staff', 'hr'] as const;
export type Role = (typeof roles)[number];

/** One role of one user. `teamId` is null for owner and hr. */
export interface Membership {
  readonly role: Role;
  readonly teamId: TeamId | null;
}

/** Who is asking, read from the database on every request. */
export interface Actor {
  readonly userId: UserId;
  readonly sessionId: SessionId;
  readonly organisationId: OrganisationId;
  readonly organisationName: string;
  readonly name: string;
  readonly email: string;
  readonly memberships: readonly Membership[];
  /** The person in the staff list that this user is, if any. */
  readonly personId: PersonId | null;
}
