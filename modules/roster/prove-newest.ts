import { findTeam } from '../access/server';
import type { Proof } from '../proof';
import type { RosterId } from '../units';
import { gatherProblem } from './gather-problem';
import { proveShifts } from './prove-version';
import { findRoster, getNewestVersion, listShifts } from './store';
import { readTeamWords } from './team-words';

/** Re-checks the newest version of a roster against today's data; throws for an unknown roster. */
export function proveNewest(rosterId: RosterId): Proof {
  const roster = findRoster(rosterId);
  const team = roster && findTeam(roster.teamId);
  if (!roster || !team) throw new Error(`No roster ${rosterId}`);
  const shifts = listShifts(getNewestVersion(rosterId).id);
  return proveShifts(gatherProblem(team, roster).problem, shifts, readTeamWords(team.id));
}
