import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Id, PersonId, TeamId, VersionId } from '../../modules/units';
import { teams } from './access';
import { people } from './people';
import { rosterVersions } from './roster';

/** Mail to be sent, written in the same transaction as its cause. A sender delivers it. */
export const outbox = sqliteTable(
  'outbox',
  {
    id: text().$type<Id<'out'>>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    personId: text()
      .$type<PersonId>()
      .notNull()
      .references(() => people.id),
    versionId: text()
      .$type<VersionId>()
      .references(() => rosterVersions.id),
    recipient: text().notNull(),
    subject: text().notNull(),
    html: text().notNull(),
    plainText: text().notNull(),
    /** RFC 5545 file with this person's shifts; null when the mail has none. */
    calendar: text(),
    state: text({ enum: ['waiting', 'sent', 'failed'] }).notNull(),
    attempts: integer().notNull().default(0),
    /** Not tried again before this instant. */
    nextTryAtUtc: integer().notNull(),
    sentAtUtc: integer(),
    lastError: text(),
  },
  (table) => [
    index('outbox_waiting').on(table.state, table.nextTryAtUtc),
    /** Nobody is told of one version twice. */
    uniqueIndex('outbox_once').on(table.versionId, table.personId),
    check('outbox_state', sql`${table.state} in ('waiting', 'sent', 'failed')`),
    check('outbox_sent', sql`(${table.state} = 'sent') = (${table.sentAtUtc} is not null)`),
  ],
);
