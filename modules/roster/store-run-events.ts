import { and, asc, desc, eq, gt } from 'drizzle-orm';
import { db } from '../../db/client';
import { runEvents } from '../../db/schema';
import type { RunId } from '../units';
import type { RunEvent } from './views';

type Row = typeof runEvents.$inferSelect;

const toEvent = ({ runId: _runId, stage, ...row }: Row): RunEvent => ({
  ...row,
  stage: stage === 1 ? 1 : 2,
});

export function insertRunEvent(runId: RunId, event: RunEvent): void {
  db()
    .insert(runEvents)
    .values({ ...event, runId })
    .run();
}

/** What a run reported after a sequence number (0: everything), oldest first. */
export function listRunEvents(runId: RunId, after: number): RunEvent[] {
  return db()
    .select()
    .from(runEvents)
    .where(and(eq(runEvents.runId, runId), gt(runEvents.sequence, after)))
    .orderBy(asc(runEvents.sequence))
    .all()
    .map(toEvent);
}

export function findNewestRunEvent(runId: RunId): RunEvent | null {
  const row = db()
    .select()
    .from(runEvents)
    .where(eq(runEvents.runId, runId))
    .orderBy(desc(runEvents.sequence))
    .get();
  return row ? toEvent(row) : null;
}
