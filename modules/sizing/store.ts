import { desc, eq, sql } from 'drizzle-orm';
import { db } from '../../db/client';
import { sizings } from '../../db/schema';
import type { TeamId, UserId } from '../units';
import type { Sizing } from './sizing';

export function insertSizing(teamId: TeamId, askedBy: UserId, sizing: Sizing): void {
  db()
    .insert(sizings)
    .values({ ...sizing, teamId, askedBy })
    .run();
}

/** The sizing of a team that was asked for last, or null. */
export function findLatestSizing(teamId: TeamId): Sizing | null {
  return (
    db()
      .select({
        id: sizings.id,
        askedAtUtc: sizings.askedAtUtc,
        input: sizings.input,
        problem: sizings.problem,
        answer: sizings.answer,
      })
      .from(sizings)
      .where(eq(sizings.teamId, teamId))
      .orderBy(desc(sizings.askedAtUtc), desc(sql`rowid`))
      .limit(1)
      .get() ?? null
  );
}
