import { inTransaction } from '../../db/client';
import type { Actor, TeamInfo } from '../access';
import { recordAudit, requireTeam } from '../access/server';
import { listSkills } from '../people/server';
import { type FloorId, formatDay, type Outcome, ok, refuse, type TeamId } from '../units';
import type { Floor, FloorInput } from './floor';
import { isInForce } from './need-on';
import { findDuplicate, labelFloor, sayDates } from './same-cover';
import {
  type CheckedFloor,
  deleteFloor,
  findFloor,
  insertFloor,
  listFloors,
  updateFloor,
} from './store';

/** Adds a floor to a team. Refused for a foreign skill, or when the same cover is asked for already. */
export function addFloor(actor: Actor, teamId: TeamId, input: FloorInput): Outcome<Floor> {
  const team = requireTeam(actor, 'floors.write', teamId);
  if (!team.ok) return team;
  const checked = checkFloor(teamId, input, listFloors(teamId));
  if (!checked.ok) return checked;
  return inTransaction(() => {
    const id = insertFloor(teamId, checked.value);
    recordAudit({ actor, teamId, action: 'floor.add', subjectId: id, detail: { ...input } });
    return ok({ ...checked.value, id, teamId, dates: [] });
  });
}

/**
 * Replaces a floor; its dates that differ stay. Refused when one of them would fall outside the new
 * first and last day.
 */
export function changeFloor(actor: Actor, floorId: FloorId, input: FloorInput): Outcome<Floor> {
  const found = requireFloor(actor, floorId);
  if (!found.ok) return found;
  const { floor, team } = found.value;
  const others = listFloors(team.id).filter(({ id }) => id !== floorId);
  const checked = checkFloor(team.id, input, others);
  if (!checked.ok) return checked;
  const outside = floor.dates.find(({ date }) => !isInForce(input, date));
  if (outside) {
    const path = outside.date < input.effectiveFrom ? 'effectiveFrom' : 'effectiveTo';
    const message = `${formatDay(outside.date)} has its own number of people. Keep it inside, or clear that date first.`;
    return refuse('invalid', 'A date that differs would fall outside the floor.', [
      { path, message },
    ]);
  }
  return inTransaction(() => {
    updateFloor(floorId, checked.value);
    const detail = { before: floor, after: input };
    recordAudit({ actor, teamId: team.id, action: 'floor.change', subjectId: floorId, detail });
    return ok({ ...floor, ...checked.value });
  });
}

/** Removes a floor with its pattern and dates. Runs made with it keep their own copy. */
export function removeFloor(actor: Actor, floorId: FloorId): Outcome<undefined> {
  const found = requireFloor(actor, floorId);
  if (!found.ok) return found;
  const { floor, team } = found.value;
  return inTransaction(() => {
    deleteFloor(floorId);
    const detail = { ...floor };
    recordAudit({ actor, teamId: team.id, action: 'floor.remove', subjectId: floorId, detail });
    return ok(undefined);
  });
}

/** The floor and its team, if the actor may change it; a floor of a foreign team is "not found". */
export function requireFloor(
  actor: Actor,
  floorId: FloorId,
): Outcome<{ readonly floor: Floor; readonly team: TeamInfo }> {
  const floor = findFloor(floorId);
  const team = floor ? requireTeam(actor, 'floors.write', floor.teamId) : null;
  if (team && !team.ok && team.error.code !== 'not-found') return team;
  return floor && team?.ok
    ? ok({ floor, team: team.value })
    : refuse('not-found', 'There is no such floor among those of your teams.');
}

function checkFloor(
  teamId: TeamId,
  input: FloorInput,
  others: readonly Floor[],
): Outcome<CheckedFloor> {
  const skills = listSkills(teamId);
  const skillId = skills.find(({ id }) => id === input.skillId)?.id ?? null;
  if (skillId !== input.skillId) {
    return refuse('invalid', 'The skill does not belong to this team.', [
      { path: 'skillId', message: 'Choose a skill of this team, or anybody.' },
    ]);
  }
  const twin = findDuplicate(input, others);
  if (twin) {
    return refuse(
      'conflict',
      `The floor ${labelFloor(twin, skills)} ${sayDates(twin)} asks for the same cover on some of these dates. Change that one, or choose dates outside it.`,
    );
  }
  return ok({ ...input, skillId });
}
