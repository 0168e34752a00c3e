import { and, eq } from 'drizzle-orm';
import { db } from '../../db/client';
import { confirmations } from '../../db/schema';
import type { PersonId, VersionId } from '../units';

/** Notes that a person has seen a version; a second time changes nothing. */
export function insertConfirmation(
  versionId: VersionId,
  personId: PersonId,
  confirmedAtUtc: number,
): void {
  db()
    .insert(confirmations)
    .values({ versionId, personId, confirmedAtUtc })
    .onConflictDoNothing()
    .run();
}

/** When each person confirmed a version. */
export function readConfirmations(versionId: VersionId): ReadonlyMap<PersonId, number> {
  const rows = db()
    .select()
    .from(confirmations)
    .where(eq(confirmations.versionId, versionId))
    .all();
  return new Map(rows.map((row) => [row.personId, row.confirmedAtUtc]));
}

export function findConfirmation(versionId: VersionId, personId: PersonId): number | null {
  const row = db()
    .select({ confirmedAtUtc: confirmations.confirmedAtUtc })
    .from(confirmations)
    .where(and(eq(confirmations.versionId, versionId), eq(confirmations.personId, personId)))
    .get();
  return row?.confirmedAtUtc ?? null;
}
