import { and, desc, eq, isNotNull } from 'drizzle-orm';
import { db } from '../../db/client';
import { rosterVersions, users } from '../../db/schema';
import { type Proof, readProof } from '../proof';
import type { LocalDate, RosterId, RunId, UserId, VersionId } from '../units';
import type { Version } from './stored';

const selectVersions = () =>
  db()
    .select({
      id: rosterVersions.id,
      rosterId: rosterVersions.rosterId,
      number: rosterVersions.number,
      publishedAtUtc: rosterVersions.publishedAtUtc,
      publishedByName: users.name,
      confirmBy: rosterVersions.confirmBy,
      runId: rosterVersions.runId,
      proof: rosterVersions.proof,
    })
    .from(rosterVersions)
    .leftJoin(users, eq(users.id, rosterVersions.publishedBy));

type VersionRow = NonNullable<ReturnType<ReturnType<typeof selectVersions>['get']>>;

/** A proof may be of an earlier version of the program. */
const toVersion = (row: VersionRow): Version => ({
  ...row,
  proof: row.proof && readProof(row.proof),
});

/** Makes a draft. The database allows one draft a roster. */
export function insertDraft(id: VersionId, rosterId: RosterId, number: number): void {
  db().insert(rosterVersions).values({ id, rosterId, number }).run();
}

export function findVersion(id: VersionId): Version | null {
  const row = selectVersions().where(eq(rosterVersions.id, id)).get();
  return row ? toVersion(row) : null;
}

/** The newest version, draft or published; throws for a roster without any. */
export function getNewestVersion(rosterId: RosterId): Version {
  const row = selectVersions()
    .where(eq(rosterVersions.rosterId, rosterId))
    .orderBy(desc(rosterVersions.number))
    .get();
  if (!row) throw new Error(`Roster ${rosterId} has no version`);
  return toVersion(row);
}

/** The newest version that people have been told of. */
export function findNewestPublished(rosterId: RosterId): Version | null {
  const row = selectVersions()
    .where(and(eq(rosterVersions.rosterId, rosterId), isNotNull(rosterVersions.publishedAtUtc)))
    .orderBy(desc(rosterVersions.number))
    .get();
  return row ? toVersion(row) : null;
}

/** Notes which run made a draft, with the proof that came with it. */
export function setVersionRun(id: VersionId, runId: RunId, proof: Proof): void {
  db().update(rosterVersions).set({ runId, proof }).where(eq(rosterVersions.id, id)).run();
}

export function markPublished(
  id: VersionId,
  publishing: {
    readonly publishedAtUtc: number;
    readonly publishedBy: UserId;
    readonly confirmBy: LocalDate;
    readonly proof: Proof;
  },
): void {
  db().update(rosterVersions).set(publishing).where(eq(rosterVersions.id, id)).run();
}
