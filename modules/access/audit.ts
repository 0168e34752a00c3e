import { now } from '../../db/clock';
import type { TeamId } from '../units';
import { newId } from '../units/server';
import type { Actor } from './actor';
import { insertAuditEvent } from './store';

/** What happened, for the record of who changed what. Call it inside the transaction of the change. */
export interface AuditEntry {
  readonly actor: Actor;
  readonly teamId: TeamId | null;
  /** `noun.verb`, e.g. `floor.add`. */
  readonly action: string;
  readonly subjectId: string;
  readonly detail?: Record<string, unknown>;
}

/** Writes one line of the record. */
export function recordAudit({ actor, teamId, action, subjectId, detail = {} }: AuditEntry): void {
  insertAuditEvent({
    id: newId('aud'),
    organisationId: actor.organisationId,
    teamId,
    userId: actor.userId,
    atUtc: now(),
    action,
    subjectId,
    detail,
  });
}
