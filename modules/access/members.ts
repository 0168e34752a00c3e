import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import { type Outcome, ok, refuse, type TeamId, type UserId } from '../units';
import type { Actor, Membership } from './actor';
import { recordAudit } from './audit';
import type { Member, MemberChange } from './member';
import { can } from './permissions';
import { endSessionsOf, listTeamsOf, listUsers, replaceMemberships, setDisabled } from './store';

/** Every user of the actor's organisation. */
export function listMembers(actor: Actor): Outcome<Member[]> {
  if (!can(actor, 'members.write')) return refuse('not-allowed', 'Only an owner sees the members.');
  return ok(listUsers(actor.organisationId));
}

const isActiveOwner = (member: Member): boolean =>
  !member.isDisabled && member.memberships.some(({ role }) => role === 'owner');

function changed(member: Member, change: MemberChange): Member {
  return {
    ...member,
    isDisabled: change.isDisabled ?? member.isDisabled,
    memberships: (change.memberships as Membership[] | undefined) ?? member.memberships,
  };
}

/**
 * Disables or enables a user or replaces their roles; bites on that user's next request. Refused when
 * it would leave the organisation without an owner.
 */
export function changeMember(actor: Actor, userId: UserId, change: MemberChange): Outcome<Member> {
  if (!can(actor, 'members.write')) return refuse('not-allowed', 'Only an owner changes members.');
  const members = listUsers(actor.organisationId);
  const member = members.find((candidate) => candidate.userId === userId);
  if (!member) return refuse('not-found', 'There is no such member in your organisation.');
  const next = changed(member, change);
  const teamIds = new Set<TeamId>(listTeamsOf(actor.organisationId).map(({ id }) => id));
  const foreign = next.memberships.findIndex(
    ({ teamId }) => teamId !== null && !teamIds.has(teamId),
  );
  if (foreign >= 0) {
    return refuse('invalid', 'One of the teams is not in your organisation.', [
      { path: `memberships.${foreign}.teamId`, message: 'Choose a team of your organisation.' },
    ]);
  }
  if (!members.some((other) => isActiveOwner(other.userId === userId ? next : other))) {
    return refuse(
      'conflict',
      'An organisation needs at least one active owner. Make another owner first.',
    );
  }
  inTransaction(() => {
    setDisabled(userId, next.isDisabled ? now() : null);
    if (next.isDisabled) endSessionsOf(userId, now());
    replaceMemberships(userId, next.memberships);
    recordAudit({
      actor,
      teamId: null,
      action: 'member.change',
      subjectId: userId,
      detail: change,
    });
  });
  return ok(next);
}
