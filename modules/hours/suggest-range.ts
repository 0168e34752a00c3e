import { now } from '../../db/clock';
import type { Actor } from '../access';
import { requireTeam } from '../access/server';
import { listPublishedPeriods } from '../roster/server';
import { type DateRange, type Outcome, ok, type TeamId, toLocal } from '../units';
import { anyDate } from './any-date';
import { startingRange } from './starting-range';

/** The dates with which the hours of a team are shown before anybody chose some. */
export function suggestRange(actor: Actor, teamId: TeamId): Outcome<DateRange> {
  const team = requireTeam(actor, 'hours.read', teamId);
  if (!team.ok) return team;
  const periods = listPublishedPeriods(teamId, anyDate.from, anyDate.to);
  return ok(startingRange(periods, toLocal(now(), team.value.zone).date));
}
