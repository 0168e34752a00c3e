import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, beforeEach, expect, test, vi } from 'vitest';
import { env } from '@/db/env';
import {
  deliverWaiting,
  listMails,
  queueMails,
  readMail,
  renderRosterMails,
  startFakeSmtp,
} from '@/modules/mail/server';
import { freshDb } from '@/tests/support/fresh-db';
import { addActor, addOrganisation, addTeam } from '@/tests/support/organisation';
import { storedPublication } from './publication-samples';

const folder = mkdtempSync(join(tmpdir(), 'floorwright-mail-'));

beforeAll(() => {
  vi.stubEnv('MAIL_FOLDER', folder);
  vi.stubEnv('SMTP_URL', '');
  vi.stubEnv('DEMO', 'on');
  expect(env().MAIL_FOLDER).toBe(folder);
});
beforeEach(() => {
  freshDb();
});
afterAll(async () => {
  await (await startFakeSmtp()).close();
  rmSync(folder, { recursive: true, force: true });
});

async function publish() {
  const { publication, supervisor } = storedPublication();
  queueMails(await renderRosterMails(publication));
  await deliverWaiting();
  return { publication, supervisor };
}

test('a supervisor reads the mails of the own team, newest first, without a mail server set', async () => {
  const { supervisor } = await publish();
  const list = await listMails(supervisor);
  if (!list.ok) throw new Error(list.error.detail);
  expect(list.value.map(({ to }) => to).sort()).toEqual([
    'joerg@grueneau.example',
    'lucja@grueneau.example',
  ]);
  expect(list.value.map(({ name }) => name)).toEqual(
    list.value
      .map(({ name }) => name)
      .sort()
      .reverse(),
  );
  expect(list.value[0]?.attachmentNames).toEqual(['shifts-2027-03-01.ics']);
  const mail = await readMail(supervisor, list.value[0]?.name ?? '');
  if (!mail.ok) throw new Error(mail.error.detail);
  expect(mail.value.text).toContain('Hello ');
  expect(mail.value.html).toContain('<!doctype html>');
  expect(mail.value.attachments).toHaveLength(1);
  expect(mail.value.attachments[0]?.contentType).toBe('text/calendar');
  expect(mail.value.attachments[0]?.text).toMatch(/^BEGIN:VCALENDAR\r\n/);
  expect(mail.value.attachments[0]?.sizeBytes).toBe(
    Buffer.byteLength(mail.value.attachments[0]?.text ?? ''),
  );
});

test('the owner sees all teams, another supervisor and another organisation see nothing', async () => {
  const { publication, supervisor } = await publish();
  const { organisationId } = supervisor;
  const name = `${String(await newestNumber(supervisor)).padStart(6, '0')}.eml`;
  const owner = addActor(organisationId, 'owner');
  const colleague = addActor(organisationId, 'supervisor', addTeam(organisationId));
  const stranger = addActor(addOrganisation(), 'owner');
  expect((await readMail(owner, name)).ok).toBe(true);
  for (const actor of [colleague, stranger]) {
    expect(await listMails(actor)).toEqual({ ok: true, value: [] });
    expect(await readMail(actor, name)).toMatchObject({ ok: false, error: { code: 'not-found' } });
  }
  const staff = addActor(organisationId, 'staff', publication.teamId);
  expect(await listMails(staff)).toMatchObject({ ok: false, error: { code: 'not-allowed' } });
  expect(await readMail(staff, name)).toMatchObject({ ok: false, error: { code: 'not-allowed' } });
});

test.each(['../test.db', '000001.eml/../000001.eml', '999999.eml', '', '000001.EML'])(
  'the name %j finds nothing',
  async (name) => {
    const { supervisor } = await publish();
    expect(await readMail(supervisor, name)).toMatchObject({
      ok: false,
      error: { code: 'not-found' },
    });
  },
);

test('a mail that no outbox row accounts for is shown to nobody', async () => {
  const { supervisor } = storedPublication();
  writeFileSync(join(folder, '000900.eml'), 'To: a@b.example\r\nSubject: stray\r\n\r\nHello\r\n');
  const owner = addActor(supervisor.organisationId, 'owner');
  expect(await readMail(owner, '000900.eml')).toMatchObject({ ok: false });
  rmSync(join(folder, '000900.eml'));
});

async function newestNumber(actor: Parameters<typeof listMails>[0]): Promise<number> {
  const list = await listMails(actor);
  return list.ok ? Number.parseInt(list.value[0]?.name ?? '0', 10) : 0;
}
