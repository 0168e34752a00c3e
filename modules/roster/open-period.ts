import { inTransaction } from '../../db/client';
import type { Actor, TeamInfo } from '../access';
import { recordAudit, requireTeam } from '../access/server';
import { addDays, formatDay, type Outcome, ok, refuse, type TeamId } from '../units';
import { newId } from '../units/server';
import type { OpenPeriodInput } from './roster-input';
import { insertDraft, insertRoster, listRostersTouching } from './store';
import type { Roster } from './stored';
import { summariseRoster } from './summarise-roster';
import type { RosterSummary } from './views';

/**
 * Opens the period that starts on a date and lasts as long as the team's periods: a roster with an
 * empty draft of version 1. Refused when it shares a day with another period of the team.
 */
export function openPeriod(
  actor: Actor,
  teamId: TeamId,
  { startsOn }: OpenPeriodInput,
): Outcome<RosterSummary> {
  const team = requireTeam(actor, 'rosters.write', teamId);
  if (!team.ok) return team;
  const endsOn = addDays(startsOn, team.value.periodDays - 1);
  const [other] = listRostersTouching(teamId, startsOn, endsOn);
  if (other) return overlap(other);
  const roster = insertPeriod(actor, team.value, startsOn, endsOn);
  return ok(summariseRoster(team.value, roster));
}

function overlap(other: Roster): Outcome<never> {
  const span = `${formatDay(other.startsOn)} to ${formatDay(other.endsOn)} ${other.endsOn.slice(0, 4)}`;
  const next = formatDay(addDays(other.endsOn, 1));
  return refuse('conflict', `The period ${span} is open already and shares days with this one.`, [
    { path: 'startsOn', message: `Start on ${next} or later, or so early that it ends before.` },
  ]);
}

function insertPeriod(actor: Actor, team: TeamInfo, startsOn: string, endsOn: string): Roster {
  const roster = { id: newId('ros'), teamId: team.id, startsOn, endsOn };
  inTransaction(() => {
    insertRoster(roster);
    insertDraft(newId('ver'), roster.id, 1);
    recordAudit({
      actor,
      teamId: team.id,
      action: 'roster.open',
      subjectId: roster.id,
      detail: { startsOn, endsOn },
    });
  });
  return { ...roster, closedAtUtc: null };
}
