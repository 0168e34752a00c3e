import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { outbox } from '@/db/schema';
import { type FakeSmtp, openFakeSmtp } from '@/modules/mail/fake-smtp';
import { replaceSmtpUrl } from '@/modules/mail/mail-server';
import { nudgeSender, queueMails, renderRosterMails, startSender } from '@/modules/mail/server';
import { freshDb } from '@/tests/support/fresh-db';
import { storedPublication } from './publication-samples';

const folder = mkdtempSync(join(tmpdir(), 'floorwright-mail-'));
let fake: FakeSmtp;

beforeAll(async () => {
  fake = await openFakeSmtp({ folder, port: 0 });
  replaceSmtpUrl(`smtp://127.0.0.1:${fake.port}`);
});
afterEach(() => {
  vi.useRealTimers();
});
afterAll(async () => {
  await fake.close();
  rmSync(folder, { recursive: true, force: true });
});

async function queueTwoMails() {
  freshDb();
  const { publication } = storedPublication();
  queueMails(await renderRosterMails(publication));
}
const states = () =>
  db()
    .select()
    .from(outbox)
    .all()
    .map(({ state }) => state);

test('a nudge sends right away', async () => {
  await queueTwoMails();
  nudgeSender();
  await vi.waitFor(() => expect(states()).toEqual(['sent', 'sent']), 10_000);
});

test('the sender starts once and looks into the outbox every few seconds', async () => {
  await queueTwoMails();
  vi.useFakeTimers({ toFake: ['setInterval', 'clearInterval'] });
  startSender();
  startSender();
  expect(vi.getTimerCount()).toBe(1);
  vi.advanceTimersByTime(4_999);
  expect(states()).toEqual(['waiting', 'waiting']);
  vi.advanceTimersByTime(1);
  await vi.waitFor(() => expect(states()).toEqual(['sent', 'sent']), 10_000);
});
