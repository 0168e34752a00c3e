import { now } from '../../db/clock';
import type { Actor } from '../access';
import { requireTeam } from '../access/server';
import {
  addDays,
  type LocalDate,
  mondayOf,
  type Outcome,
  ok,
  type TeamId,
  toLocal,
} from '../units';
import { listRostersOf } from './store';
import { summariseRoster } from './summarise-roster';
import type { RosterSummary } from './views';

/** The periods of a team, earliest first. */
export function listRosters(actor: Actor, teamId: TeamId): Outcome<RosterSummary[]> {
  const team = requireTeam(actor, 'rosters.read', teamId);
  if (!team.ok) return team;
  return ok(listRostersOf(teamId).map((roster) => summariseRoster(team.value, roster)));
}

/** The day after the team's last period, or the next Monday when it has none. */
export function suggestNextStart(actor: Actor, teamId: TeamId): Outcome<LocalDate> {
  const team = requireTeam(actor, 'rosters.read', teamId);
  if (!team.ok) return team;
  const last = listRostersOf(teamId).at(-1);
  if (last) return ok(addDays(last.endsOn, 1));
  return ok(mondayOf(addDays(toLocal(now(), team.value.zone).date, 7)));
}
