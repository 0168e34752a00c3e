import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { type Db, db } from './client';

/** Brings the database to the newest schema; does nothing when it is there. */
export function migrateDb(target: Db = db()): void {
  migrate(target, { migrationsFolder: 'drizzle' });
}
