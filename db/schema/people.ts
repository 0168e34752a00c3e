import { sql } from 'drizzle-orm';
import {
  check,
  index,
  integer,
  primaryKey,
  sqliteTable,
  text,
  uniqueIndex,
} from 'drizzle-orm/sqlite-core';
import type { LeaveId, LocalDate, PersonId, SkillId, TeamId, UserId } from '../../modules/units';
import { teams, users } from './access';

export const skills = sqliteTable(
  'skills',
  {
    id: text().$type<SkillId>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    name: text().notNull(),
    position: integer().notNull(),
  },
  (table) => [uniqueIndex('skills_name').on(table.teamId, table.name)],
);

export const people = sqliteTable(
  'people',
  {
    id: text().$type<PersonId>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    userId: text()
      .$type<UserId>()
      .unique()
      .references(() => users.id),
    name: text().notNull(),
    email: text().notNull(),
    staffNumber: text().notNull(),
    isActive: integer({ mode: 'boolean' }).notNull(),
    /** Order within the team's lists. */
    position: integer().notNull(),
  },
  (table) => [uniqueIndex('people_staff_number').on(table.teamId, table.staffNumber)],
);

export const personSkills = sqliteTable(
  'person_skills',
  {
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    skillId: text()
      .$type<SkillId>()
      .notNull()
      .references(() => skills.id),
    position: integer().notNull(),
    expiresOn: text().$type<LocalDate>(),
  },
  (table) => [primaryKey({ columns: [table.personId, table.skillId] })],
);

export const contracts = sqliteTable(
  'contracts',
  {
    id: text().primaryKey(),
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    startsOn: text().$type<LocalDate>().notNull(),
    endsOn: text().$type<LocalDate>(),
    weeklyMinutes: integer().notNull(),
    underMinutes: integer().notNull(),
    overtimeMinutes: integer().notNull(),
    payCentsPerHour: integer().notNull(),
    paidBy: text({ enum: ['contract', 'hours'] }).notNull(),
    mayWorkNights: integer({ mode: 'boolean' }).notNull(),
  },
  (table) => [
    uniqueIndex('contracts_start').on(table.personId, table.startsOn),
    check('contracts_dates', sql`${table.endsOn} is null or ${table.startsOn} <= ${table.endsOn}`),
    check('contracts_minutes', sql`${table.weeklyMinutes} between 0 and 10080`),
    check(
      'contracts_range',
      sql`${table.underMinutes} >= 0 and ${table.overtimeMinutes} >= 0 and ${table.payCentsPerHour} >= 0`,
    ),
    check('contracts_paid_by', sql`${table.paidBy} in ('contract', 'hours')`),
  ],
);

export const leave = sqliteTable(
  'leave',
  {
    id: text().$type<LeaveId>().primaryKey(),
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    startsOn: text().$type<LocalDate>().notNull(),
    endsOn: text().$type<LocalDate>().notNull(),
    creditMinutes: integer().notNull(),
  },
  (table) => [
    index('leave_person').on(table.personId, table.startsOn),
    check('leave_dates', sql`${table.startsOn} <= ${table.endsOn}`),
    check('leave_credit', sql`${table.creditMinutes} >= 0`),
  ],
);
