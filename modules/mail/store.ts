import { and, asc, eq, inArray, lte } from 'drizzle-orm';
import { db } from '../../db/client';
import { outbox, rosters, rosterVersions } from '../../db/schema';
import type { Id, LocalDate, TeamId, UtcMilliseconds } from '../units';
import { newId } from '../units/server';
import type { RenderedMail } from './publication';

export type OutboxId = Id<'out'>;

/** A mail that is due, as the sender needs it. */
export interface WaitingMail {
  readonly id: OutboxId;
  readonly recipient: string;
  readonly subject: string;
  readonly html: string;
  readonly text: string;
  readonly calendar: string | null;
  /** First day of the period that the mail is about; null for a mail about none. */
  readonly periodStartsOn: LocalDate | null;
  /** Failed tries so far. */
  readonly attempts: number;
}

/** Puts one mail into the outbox; given a refusal, it is kept as failed and never tried. */
export function insertMail(
  { text, ...mail }: RenderedMail,
  atUtc: UtcMilliseconds,
  refusal: string | null,
): void {
  db()
    .insert(outbox)
    .values({
      id: newId('out'),
      ...mail,
      plainText: text,
      state: refusal === null ? 'waiting' : 'failed',
      nextTryAtUtc: atUtc,
      lastError: refusal,
    })
    .run();
}

/** The mails whose next try is due, the longest waiting first. */
export function listDueMails(atUtc: UtcMilliseconds, limit: number): WaitingMail[] {
  return db()
    .select({
      id: outbox.id,
      recipient: outbox.recipient,
      subject: outbox.subject,
      html: outbox.html,
      text: outbox.plainText,
      calendar: outbox.calendar,
      periodStartsOn: rosters.startsOn,
      attempts: outbox.attempts,
    })
    .from(outbox)
    .leftJoin(rosterVersions, eq(rosterVersions.id, outbox.versionId))
    .leftJoin(rosters, eq(rosters.id, rosterVersions.rosterId))
    .where(and(eq(outbox.state, 'waiting'), lte(outbox.nextTryAtUtc, atUtc)))
    .orderBy(asc(outbox.nextTryAtUtc), asc(outbox.id))
    .limit(limit)
    .all();
}

export function markSent(id: OutboxId, atUtc: UtcMilliseconds): void {
  db()
    .update(outbox)
    .set({ state: 'sent', sentAtUtc: atUtc, lastError: null })
    .where(and(eq(outbox.id, id), eq(outbox.state, 'waiting')))
    .run();
}

/** Notes a failed try; `nextTryAtUtc` null gives the mail up. */
export function markTried(
  id: OutboxId,
  attempts: number,
  lastError: string,
  nextTryAtUtc: UtcMilliseconds | null,
): void {
  db()
    .update(outbox)
    .set({
      attempts,
      lastError,
      ...(nextTryAtUtc === null ? { state: 'failed' as const } : { nextTryAtUtc }),
    })
    .where(and(eq(outbox.id, id), eq(outbox.state, 'waiting')))
    .run();
}

/** The team each of these mails belongs to; ids that are unknown are left out. */
export function findTeamsOfMails(ids: readonly OutboxId[]): Map<OutboxId, TeamId> {
  const rows = db()
    .select({ id: outbox.id, teamId: outbox.teamId })
    .from(outbox)
    .where(inArray(outbox.id, [...ids]))
    .all();
  return new Map(rows.map(({ id, teamId }) => [id, teamId]));
}
