import { and, desc, eq, max } from 'drizzle-orm';
import { db } from '../../db/client';
import { rosters, runs, users } from '../../db/schema';
import { type PlannedRoster, type Problem, readProblem } from '../problem';
import { readProof } from '../proof';
import type { KnotsAnswer } from '../solver';
import type { RosterId, RunId, TeamId, UserId } from '../units';
import type { Run, RunEnd } from './stored';

const selectRuns = () =>
  db()
    .select({
      id: runs.id,
      rosterId: runs.rosterId,
      teamId: rosters.teamId,
      number: runs.number,
      state: runs.state,
      limitSeconds: runs.limitSeconds,
      startsOn: rosters.startsOn,
      endsOn: rosters.endsOn,
      startedAtUtc: runs.startedAtUtc,
      endedAtUtc: runs.endedAtUtc,
      startedBy: runs.startedBy,
      startedByName: users.name,
      proof: runs.proof,
      boundCents: runs.boundCents,
      shortageBoundMinutes: runs.shortageBoundMinutes,
      isProvenOptimal: runs.isProvenOptimal,
      failure: runs.failure,
    })
    .from(runs)
    .innerJoin(rosters, eq(rosters.id, runs.rosterId))
    .innerJoin(users, eq(users.id, runs.startedBy));

type RunRow = NonNullable<ReturnType<ReturnType<typeof selectRuns>['get']>>;

/** A proof may be of an earlier version of the program. */
const toRun = (row: RunRow): Run => ({ ...row, proof: row.proof && readProof(row.proof) });

/** Starts a run's row with the next number of its roster. */
export function insertRun(run: {
  readonly id: RunId;
  readonly rosterId: RosterId;
  readonly limitSeconds: number;
  readonly startedAtUtc: number;
  readonly startedBy: UserId;
  readonly problem: Problem;
}): void {
  const newest = db()
    .select({ number: max(runs.number) })
    .from(runs)
    .where(eq(runs.rosterId, run.rosterId))
    .get();
  db()
    .insert(runs)
    .values({ ...run, number: (newest?.number ?? 0) + 1, state: 'running' })
    .run();
}

export function findRun(id: RunId): Run | null {
  const row = selectRuns().where(eq(runs.id, id)).get();
  return row ? toRun(row) : null;
}

/** The input of a run, the best roster found and the knots told; throws for an unknown run. */
export function readRunDocuments(id: RunId): {
  readonly problem: Problem;
  readonly roster: PlannedRoster | null;
  readonly knots: KnotsAnswer | null;
} {
  const row = db()
    .select({ problem: runs.problem, roster: runs.roster, knots: runs.knots })
    .from(runs)
    .where(eq(runs.id, id))
    .get();
  if (!row) throw new Error(`No run ${id}`);
  // A run of last year holds the problem document of that time.
  const problem = readProblem(row.problem);
  if (!problem.ok) throw new Error(`The problem of run ${id}: ${problem.error.detail}`);
  return { problem: problem.value, roster: row.roster, knots: row.knots };
}

/** The runs of a team, newest first. */
export function listRunsOf(teamId: TeamId): Run[] {
  return selectRuns()
    .where(eq(rosters.teamId, teamId))
    .orderBy(desc(runs.startedAtUtc), desc(runs.number))
    .all()
    .map(toRun);
}

export function findRunningRun(rosterId: RosterId): Run | null {
  const row = selectRuns()
    .where(and(eq(runs.rosterId, rosterId), eq(runs.state, 'running')))
    .get();
  return row ? toRun(row) : null;
}

export function listRunningRuns(): Run[] {
  return selectRuns().where(eq(runs.state, 'running')).all().map(toRun);
}

/** Keeps the best roster so far, so that a crash loses little. */
export function keepRunRoster(id: RunId, roster: PlannedRoster): void {
  db().update(runs).set({ roster }).where(eq(runs.id, id)).run();
}

/** Keeps why the floors cannot all be held. */
export function keepRunKnots(id: RunId, knots: KnotsAnswer): void {
  db().update(runs).set({ knots }).where(eq(runs.id, id)).run();
}

/** Ends a running run; false when it had ended already. */
export function endRun(id: RunId, end: RunEnd): boolean {
  const outcome = db()
    .update(runs)
    .set(end)
    .where(and(eq(runs.id, id), eq(runs.state, 'running')))
    .run();
  return outcome.changes === 1;
}
