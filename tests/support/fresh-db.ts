import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll } from 'vitest';
import { type Db, openDb, replaceDb } from '@/db/client';
import { migrateDb } from '@/db/migrate';

const folders: string[] = [];

/** A new migrated SQLite file, put in place as the process's database; removed after the test file. */
export function freshDb(): Db {
  const folder = mkdtempSync(join(tmpdir(), 'floorwright-test-'));
  folders.push(folder);
  const database = openDb(join(folder, 'test.db'));
  migrateDb(database);
  replaceDb(database);
  return database;
}

afterAll(() => {
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
});
