import { and, asc, eq, gte, inArray, lte } from 'drizzle-orm';
import { db } from '../../db/client';
import { assignments } from '../../db/schema';
import type { LocalDate, PersonId, TeamId, VersionId } from '../units';
import { newId } from '../units/server';
import { listRostersTouching } from './store-rosters';
import { findNewestPublished, getNewestVersion } from './store-versions';
import type { KeptShift, VersionShift } from './stored';

const columns = {
  id: assignments.id,
  personId: assignments.personId,
  date: assignments.date,
  shiftKindId: assignments.shiftKindId,
  skillId: assignments.skillId,
  startsAtUtc: assignments.startsAtUtc,
  endsAtUtc: assignments.endsAtUtc,
  paidMinutes: assignments.paidMinutes,
  isPinned: assignments.isPinned,
};

/** Rows written by one statement: SQLite takes at most 32766 bound values, ten a row here. */
const rowsAtOnce = 500;

/** Puts these shifts in place of all shifts of a version. */
export function replaceShifts(
  versionId: VersionId,
  shifts: readonly Omit<KeptShift, 'id'>[],
): void {
  db().delete(assignments).where(eq(assignments.versionId, versionId)).run();
  for (let start = 0; start < shifts.length; start += rowsAtOnce) {
    const rows = shifts
      .slice(start, start + rowsAtOnce)
      .map((shift) => ({ ...shift, id: newId('asg'), versionId }));
    db().insert(assignments).values(rows).run();
  }
}

/** The shifts of a version by date and start. */
export function listShifts(versionId: VersionId): KeptShift[] {
  return db()
    .select(columns)
    .from(assignments)
    .where(eq(assignments.versionId, versionId))
    .orderBy(asc(assignments.date), asc(assignments.startsAtUtc), asc(assignments.id))
    .all();
}

/** The shifts one person has in a version. */
export function listShiftsOfPerson(versionId: VersionId, personId: PersonId): KeptShift[] {
  return db()
    .select(columns)
    .from(assignments)
    .where(and(eq(assignments.versionId, versionId), eq(assignments.personId, personId)))
    .orderBy(asc(assignments.date))
    .all();
}

/**
 * Shifts of a team that start on dates of the range, by start: of each period its newest published
 * version, or its newest version at all where drafts are wanted.
 */
export function listTeamShifts(
  teamId: TeamId,
  from: LocalDate,
  to: LocalDate,
  withDrafts: boolean,
): VersionShift[] {
  const versions = listRostersTouching(teamId, from, to)
    .map(({ id }) => (withDrafts ? getNewestVersion(id) : findNewestPublished(id)))
    .filter((version) => version !== null);
  const published = new Map(
    versions.map(({ id, publishedAtUtc }) => [id, publishedAtUtc !== null]),
  );
  if (versions.length === 0) return [];
  return db()
    .select({ ...columns, versionId: assignments.versionId })
    .from(assignments)
    .where(
      and(
        inArray(assignments.versionId, [...published.keys()]),
        gte(assignments.date, from),
        lte(assignments.date, to),
      ),
    )
    .orderBy(asc(assignments.startsAtUtc), asc(assignments.id))
    .all()
    .map((row) => ({ ...row, isPublished: published.get(row.versionId) === true }));
}
