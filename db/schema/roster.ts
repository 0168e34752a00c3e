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
import type { PlannedRoster, Problem } from '../../modules/problem';
import type { Proof } from '../../modules/proof';
import type { KnotsAnswer } from '../../modules/solver';
import type {
  LocalDate,
  PersonId,
  RosterId,
  RunId,
  ShiftKindId,
  SkillId,
  TeamId,
  UserId,
  VersionId,
} from '../../modules/units';
import { teams, users } from './access';
import { shiftKinds } from './coverage';
import { people, skills } from './people';

/** The plan of one team for one period. A period is opened by making its roster. */
export const rosters = sqliteTable(
  'rosters',
  {
    id: text().$type<RosterId>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    startsOn: text().$type<LocalDate>().notNull(),
    endsOn: text().$type<LocalDate>().notNull(),
    closedAtUtc: integer(),
  },
  (table) => [
    uniqueIndex('rosters_start').on(table.teamId, table.startsOn),
    check('rosters_dates', sql`${table.startsOn} <= ${table.endsOn}`),
  ],
);

/** Numbered versions. The newest may be an unpublished draft; published ones never change. */
export const rosterVersions = sqliteTable(
  'roster_versions',
  {
    id: text().$type<VersionId>().primaryKey(),
    rosterId: text()
      .$type<RosterId>()
      .notNull()
      .references(() => rosters.id),
    number: integer().notNull(),
    /** null: still a draft. */
    publishedAtUtc: integer(),
    publishedBy: text()
      .$type<UserId>()
      .references(() => users.id),
    /** Last day on which people are asked to confirm. */
    confirmBy: text().$type<LocalDate>(),
    /** The run whose roster this is, and the proof that came with it. */
    runId: text().$type<RunId>(),
    proof: text({ mode: 'json' }).$type<Proof>(),
  },
  (table) => [
    uniqueIndex('roster_versions_number').on(table.rosterId, table.number),
    uniqueIndex('roster_versions_one_draft')
      .on(table.rosterId)
      .where(sql`${table.publishedAtUtc} is null`),
    check(
      'roster_versions_published',
      sql`(${table.publishedAtUtc} is null) = (${table.publishedBy} is null)`,
    ),
  ],
);

/** Who works when. Instants and paid minutes are kept, so that a later change of a kind alters no past. */
export const assignments = sqliteTable(
  'assignments',
  {
    id: text().primaryKey(),
    versionId: text()
      .$type<VersionId>()
      .notNull()
      .references(() => rosterVersions.id),
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    /** The local date on which the shift starts. */
    date: text().$type<LocalDate>().notNull(),
    shiftKindId: text()
      .$type<ShiftKindId>()
      .notNull()
      .references(() => shiftKinds.id),
    /** The post: the skill in which the person counts. */
    skillId: text()
      .$type<SkillId>()
      .notNull()
      .references(() => skills.id),
    startsAtUtc: integer().notNull(),
    endsAtUtc: integer().notNull(),
    paidMinutes: integer().notNull(),
    isPinned: integer({ mode: 'boolean' }).notNull().default(false),
  },
  (table) => [
    uniqueIndex('assignments_one_a_day').on(table.versionId, table.personId, table.date),
    index('assignments_person').on(table.personId, table.date),
    check('assignments_times', sql`${table.endsAtUtc} > ${table.startsAtUtc}`),
  ],
);

export const confirmations = sqliteTable(
  'confirmations',
  {
    versionId: text()
      .$type<VersionId>()
      .notNull()
      .references(() => rosterVersions.id),
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    confirmedAtUtc: integer().notNull(),
  },
  (table) => [primaryKey({ columns: [table.versionId, table.personId] })],
);

/** One computation of a roster. The row outlives a crash: an interrupted run says so. */
export const runs = sqliteTable(
  'runs',
  {
    id: text().$type<RunId>().primaryKey(),
    rosterId: text()
      .$type<RosterId>()
      .notNull()
      .references(() => rosters.id),
    number: integer().notNull(),
    state: text({ enum: ['running', 'done', 'stopped', 'failed', 'interrupted'] }).notNull(),
    limitSeconds: integer().notNull(),
    startedAtUtc: integer().notNull(),
    endedAtUtc: integer(),
    startedBy: text()
      .$type<UserId>()
      .notNull()
      .references(() => users.id),
    /** The whole input, so that any run can be repeated and checked. */
    problem: text({ mode: 'json' }).$type<Problem>().notNull(),
    /** The best roster found, null before the first. */
    roster: text({ mode: 'json' }).$type<PlannedRoster>(),
    proof: text({ mode: 'json' }).$type<Proof>(),
    /** Proven: no roster with the least shortage costs less. Whole minor units, rounded up. */
    boundCents: integer(),
    /** Proven: no roster is short of less than this. */
    shortageBoundMinutes: integer(),
    isProvenOptimal: integer({ mode: 'boolean' }).notNull().default(false),
    /** What went wrong, in one sentence. */
    failure: text(),
    /** Why the floors cannot all be held; null where they can, and where nobody looked. */
    knots: text({ mode: 'json' }).$type<KnotsAnswer>(),
  },
  (table) => [
    uniqueIndex('runs_number').on(table.rosterId, table.number),
    check(
      'runs_state',
      sql`${table.state} in ('running', 'done', 'stopped', 'failed', 'interrupted')`,
    ),
    check('runs_ended', sql`(${table.state} = 'running') = (${table.endedAtUtc} is null)`),
  ],
);

/** What a run reported while it ran, for the drawing and for a page that comes back later. */
export const runEvents = sqliteTable(
  'run_events',
  {
    runId: text()
      .$type<RunId>()
      .notNull()
      .references(() => runs.id),
    sequence: integer().notNull(),
    elapsedMs: integer().notNull(),
    stage: integer().notNull(),
    shortageMinutes: integer(),
    shortageBoundMinutes: integer(),
    bestCostCents: integer(),
    boundCents: integer(),
  },
  (table) => [primaryKey({ columns: [table.runId, table.sequence] })],
);
