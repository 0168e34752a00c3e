import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { OrganisationId, SessionId, TeamId, UserId } from '../../modules/units/ids';

export const organisations = sqliteTable('organisations', {
  id: text().$type<OrganisationId>().primaryKey(),
  name: text().notNull(),
  currency: text().notNull(),
  locale: text().notNull(),
  /** Premiums: see `PayRules` in modules/rules. */
  nightStartMinute: integer().notNull(),
  nightEndMinute: integer().notNull(),
  nightPercent: integer().notNull(),
  weekendPercent: integer().notNull(),
  holidayPercent: integer().notNull(),
  overtimePercent: integer().notNull(),
});

export const teams = sqliteTable(
  'teams',
  {
    id: text().$type<TeamId>().primaryKey(),
    organisationId: text()
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisations.id),
    name: text().notNull(),
    /** IANA zone: every local minute of the team is read in it. */
    zone: text().notNull(),
    /** Where a drawn day begins, e.g. 420 for 07:00. */
    dayStartsAtMinute: integer().notNull(),
    periodDays: integer().notNull(),
    /** Days of notice promised between publishing and the first shift. */
    noticeDays: integer().notNull(),
    restMinutes: integer().notNull(),
    longestRunDays: integer(),
    longestRunNights: integer(),
    nightsPerPeriod: integer(),
    weekendsPerPeriod: integer(),
    weekendCountsFridayNight: integer({ mode: 'boolean' }).notNull(),
  },
  (table) => [
    check('teams_period_days', sql`${table.periodDays} between 1 and 366`),
    check('teams_rest', sql`${table.restMinutes} between 0 and 2880`),
  ],
);

export const users = sqliteTable('users', {
  id: text().$type<UserId>().primaryKey(),
  organisationId: text()
    .$type<OrganisationId>()
    .notNull()
    .references(() => organisations.id),
  /** Lower case. */
  email: text().notNull().unique(),
  name: text().notNull(),
  /** argon2id, PHC string. */
  passwordHash: text().notNull(),
  disabledAtUtc: integer(),
});

export const memberships = sqliteTable(
  'memberships',
  {
    id: text().primaryKey(),
    userId: text()
      .$type<UserId>()
      .notNull()
      .references(() => users.id),
    role: text({ enum: ['owner', 'supervisor', 'staff', 'hr'] }).notNull(),
    teamId: text()
      .$type<TeamId>()
      .references(() => teams.id),
  },
  (table) => [
    uniqueIndex('memberships_once').on(table.userId, table.role, table.teamId),
    check('memberships_role', sql`${table.role} in ('owner', 'supervisor', 'staff', 'hr')`),
    check('memberships_team', sql`(${table.role} in ('owner', 'hr')) = (${table.teamId} is null)`),
  ],
);

/** Signed-in sessions. The cookie only carries the id; ending the row ends the session at once. */
export const sessions = sqliteTable(
  'sessions',
  {
    id: text().$type<SessionId>().primaryKey(),
    userId: text()
      .$type<UserId>()
      .notNull()
      .references(() => users.id),
    createdAtUtc: integer().notNull(),
    lastSeenAtUtc: integer().notNull(),
    endedAtUtc: integer(),
  },
  (table) => [index('sessions_user').on(table.userId)],
);

export const auditEvents = sqliteTable(
  'audit_events',
  {
    id: text().primaryKey(),
    organisationId: text()
      .$type<OrganisationId>()
      .notNull()
      .references(() => organisations.id),
    teamId: text()
      .$type<TeamId>()
      .references(() => teams.id),
    userId: text()
      .$type<UserId>()
      .references(() => users.id),
    atUtc: integer().notNull(),
    /** e.g. `floor.add`, `roster.publish`. */
    action: text().notNull(),
    subjectId: text().notNull(),
    detail: text({ mode: 'json' }).$type<Record<string, unknown>>().notNull(),
  },
  (table) => [index('audit_events_at').on(table.organisationId, table.atUtc)],
);
