import type { SkillId, TeamId } from '../../modules/units';
import { newId } from '../../modules/units/server';
import { db } from '../client';
import { floorDates, floorNeeds, floors, holidays, shiftKinds } from '../schema';
import { type DemoDates, dayOf } from './dates';
import type { DemoFloor, DemoTeam } from './team-data';

/** Inserts shift kinds, holidays, and floors that hold from the running period through the draft. */
export function insertCoverage(
  team: DemoTeam,
  teamId: TeamId,
  skillIds: ReadonlyMap<string, SkillId>,
  dates: DemoDates,
): void {
  for (const kind of team.kinds) {
    db()
      .insert(shiftKinds)
      .values({ id: newId('knd'), teamId, ...kind })
      .run();
  }
  for (const { day, name } of team.holidays) {
    db()
      .insert(holidays)
      .values({ teamId, date: dayOf(dates.draft, day), name })
      .run();
  }
  for (const floor of team.floors) insertFloor(floor, teamId, skillIds, dates);
}

function insertFloor(
  { skill, needs, dates: differing, ...floor }: DemoFloor,
  teamId: TeamId,
  skillIds: ReadonlyMap<string, SkillId>,
  { running, draft }: DemoDates,
): void {
  const skillId = skill === null ? null : skillIds.get(skill);
  if (skillId === undefined) throw new Error(`A floor asks for ${skill}, which the team lacks.`);
  const id = newId('flr');
  const effective = { effectiveFrom: running.startsOn, effectiveTo: draft.endsOn };
  db()
    .insert(floors)
    .values({ id, teamId, skillId, ...floor, ...effective })
    .run();
  needs.forEach((people, day) => {
    db().insert(floorNeeds).values({ floorId: id, day, people }).run();
  });
  for (const { day, people, reason } of differing) {
    db()
      .insert(floorDates)
      .values({ floorId: id, date: dayOf(draft, day), people, reason })
      .run();
  }
}
