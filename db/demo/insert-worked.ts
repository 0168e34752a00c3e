import { eq } from 'drizzle-orm';
import { recordWorkedShifts } from '../../modules/hours/server';
import type { VersionId } from '../../modules/units';
import { db } from '../client';
import { assignments, people } from '../schema';

/** First shifts that went otherwise than planned, by person: minutes longer or shorter, and why. */
const differences: Readonly<Record<string, { readonly minutes: number; readonly reason: string }>> =
  {
    'Ravi Thornby': { minutes: 45, reason: 'Stayed for a late admission' },
    'Jun Marisco': { minutes: -30, reason: 'Left early, agreed with the supervisor' },
  };

/** Records every shift that has ended by `now` as worked: as planned but for two that differ. */
export function insertWorked(versionId: VersionId, now: number): void {
  const pending = new Map(Object.entries(differences));
  const ended = db()
    .select({
      personId: assignments.personId,
      name: people.name,
      date: assignments.date,
      startsAtUtc: assignments.startsAtUtc,
      endsAtUtc: assignments.endsAtUtc,
      paidMinutes: assignments.paidMinutes,
    })
    .from(assignments)
    .innerJoin(people, eq(people.id, assignments.personId))
    .where(eq(assignments.versionId, versionId))
    .orderBy(assignments.startsAtUtc)
    .all()
    .filter(({ endsAtUtc }) => endsAtUtc <= now);
  recordWorkedShifts(
    ended.map(({ name, ...shift }) => {
      const differs = pending.get(name);
      pending.delete(name);
      const minutes = differs?.minutes ?? 0;
      return {
        ...shift,
        endsAtUtc: shift.endsAtUtc + minutes * 60_000,
        paidMinutes: shift.paidMinutes + minutes,
        recordedBy: null,
        reason: differs?.reason ?? '',
      };
    }),
  );
}
