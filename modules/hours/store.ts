import { and, asc, eq, gte, lte } from 'drizzle-orm';
import { db } from '../../db/client';
import { people, workedShifts } from '../../db/schema';
import type { LocalDate, PersonId, TeamId, UserId } from '../units';
import { newId } from '../units/server';

/** Time really worked, as it is kept. */
export interface WorkedShift {
  readonly personId: PersonId;
  /** The local date on which the work started. */
  readonly date: LocalDate;
  readonly startsAtUtc: number;
  readonly endsAtUtc: number;
  readonly paidMinutes: number;
  readonly recordedBy: UserId | null;
  /** Why it differs from the plan; empty when it does not. */
  readonly reason: string;
}

/** Rows written by one statement: SQLite takes at most 32766 bound values, eight a row here. */
const rowsAtOnce = 500;

/** Keeps worked time. Work that starts at the same instant for a person twice throws. */
export function recordWorkedShifts(worked: readonly WorkedShift[]): void {
  for (let start = 0; start < worked.length; start += rowsAtOnce) {
    const rows = worked
      .slice(start, start + rowsAtOnce)
      .map((shift) => ({ ...shift, id: newId('wrk') }));
    db().insert(workedShifts).values(rows).run();
  }
}

/** Worked time of a team that started on dates of a range, by start. */
export function listWorkedShifts(teamId: TeamId, from: LocalDate, to: LocalDate): WorkedShift[] {
  return db()
    .select({
      personId: workedShifts.personId,
      date: workedShifts.date,
      startsAtUtc: workedShifts.startsAtUtc,
      endsAtUtc: workedShifts.endsAtUtc,
      paidMinutes: workedShifts.paidMinutes,
      recordedBy: workedShifts.recordedBy,
      reason: workedShifts.reason,
    })
    .from(workedShifts)
    .innerJoin(people, eq(people.id, workedShifts.personId))
    .where(and(eq(people.teamId, teamId), gte(workedShifts.date, from), lte(workedShifts.date, to)))
    .orderBy(asc(workedShifts.startsAtUtc))
    .all();
}
