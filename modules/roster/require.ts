import type { Actor, Need, TeamInfo } from '../access';
import { requireTeam } from '../access/server';
import { type Outcome, ok, type RosterId, type RunId, refuse, type TeamId } from '../units';
import { findRoster, findRun } from './store';
import type { Roster, Run } from './stored';

/** The roster with its team, if the actor has the need there; others never learn that it exists. */
export function requireRoster(
  actor: Actor,
  need: Need,
  rosterId: RosterId,
): Outcome<{ readonly roster: Roster; readonly team: TeamInfo }> {
  const roster = findRoster(rosterId);
  if (!roster) return missing('roster');
  const team = requireOwnTeam(actor, need, roster.teamId, 'roster');
  return team.ok ? ok({ roster, team: team.value }) : team;
}

/** The run with its team, if the actor has the need there. */
export function requireRun(
  actor: Actor,
  need: Need,
  runId: RunId,
): Outcome<{ readonly run: Run; readonly team: TeamInfo }> {
  const run = findRun(runId);
  if (!run) return missing('run');
  const team = requireOwnTeam(actor, need, run.teamId, 'run');
  return team.ok ? ok({ run, team: team.value }) : team;
}

const missing = (noun: string) => refuse('not-found', `There is no such ${noun} among yours.`);

function requireOwnTeam(actor: Actor, need: Need, teamId: TeamId, noun: string): Outcome<TeamInfo> {
  const team = requireTeam(actor, need, teamId);
  return !team.ok && team.error.code === 'not-found' ? missing(noun) : team;
}
