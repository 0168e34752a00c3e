import type { Actor } from '../access';
import { requireTeam } from '../access/server';
import { listSkills } from '../people/server';
import { type LocalDate, type Outcome, ok, type TeamId } from '../units';
import type { Coverage } from './coverage';
import type { Holiday } from './floor';
import type { ShiftKind } from './shift-kind';
import { listFloors, readHolidays } from './store';
import { readShiftKinds } from './store-shift-kinds';

/** Floors, shift kinds in use, skills and holidays of a team, for those who may read floors. */
export function readCoverage(actor: Actor, teamId: TeamId): Outcome<Coverage> {
  const team = requireTeam(actor, 'floors.read', teamId);
  if (!team.ok) return team;
  return ok({
    team: team.value,
    skills: listSkills(teamId),
    kinds: listShiftKinds(teamId),
    floors: listFloors(teamId),
    holidays: readHolidays(teamId),
  });
}

/** The shift kinds of a team by start time; retired ones only when asked for. No permission check. */
export function listShiftKinds(teamId: TeamId, { withRetired = false } = {}): ShiftKind[] {
  return readShiftKinds(teamId).filter(({ isRetired }) => withRetired || !isRetired);
}

/** Public holidays from `from` to `to`, both included, earliest first. No permission check. */
export function listHolidays(teamId: TeamId, from: LocalDate, to: LocalDate): Holiday[] {
  return readHolidays(teamId).filter(({ date }) => from <= date && date <= to);
}
