import { now } from '@/db/clock';
import { loadDemo } from '@/db/demo';
import { env } from '@/db/env';
import { log } from '@/db/log';
import { migrateDb } from '@/db/migrate';
import { startFakeSmtp, startSender } from '@/modules/mail/server';
import { recoverInterruptedRuns } from '@/modules/roster/server';

/** Everything that must stand before the first request: schema, demo, mail, runs cut off by a crash. */
export async function startUp(): Promise<void> {
  migrateDb();
  if (env().DEMO === 'on') await loadDemo(now());
  recoverInterruptedRuns();
  if (!env().SMTP_URL) await startFakeSmtp();
  startSender();
  log().info({ database: env().DATABASE_FILE, mail: env().SMTP_URL ? 'SMTP' : 'fake' }, 'ready');
}
