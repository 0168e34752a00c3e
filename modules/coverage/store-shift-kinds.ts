import { asc, eq, inArray, type SQL } from 'drizzle-orm';
import { db } from '../../db/client';
import { shiftKindSkills, shiftKinds } from '../../db/schema';
import type { ShiftKindId, SkillId, TeamId } from '../units';
import { newId } from '../units/server';
import type { ShiftKind, ShiftKindInput } from './shift-kind';

/** Input whose skills were found in the team. */
export type CheckedShiftKind = ShiftKindInput & { readonly skillIds: SkillId[] | null };

/** All shift kinds of a team, retired ones included, by start time. */
export const readShiftKinds = (teamId: TeamId): ShiftKind[] =>
  readKinds(eq(shiftKinds.teamId, teamId));

export const findShiftKind = (id: ShiftKindId): ShiftKind | null =>
  readKinds(eq(shiftKinds.id, id))[0] ?? null;

function readKinds(where: SQL): ShiftKind[] {
  const rows = db()
    .select()
    .from(shiftKinds)
    .where(where)
    .orderBy(asc(shiftKinds.startMinute), asc(shiftKinds.endMinute), asc(shiftKinds.name))
    .all();
  const ids = rows.map(({ id }) => id);
  const posts = db()
    .select()
    .from(shiftKindSkills)
    .where(inArray(shiftKindSkills.shiftKindId, ids))
    .all();
  return rows.map((kind) => {
    const own = posts.filter(({ shiftKindId }) => shiftKindId === kind.id);
    return { ...kind, skillIds: own.length > 0 ? own.map(({ skillId }) => skillId) : null };
  });
}

export function insertShiftKind(
  teamId: TeamId,
  { skillIds, ...kind }: CheckedShiftKind,
): ShiftKindId {
  const id = newId('knd');
  db()
    .insert(shiftKinds)
    .values({ id, teamId, ...kind })
    .run();
  insertPosts(id, skillIds ?? []);
  return id;
}

export function updateShiftKind(id: ShiftKindId, { skillIds, ...kind }: CheckedShiftKind): void {
  db().update(shiftKinds).set(kind).where(eq(shiftKinds.id, id)).run();
  db().delete(shiftKindSkills).where(eq(shiftKindSkills.shiftKindId, id)).run();
  insertPosts(id, skillIds ?? []);
}

export function setRetired(id: ShiftKindId): void {
  db().update(shiftKinds).set({ isRetired: true }).where(eq(shiftKinds.id, id)).run();
}

function insertPosts(shiftKindId: ShiftKindId, skillIds: readonly SkillId[]): void {
  for (const skillId of skillIds) {
    db().insert(shiftKindSkills).values({ shiftKindId, skillId }).run();
  }
}
