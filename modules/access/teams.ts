import { type Outcome, ok, refuse, type TeamId } from '../units';
import type { Actor } from './actor';
import { canInTeam, type Need } from './permissions';
import { findTeam, listTeamsOf } from './store';
import type { TeamInfo } from './team';

/** The teams of the actor's organisation in which the actor has the need, by name. */
export function listTeams(actor: Actor, need: Need): TeamInfo[] {
  return listTeamsOf(actor.organisationId).filter((team) => canInTeam(actor, need, team));
}

/**
 * The team, if the actor has the need there. A team of another organisation, or one in which the actor
 * has no part at all, is "not found": its existence is not revealed.
 */
export function requireTeam(actor: Actor, need: Need, teamId: TeamId): Outcome<TeamInfo> {
  const team = findTeam(teamId);
  const missing = () => refuse('not-found', 'There is no such team among yours.');
  if (!team || team.organisationId !== actor.organisationId) return missing();
  if (canInTeam(actor, need, team)) return ok(team);
  const isPartOfTeam = actor.memberships.some(
    (one) => one.teamId === null || one.teamId === teamId,
  );
  return isPartOfTeam
    ? refuse('not-allowed', 'Your role in this team does not allow this.')
    : missing();
}
