import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import Database from 'better-sqlite3';
import { type BetterSQLite3Database, drizzle } from 'drizzle-orm/better-sqlite3';
import { env } from './env';
import * as schema from './schema';

export type Db = BetterSQLite3Database<typeof schema>;

/** Kept on globalThis: pages, routes and start-up are separate bundles of one process. */
const shared = globalThis as typeof globalThis & { floorwrightDb?: Db };

/** Opens a database file with foreign keys, write-ahead log and a wait of 5 s for a busy file. */
export function openDb(file: string): Db {
  mkdirSync(dirname(file), { recursive: true });
  const connection = new Database(file);
  connection.pragma('journal_mode = WAL');
  connection.pragma('foreign_keys = ON');
  connection.pragma('busy_timeout = 5000');
  return drizzle(connection, { schema, casing: 'snake_case' });
}

/** The one connection of this process. */
export function db(): Db {
  shared.floorwrightDb ??= openDb(env().DATABASE_FILE);
  return shared.floorwrightDb;
}

/** Puts another connection in place; tests give each file its own database. */
export function replaceDb(replacement: Db): void {
  shared.floorwrightDb = replacement;
}

/**
 * Runs everything inside in one transaction: all of it is stored or nothing. The work must be
 * synchronous; a store called inside it takes part, since there is one connection.
 */
export function inTransaction<T>(work: () => T): T {
  return db().transaction(work, { behavior: 'immediate' });
}
