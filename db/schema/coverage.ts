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
import type { FloorId, LocalDate, ShiftKindId, SkillId, TeamId } from '../../modules/units';
import { teams } from './access';
import { skills } from './people';

export const shiftKinds = sqliteTable(
  'shift_kinds',
  {
    id: text().$type<ShiftKindId>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    name: text().notNull(),
    letter: text().notNull(),
    startMinute: integer().notNull(),
    endMinute: integer().notNull(),
    unpaidBreakMinutes: integer().notNull(),
    isNight: integer({ mode: 'boolean' }).notNull(),
    isRetired: integer({ mode: 'boolean' }).notNull().default(false),
  },
  (table) => [
    /** A name or letter is free again once its kind is retired. */
    uniqueIndex('shift_kinds_name').on(table.teamId, table.name).where(sql`${table.isRetired} = 0`),
    uniqueIndex('shift_kinds_letter')
      .on(table.teamId, table.letter)
      .where(sql`${table.isRetired} = 0`),
    check(
      'shift_kinds_window',
      sql`${table.startMinute} between 0 and 1439 and ${table.endMinute} > ${table.startMinute} and ${table.endMinute} - ${table.startMinute} <= 1440`,
    ),
    check(
      'shift_kinds_break',
      sql`${table.unpaidBreakMinutes} >= 0 and ${table.unpaidBreakMinutes} < ${table.endMinute} - ${table.startMinute}`,
    ),
  ],
);

/** Skills that may be posted on a kind; no row means all. */
export const shiftKindSkills = sqliteTable(
  'shift_kind_skills',
  {
    shiftKindId: text()
      .$type<ShiftKindId>()
      .notNull()
      .references(() => shiftKinds.id),
    skillId: text()
      .$type<SkillId>()
      .notNull()
      .references(() => skills.id),
  },
  (table) => [primaryKey({ columns: [table.shiftKindId, table.skillId] })],
);

export const floors = sqliteTable(
  'floors',
  {
    id: text().$type<FloorId>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    skillId: text()
      .$type<SkillId>()
      .references(() => skills.id),
    startMinute: integer().notNull(),
    endMinute: integer().notNull(),
    counting: text({ enum: ['seated', 'shared'] }).notNull(),
    /** null: firm; otherwise wished at this price for one missing person-hour. */
    priceCentsPerHour: integer(),
    effectiveFrom: text().$type<LocalDate>().notNull(),
    effectiveTo: text().$type<LocalDate>(),
  },
  (table) => [
    index('floors_team').on(table.teamId),
    check(
      'floors_window',
      sql`${table.startMinute} between 0 and 1439 and ${table.endMinute} > ${table.startMinute} and ${table.endMinute} - ${table.startMinute} <= 1440`,
    ),
    check('floors_counting', sql`${table.counting} in ('seated', 'shared')`),
    check(
      'floors_price',
      sql`${table.priceCentsPerHour} is null or ${table.priceCentsPerHour} >= 0`,
    ),
    check(
      'floors_effective',
      sql`${table.effectiveTo} is null or ${table.effectiveFrom} <= ${table.effectiveTo}`,
    ),
  ],
);

/** The weekly pattern: Monday 0 to Sunday 6, 7 for public holidays. */
export const floorNeeds = sqliteTable(
  'floor_needs',
  {
    floorId: text()
      .$type<FloorId>()
      .notNull()
      .references(() => floors.id, { onDelete: 'cascade' }),
    day: integer().notNull(),
    people: integer().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.floorId, table.day] }),
    check('floor_needs_day', sql`${table.day} between 0 and 7`),
    check('floor_needs_people', sql`${table.people} between 0 and 999`),
  ],
);

/** Dates on which a floor differs from its pattern. */
export const floorDates = sqliteTable(
  'floor_dates',
  {
    floorId: text()
      .$type<FloorId>()
      .notNull()
      .references(() => floors.id, { onDelete: 'cascade' }),
    date: text().$type<LocalDate>().notNull(),
    people: integer().notNull(),
    reason: text().notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.floorId, table.date] }),
    check('floor_dates_people', sql`${table.people} between 0 and 999`),
  ],
);

export const holidays = sqliteTable(
  'holidays',
  {
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    date: text().$type<LocalDate>().notNull(),
    name: text().notNull(),
  },
  (table) => [primaryKey({ columns: [table.teamId, table.date] })],
);
