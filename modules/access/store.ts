import { and, asc, eq, isNull } from 'drizzle-orm';
import { db } from '../../db/client';
import {
  auditEvents,
  memberships,
  organisations,
  people,
  sessions,
  teams,
  users,
} from '../../db/schema';
import type { OrganisationId, SessionId, TeamId, UserId } from '../units';
import { newId } from '../units/server';
import type { Actor, Membership } from './actor';
import type { Member } from './member';
import type { TeamInfo } from './team';

/** What sign-in needs of a user; the e-mail is compared in lower case. */
export function findCredentials(email: string) {
  return (
    db()
      .select({
        userId: users.id,
        passwordHash: users.passwordHash,
        disabledAtUtc: users.disabledAtUtc,
      })
      .from(users)
      .where(eq(users.email, email.toLowerCase()))
      .get() ?? null
  );
}

export function insertSession(userId: UserId, atUtc: number): SessionId {
  const id = newId('ses');
  db().insert(sessions).values({ id, userId, createdAtUtc: atUtc, lastSeenAtUtc: atUtc }).run();
  return id;
}

export function findSession(id: SessionId) {
  return db().select().from(sessions).where(eq(sessions.id, id)).get() ?? null;
}

export function touchSession(id: SessionId, atUtc: number): void {
  db().update(sessions).set({ lastSeenAtUtc: atUtc }).where(eq(sessions.id, id)).run();
}

export function endSession(id: SessionId, atUtc: number): void {
  db()
    .update(sessions)
    .set({ endedAtUtc: atUtc })
    .where(and(eq(sessions.id, id), isNull(sessions.endedAtUtc)))
    .run();
}

export function endSessionsOf(userId: UserId, atUtc: number): void {
  db()
    .update(sessions)
    .set({ endedAtUtc: atUtc })
    .where(and(eq(sessions.userId, userId), isNull(sessions.endedAtUtc)))
    .run();
}

function membershipsOf(userId: UserId): Membership[] {
  return db()
    .select({ role: memberships.role, teamId: memberships.teamId })
    .from(memberships)
    .where(eq(memberships.userId, userId))
    .all();
}

/** The user behind a session as they are now; null when disabled. */
export function readActor(userId: UserId, sessionId: SessionId): Actor | null {
  const row = db()
    .select({
      userId: users.id,
      organisationId: users.organisationId,
      organisationName: organisations.name,
      name: users.name,
      email: users.email,
      personId: people.id,
    })
    .from(users)
    .innerJoin(organisations, eq(organisations.id, users.organisationId))
    .leftJoin(people, and(eq(people.userId, users.id), eq(people.isActive, true)))
    .where(and(eq(users.id, userId), isNull(users.disabledAtUtc)))
    .get();
  return row ? { ...row, sessionId, memberships: membershipsOf(userId) } : null;
}

const teamColumns = {
  id: teams.id,
  organisationId: teams.organisationId,
  organisationName: organisations.name,
  name: teams.name,
  zone: teams.zone,
  dayStartsAtMinute: teams.dayStartsAtMinute,
  periodDays: teams.periodDays,
  noticeDays: teams.noticeDays,
  currency: organisations.currency,
  locale: organisations.locale,
};

const selectTeams = () =>
  db()
    .select(teamColumns)
    .from(teams)
    .innerJoin(organisations, eq(organisations.id, teams.organisationId));

export function findTeam(teamId: TeamId): TeamInfo | null {
  return selectTeams().where(eq(teams.id, teamId)).get() ?? null;
}

export function listTeamsOf(organisationId: OrganisationId): TeamInfo[] {
  return selectTeams()
    .where(eq(teams.organisationId, organisationId))
    .orderBy(asc(teams.name))
    .all();
}

export function listUsers(organisationId: OrganisationId): Member[] {
  return db()
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      disabledAtUtc: users.disabledAtUtc,
    })
    .from(users)
    .where(eq(users.organisationId, organisationId))
    .orderBy(asc(users.name))
    .all()
    .map(({ disabledAtUtc, ...user }) => ({
      ...user,
      isDisabled: disabledAtUtc !== null,
      memberships: membershipsOf(user.userId),
    }));
}

export function setDisabled(userId: UserId, disabledAtUtc: number | null): void {
  db().update(users).set({ disabledAtUtc }).where(eq(users.id, userId)).run();
}

export function replaceMemberships(userId: UserId, wanted: readonly Membership[]): void {
  db().delete(memberships).where(eq(memberships.userId, userId)).run();
  for (const membership of wanted) {
    db()
      .insert(memberships)
      .values({ id: newId('mem'), userId, ...membership })
      .run();
  }
}

export function insertAuditEvent(event: typeof auditEvents.$inferInsert): void {
  db().insert(auditEvents).values(event).run();
}
