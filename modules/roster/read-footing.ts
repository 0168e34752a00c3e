import type { Actor } from '../access';
import { requireTeam } from '../access/server';
import { type Footing, footingOf } from '../problem';
import { type DateRange, type Outcome, ok, type TeamId } from '../units';
import { gatherProblem } from './gather-problem';

/** Hours the floors of a range of dates take against hours the contracts give, by skill. */
export function readFooting(
  actor: Actor,
  teamId: TeamId,
  { from, to }: DateRange,
): Outcome<Footing> {
  const team = requireTeam(actor, 'floors.read', teamId);
  if (!team.ok) return team;
  const { problem } = gatherProblem(team.value, { id: null, startsOn: from, endsOn: to });
  return ok(footingOf(problem));
}
