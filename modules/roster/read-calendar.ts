import { type Actor, canInTeam } from '../access';
import { requireTeam } from '../access/server';
import { type DateRange, type Outcome, ok, type TeamId } from '../units';
import { requireOwnPerson } from './require-own';
import { listTeamShifts } from './store';
import type { VersionShift } from './stored';
import { readTeamWords, type TeamWords } from './team-words';
import type { CalendarEntry } from './views';

/** The shifts of a team that start in a range, of each period its newest version; drafts are marked. */
export function readTeamCalendar(
  actor: Actor,
  teamId: TeamId,
  { from, to }: DateRange,
): Outcome<CalendarEntry[]> {
  const team = requireTeam(actor, 'rosters.read', teamId);
  if (!team.ok) return team;
  const words = readTeamWords(teamId);
  return ok(listTeamShifts(teamId, from, to, true).map((shift) => toEntry(shift, words)));
}

/**
 * The actor's own shifts that start in a range: published ones, and for those who plan the team the
 * drafts too, marked.
 */
export function readOwnCalendar(actor: Actor, { from, to }: DateRange): Outcome<CalendarEntry[]> {
  const own = requireOwnPerson(actor, 'own-shifts.read');
  if (!own.ok) return own;
  const { person, team } = own.value;
  const words = readTeamWords(team.id);
  const withDrafts = canInTeam(actor, 'rosters.write', team);
  return ok(
    listTeamShifts(team.id, from, to, withDrafts)
      .filter(({ personId }) => personId === person.id)
      .map((shift) => toEntry(shift, words)),
  );
}

function toEntry(shift: VersionShift, words: TeamWords): CalendarEntry {
  const { name, letter, tone } = words.kind(shift.shiftKindId);
  return {
    id: shift.id,
    personId: shift.personId,
    personName: words.person(shift.personId),
    kindName: name,
    letter,
    tone,
    skillName: words.skill(shift.skillId),
    date: shift.date,
    startsAtUtc: shift.startsAtUtc,
    endsAtUtc: shift.endsAtUtc,
    isPublished: shift.isPublished,
  };
}
