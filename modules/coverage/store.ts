import { and, asc, eq, inArray, isNull, type SQL } from 'drizzle-orm';
import { db } from '../../db/client';
import { floorDates, floorNeeds, floors, holidays, skills } from '../../db/schema';
import type { FloorId, LocalDate, SkillId, TeamId } from '../units';
import { newId } from '../units/server';
import { type Floor, type FloorDate, type FloorInput, type Holiday, patternDays } from './floor';

/** Input whose skill was found in the team. */
export type CheckedFloor = FloorInput & { readonly skillId: SkillId | null };

/** The floors of a team by skill (floors for anybody last), then by window and first day. */
export const listFloors = (teamId: TeamId): Floor[] => readFloors(eq(floors.teamId, teamId));

export const findFloor = (id: FloorId): Floor | null => readFloors(eq(floors.id, id))[0] ?? null;

function readFloors(where: SQL): Floor[] {
  const rows = db()
    .select({ floor: floors })
    .from(floors)
    .leftJoin(skills, eq(skills.id, floors.skillId))
    .where(where)
    .orderBy(
      isNull(floors.skillId),
      asc(skills.position),
      asc(floors.startMinute),
      asc(floors.endMinute),
      asc(floors.effectiveFrom),
      asc(floors.id),
    )
    .all();
  const ids = rows.map(({ floor }) => floor.id);
  const needs = db().select().from(floorNeeds).where(inArray(floorNeeds.floorId, ids)).all();
  const people = new Map(needs.map((need) => [`${need.floorId} ${need.day}`, need.people]));
  const dates = db()
    .select()
    .from(floorDates)
    .where(inArray(floorDates.floorId, ids))
    .orderBy(asc(floorDates.date))
    .all();
  return rows.map(({ floor }) => ({
    ...floor,
    needs: patternDays.map((day) => people.get(`${floor.id} ${day}`) ?? 0),
    dates: dates
      .filter(({ floorId }) => floorId === floor.id)
      .map(({ floorId: _, ...date }) => date),
  }));
}

export function insertFloor(teamId: TeamId, { needs, ...floor }: CheckedFloor): FloorId {
  const id = newId('flr');
  db()
    .insert(floors)
    .values({ id, teamId, ...floor })
    .run();
  needs.forEach((people, day) => {
    setFloorNeed(id, day, people);
  });
  return id;
}

export function updateFloor(id: FloorId, { needs, ...floor }: CheckedFloor): void {
  db().update(floors).set(floor).where(eq(floors.id, id)).run();
  needs.forEach((people, day) => {
    setFloorNeed(id, day, people);
  });
}

export function setFloorEnd(id: FloorId, effectiveTo: LocalDate): void {
  db().update(floors).set({ effectiveTo }).where(eq(floors.id, id)).run();
}

/** Its weekly pattern and dates go with it. */
export function deleteFloor(id: FloorId): void {
  db().delete(floors).where(eq(floors.id, id)).run();
}

/** `day` is a column of the weekly pattern, 0 to 7. */
export function setFloorNeed(floorId: FloorId, day: number, people: number): void {
  db()
    .insert(floorNeeds)
    .values({ floorId, day, people })
    .onConflictDoUpdate({ target: [floorNeeds.floorId, floorNeeds.day], set: { people } })
    .run();
}

export function setFloorDateRow(floorId: FloorId, { date, people, reason }: FloorDate): void {
  db()
    .insert(floorDates)
    .values({ floorId, date, people, reason })
    .onConflictDoUpdate({ target: [floorDates.floorId, floorDates.date], set: { people, reason } })
    .run();
}

export function deleteFloorDateRow(floorId: FloorId, date: LocalDate): void {
  db()
    .delete(floorDates)
    .where(and(eq(floorDates.floorId, floorId), eq(floorDates.date, date)))
    .run();
}

/** All public holidays of a team, earliest first. */
export function readHolidays(teamId: TeamId): Holiday[] {
  return db()
    .select({ date: holidays.date, name: holidays.name })
    .from(holidays)
    .where(eq(holidays.teamId, teamId))
    .orderBy(asc(holidays.date))
    .all();
}
