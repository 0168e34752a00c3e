import { now } from '../../db/clock';
import type { Actor } from '../access';
import { requireTeam } from '../access/server';
import { listHolidays } from '../coverage/server';
import { type Outcome, ok, type TeamId, toLocal } from '../units';
import { getNewestVersion, listRostersOf } from './store';
import type { CalendarFrame } from './views';

/**
 * What a calendar of a team draws around its shifts: the team's clock, all its periods and the holidays in
 * them. A period with a draft newer than its published version counts as not published.
 */
export function readCalendarFrame(actor: Actor, teamId: TeamId): Outcome<CalendarFrame> {
  const team = requireTeam(actor, 'rosters.read', teamId);
  if (!team.ok) return team;
  const { zone, dayStartsAtMinute } = team.value;
  const { date: today, minute: nowMinute } = toLocal(now(), zone);
  const periods = listRostersOf(teamId).map(({ id, startsOn, endsOn }) => ({
    startsOn,
    endsOn,
    isPublished: getNewestVersion(id).publishedAtUtc !== null,
  }));
  const first = periods[0]?.startsOn ?? today;
  const last = periods.at(-1)?.endsOn ?? today;
  const holidays = listHolidays(teamId, first, last).map(({ date, name }) => ({ date, name }));
  return ok({ zone, dayStartsAtMinute, today, nowMinute, periods, holidays });
}
