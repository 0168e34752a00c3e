import { sql } from 'drizzle-orm';
import { check, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { LocalDate, PersonId, UserId } from '../../modules/units';
import { users } from './access';
import { people } from './people';

/** Time really worked, one row a shift. What differs from the plan carries its reason. */
export const workedShifts = sqliteTable(
  'worked_shifts',
  {
    id: text().primaryKey(),
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    /** The local date on which the work started. */
    date: text().$type<LocalDate>().notNull(),
    startsAtUtc: integer().notNull(),
    endsAtUtc: integer().notNull(),
    paidMinutes: integer().notNull(),
    recordedBy: text()
      .$type<UserId>()
      .references(() => users.id),
    reason: text().notNull(),
  },
  (table) => [
    uniqueIndex('worked_shifts_start').on(table.personId, table.startsAtUtc),
    check('worked_shifts_times', sql`${table.endsAtUtc} >= ${table.startsAtUtc}`),
    check('worked_shifts_paid', sql`${table.paidMinutes} >= 0`),
  ],
);
