import { inTransaction } from '../../db/client';
import type { Actor } from '../access';
import { recordAudit, requireTeam } from '../access/server';
import {
  type FloorId,
  formatDay,
  type LocalDate,
  type Outcome,
  ok,
  refuse,
  type TeamId,
} from '../units';
import { requireFloor } from './edit-floors';
import type { Floor, FloorDate } from './floor';
import type { ContinueFloors, FloorNeeds } from './floor-changes';
import { isInForce } from './need-on';
import { continuedTo, sayDates } from './same-cover';
import {
  deleteFloorDateRow,
  listFloors,
  setFloorDateRow,
  setFloorEnd,
  setFloorNeed,
} from './store';

/** Sets many cells of the floors table at once, all or none; gives back the floors they belong to. */
export function setFloorNeeds(actor: Actor, teamId: TeamId, cells: FloorNeeds): Outcome<Floor[]> {
  const team = requireTeam(actor, 'floors.write', teamId);
  if (!team.ok) return team;
  const known = new Map<string, FloorId>(listFloors(teamId).map(({ id }) => [id, id]));
  const changes: { floorId: FloorId; day: number; people: number }[] = [];
  for (const { floorId, day, people } of cells) {
    const id = known.get(floorId);
    if (!id) return refuse('not-found', 'One of the floors is not among those of this team.');
    changes.push({ floorId: id, day, people });
  }
  return inTransaction(() => {
    for (const { floorId, day, people } of changes) setFloorNeed(floorId, day, people);
    const detail = { cells };
    recordAudit({ actor, teamId, action: 'floor-needs.set', subjectId: teamId, detail });
    const touched = new Set(changes.map(({ floorId }) => floorId));
    return ok(listFloors(teamId).filter(({ id }) => touched.has(id)));
  });
}

/** Gives one date of a floor its own number of people. Refused for a date outside the floor. */
export function setFloorDate(actor: Actor, floorId: FloorId, input: FloorDate): Outcome<Floor> {
  const found = requireFloor(actor, floorId);
  if (!found.ok) return found;
  const { floor, team } = found.value;
  if (!isInForce(floor, input.date)) {
    return refuse('invalid', 'The floor does not hold on this date.', [
      {
        path: 'date',
        message: `Choose a date ${sayDates(floor)}, or change the floor's first and last day.`,
      },
    ]);
  }
  return inTransaction(() => {
    setFloorDateRow(floorId, input);
    const detail = { ...input };
    recordAudit({ actor, teamId: team.id, action: 'floor-date.set', subjectId: floorId, detail });
    return ok({ ...floor, dates: withDate(floor, input) });
  });
}

/** Takes a date's own number away, so that the weekly pattern holds again. */
export function clearFloorDate(actor: Actor, floorId: FloorId, date: LocalDate): Outcome<Floor> {
  const found = requireFloor(actor, floorId);
  if (!found.ok) return found;
  const { floor, team } = found.value;
  const own = floor.dates.find((entry) => entry.date === date);
  if (!own) return refuse('not-found', `${formatDay(date)} does not differ on this floor.`);
  return inTransaction(() => {
    deleteFloorDateRow(floorId, date);
    const detail = { ...own };
    recordAudit({ actor, teamId: team.id, action: 'floor-date.clear', subjectId: floorId, detail });
    return ok({ ...floor, dates: floor.dates.filter((entry) => entry !== own) });
  });
}

/**
 * Lets every floor that holds on `from` hold through `to`, and gives back those that now last longer.
 * Dates that differ are not copied: each belongs to its own date.
 */
export function continueFloors(
  actor: Actor,
  teamId: TeamId,
  { from, to }: ContinueFloors,
): Outcome<Floor[]> {
  const team = requireTeam(actor, 'floors.write', teamId);
  if (!team.ok) return team;
  const floors = listFloors(teamId);
  const holding = floors.filter((floor) => isInForce(floor, from));
  if (holding.length === 0) {
    return refuse('invalid', 'No floor holds on this date.', [
      { path: 'from', message: 'Choose a date on which floors hold.' },
    ]);
  }
  const continued = holding.flatMap((floor) => {
    const effectiveTo = continuedTo(floor, floors, to);
    return effectiveTo ? [{ ...floor, effectiveTo }] : [];
  });
  return inTransaction(() => {
    for (const { id, effectiveTo } of continued) setFloorEnd(id, effectiveTo);
    const detail = { from, to, floorIds: continued.map(({ id }) => id) };
    recordAudit({ actor, teamId, action: 'floors.continue', subjectId: teamId, detail });
    return ok(continued);
  });
}

function withDate(floor: Floor, input: FloorDate): FloorDate[] {
  return [...floor.dates.filter(({ date }) => date !== input.date), input].sort((one, other) =>
    one.date < other.date ? -1 : 1,
  );
}
