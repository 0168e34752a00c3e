import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { SizingAnswer, SizingProblem } from '../../modules/problem';
import type { SizingInput } from '../../modules/sizing';
import type { Id, TeamId, UserId } from '../../modules/units';
import { teams, users } from './access';

export const sizings = sqliteTable(
  'sizings',
  {
    id: text().$type<Id<'siz'>>().primaryKey(),
    teamId: text()
      .$type<TeamId>()
      .notNull()
      .references(() => teams.id),
    askedBy: text()
      .$type<UserId>()
      .notNull()
      .references(() => users.id),
    askedAtUtc: integer().notNull(),
    input: text({ mode: 'json' }).$type<SizingInput>().notNull(),
    problem: text({ mode: 'json' }).$type<SizingProblem>().notNull(),
    answer: text({ mode: 'json' }).$type<SizingAnswer>().notNull(),
  },
  (table) => [index('sizings_team').on(table.teamId, table.askedAtUtc)],
);
