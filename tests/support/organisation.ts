import { db } from '@/db/client';
import { memberships, organisations, sessions, teams, users } from '@/db/schema';
import type { Actor, Role } from '@/modules/access';
import type { OrganisationId, PersonId, TeamId } from '@/modules/units';
import { newId } from '@/modules/units/server';

/** An organisation with the demo's pay rules, for tests. */
export function addOrganisation(name = 'Test organisation'): OrganisationId {
  const id = newId('org');
  db()
    .insert(organisations)
    .values({
      id,
      name,
      currency: 'EUR',
      locale: 'en-GB',
      nightStartMinute: 1380,
      nightEndMinute: 1860,
      nightPercent: 25,
      weekendPercent: 20,
      holidayPercent: 100,
      overtimePercent: 150,
    })
    .run();
  return id;
}

/** A team with 11 h rest, five days in a row and four-week periods, unless told otherwise. */
export function addTeam(
  organisationId: OrganisationId,
  changes: Partial<typeof teams.$inferInsert> = {},
): TeamId {
  const id = newId('tea');
  db()
    .insert(teams)
    .values({
      id,
      organisationId,
      name: `Team ${id}`,
      zone: 'Europe/Dublin',
      dayStartsAtMinute: 420,
      periodDays: 28,
      noticeDays: 14,
      restMinutes: 660,
      longestRunDays: 5,
      longestRunNights: 4,
      nightsPerPeriod: null,
      weekendsPerPeriod: null,
      weekendCountsFridayNight: false,
      ...changes,
    })
    .run();
  return id;
}

/** A user with one role and an open session, as the actor that a request would carry. */
export function addActor(
  organisationId: OrganisationId,
  role: Role,
  teamId: TeamId | null = null,
  changes: { email?: string; passwordHash?: string; personId?: PersonId } = {},
): Actor {
  const userId = newId('usr');
  const sessionId = newId('ses');
  const email = changes.email ?? `${userId}@test.example`;
  const passwordHash = changes.passwordHash ?? 'no password fits this';
  db().insert(users).values({ id: userId, organisationId, email, name: email, passwordHash }).run();
  db()
    .insert(memberships)
    .values({ id: newId('mem'), userId, role, teamId })
    .run();
  db()
    .insert(sessions)
    .values({ id: sessionId, userId, createdAtUtc: Date.now(), lastSeenAtUtc: Date.now() })
    .run();
  return {
    userId,
    sessionId,
    organisationId,
    organisationName: 'Test organisation',
    name: email,
    email,
    memberships: [{ role, teamId }],
    personId: changes.personId ?? null,
  };
}
