import { and, asc, eq, gte, lte } from 'drizzle-orm';
import { db } from '../../db/client';
import { rosters } from '../../db/schema';
import type { LocalDate, RosterId, TeamId } from '../units';
import type { Roster } from './stored';

export function insertRoster(roster: Omit<Roster, 'closedAtUtc'>): void {
  db().insert(rosters).values(roster).run();
}

export function findRoster(id: RosterId): Roster | null {
  return db().select().from(rosters).where(eq(rosters.id, id)).get() ?? null;
}

/** All periods of a team, earliest first. */
export function listRostersOf(teamId: TeamId): Roster[] {
  return db()
    .select()
    .from(rosters)
    .where(eq(rosters.teamId, teamId))
    .orderBy(asc(rosters.startsOn))
    .all();
}

/** Periods of a team that share at least one day with the range, earliest first. */
export function listRostersTouching(teamId: TeamId, from: LocalDate, to: LocalDate): Roster[] {
  return db()
    .select()
    .from(rosters)
    .where(and(eq(rosters.teamId, teamId), lte(rosters.startsOn, to), gte(rosters.endsOn, from)))
    .orderBy(asc(rosters.startsOn))
    .all();
}
