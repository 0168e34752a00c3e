import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import ICAL from 'ical.js';
import { type ParsedMail, simpleParser } from 'mailparser';
import { afterAll, afterEach, beforeEach, expect, test, vi } from 'vitest';
import { db, inTransaction } from '@/db/client';
import { outbox } from '@/db/schema';
import { shiftUid } from '@/modules/mail/calendar-file';
import { type FakeSmtp, openFakeSmtp } from '@/modules/mail/fake-smtp';
import { replaceSmtpUrl } from '@/modules/mail/mail-server';
import { deliverWaiting, queueMails, renderRosterMails } from '@/modules/mail/server';
import { freshDb } from '@/tests/support/fresh-db';
import { personShifts, storedPublication } from './publication-samples';

const clock = vi.hoisted(() => ({ now: Date.parse('2027-02-15T09:05:00Z') }));
vi.mock('@/db/clock', () => ({ now: () => clock.now }));

let folder: string;
let fake: FakeSmtp;
const folders: string[] = [];

beforeEach(async () => {
  freshDb();
  folder = mkdtempSync(join(tmpdir(), 'floorwright-mail-'));
  folders.push(folder);
  fake = await openFakeSmtp({ folder, port: 0 });
  replaceSmtpUrl(`smtp://127.0.0.1:${fake.port}`);
});
afterEach(() => fake.close());
afterAll(() => {
  for (const one of folders) rmSync(one, { recursive: true, force: true });
});

const rows = () => db().select().from(outbox).all();
const files = () => readdirSync(folder).sort();
const sourceOf = (name: string) => readFileSync(join(folder, name), 'utf8');
async function keptMails(): Promise<ParsedMail[]> {
  return Promise.all(files().map((name) => simpleParser(readFileSync(join(folder, name)))));
}
async function keptMailTo(recipient: string): Promise<ParsedMail> {
  const mails = await keptMails();
  const mail = mails.find(({ to }) => to && 'text' in to && to.text === recipient);
  if (!mail) throw new Error(`no mail to ${recipient}`);
  return mail;
}
async function publish(changes: Parameters<typeof storedPublication>[0] = {}) {
  const stored = storedPublication(changes);
  const mails = await renderRosterMails(stored.publication);
  inTransaction(() => queueMails(mails));
  return { ...stored, mails };
}

test('each person gets one mail with their own shifts, and it is noted as sent', async () => {
  const { mails } = await publish();
  expect(await deliverWaiting()).toEqual({ sent: 2, failed: 0 });
  expect(files()).toEqual(['000001.eml', '000002.eml']);
  expect(rows().map(({ state, sentAtUtc }) => ({ state, sentAtUtc }))).toEqual([
    { state: 'sent', sentAtUtc: clock.now },
    { state: 'sent', sentAtUtc: clock.now },
  ]);
  const mail = await keptMailTo('joerg@grueneau.example');
  expect(mail.subject).toBe(mails[0]?.subject);
  expect(mail.text?.trim()).toBe(mails[0]?.text.trim());
  expect(mail.text).toContain('Hello Jörg Müller-Ößner,');
  expect(mail.text).toContain('Pflegekraft für Kälber');
  expect(mail.html).toContain('Tierklinik Grünau, Süd');
  expect(mail.html).not.toContain('Łucja');
  expect((await keptMailTo('lucja@grueneau.example')).text).toContain('Hello Łucja Mirov,');
});

// RFC 5322: Date, From, Message-ID, lines of at most 998. RFC 6047, 2.4: the type of the calendar part.
test('the mail as sent has the headers and the calendar part that the standards ask for', async () => {
  await publish();
  await deliverWaiting();
  const source = sourceOf('000001.eml');
  const unfolded = source.replace(/\r\n[ \t]+/g, ' ');
  expect(unfolded).toMatch(/^Date: Mon, 15 Feb 2027 09:05:00 \+0000\r$/m);
  expect(unfolded).toMatch(/^From: Floorwright <rosters@floorwright\.example>\r$/m);
  expect(unfolded).toMatch(/^Message-ID: <out_[\w-]{20,}@floorwright\.example>\r$/m);
  expect(unfolded).toMatch(/^Auto-Submitted: auto-generated\r$/m);
  expect(unfolded).toMatch(
    /^Content-Type: text\/calendar; method=PUBLISH; charset=UTF-8; name=shifts-2027-03-01\.ics\r$/m,
  );
  expect(Math.max(...source.split('\r\n').map(({ length }) => length))).toBeLessThanOrEqual(998);
});

test('the attached calendar holds every shift at its instants, the night of the clock change too', async () => {
  const { publication, mails } = await publish();
  await deliverWaiting();
  const [part] = (await keptMailTo('joerg@grueneau.example')).attachments;
  expect(part?.filename).toBe('shifts-2027-03-01.ics');
  const file = part?.content.toString('utf8') ?? '';
  expect(file).toBe(mails[0]?.calendar);
  const calendar = new ICAL.Component(ICAL.parse(file));
  expect(calendar.getFirstPropertyValue('method')).toBe('PUBLISH');
  const events = calendar.getAllSubcomponents('vevent').map((one) => new ICAL.Event(one));
  const [person] = publication.people;
  expect(
    events.map(({ uid, sequence, startDate, endDate, summary }) => ({
      uid,
      sequence,
      summary,
      starts: startDate.toJSDate().getTime(),
      ends: endDate.toJSDate().getTime(),
    })),
  ).toEqual(
    person?.shifts.map((shift) => ({
      uid: shiftUid(publication.rosterId, person.personId, shift.date),
      sequence: 0,
      summary: `${shift.kindName}, ${shift.skillName}`,
      starts: shift.startsAtUtc,
      ends: shift.endsAtUtc,
    })),
  );
  // Europe/Berlin, 27 to 28 March 2027: 23:00 is 22:00Z, 07:00 is 05:00Z already: seven hours.
  expect(events.at(-1)?.startDate.toString()).toBe('2027-03-27T22:00:00Z');
  expect(events.at(-1)?.endDate.toString()).toBe('2027-03-28T05:00:00Z');
});

test('a person without shifts gets a mail without a calendar file', async () => {
  const { publication } = storedPublication();
  const [first] = publication.people;
  if (!first) throw new Error('no person');
  const idle = personShifts(first.personId, first.personName, first.recipient, []);
  queueMails(await renderRosterMails({ ...publication, people: [idle] }));
  await deliverWaiting();
  const mail = await keptMailTo('joerg@grueneau.example');
  expect(mail.attachments).toEqual([]);
  expect(mail.text).toContain('You have no shifts in it.');
});

test('nothing is queued when the transaction of its cause fails', async () => {
  const { publication } = storedPublication();
  const mails = await renderRosterMails(publication);
  expect(() =>
    inTransaction(() => {
      queueMails(mails);
      throw new Error('publishing failed');
    }),
  ).toThrow('publishing failed');
  expect(await deliverWaiting()).toEqual({ sent: 0, failed: 0 });
  expect(files()).toEqual([]);
});

test('nobody is told of one version twice', async () => {
  const { mails } = await publish();
  expect(() => inTransaction(() => queueMails(mails))).toThrow(/UNIQUE/);
  expect(rows()).toHaveLength(2);
});

test('two deliveries at once send each mail once', async () => {
  await publish();
  await Promise.all([deliverWaiting(), deliverWaiting()]);
  await deliverWaiting();
  expect(files()).toHaveLength(2);
});

test('with the mail server down mails wait, longer each time, and go out when it is back', async () => {
  await publish();
  replaceSmtpUrl(`smtp://127.0.0.1:${await closedPort()}`);
  expect(await deliverWaiting()).toEqual({ sent: 0, failed: 2 });
  for (const row of rows()) {
    expect(row).toMatchObject({ state: 'waiting', attempts: 1, nextTryAtUtc: clock.now + 60_000 });
    expect(row.lastError).toMatch(/ECONNREFUSED/);
  }
  expect(await deliverWaiting()).toEqual({ sent: 0, failed: 0 });
  clock.now += 60_000;
  expect(await deliverWaiting()).toEqual({ sent: 0, failed: 2 });
  expect(rows()[0]).toMatchObject({ attempts: 2, nextTryAtUtc: clock.now + 240_000 });
  replaceSmtpUrl(`smtp://127.0.0.1:${fake.port}`);
  clock.now += 240_000;
  expect(await deliverWaiting()).toEqual({ sent: 2, failed: 0 });
  expect(rows().every(({ state, lastError }) => state === 'sent' && lastError === null)).toBe(true);
});

test('after eight failed tries a mail is given up', async () => {
  await publish();
  replaceSmtpUrl(`smtp://127.0.0.1:${await closedPort()}`);
  for (let tries = 0; tries < 9; tries++) {
    await deliverWaiting();
    clock.now += 24 * 3_600_000;
  }
  expect(rows().map(({ state, attempts }) => ({ state, attempts }))).toEqual([
    { state: 'failed', attempts: 8 },
    { state: 'failed', attempts: 8 },
  ]);
});

test('a mail on which the server hangs up does not hold up the others', async () => {
  await publish();
  const picky = await hangingUpOnce(fake.port);
  replaceSmtpUrl(`smtp://127.0.0.1:${picky.port}`);
  expect(await deliverWaiting()).toEqual({ sent: 1, failed: 1 });
  picky.close();
  expect(
    rows()
      .map(({ state }) => state)
      .sort(),
  ).toEqual(['sent', 'waiting']);
});

test('an unusable address is kept as failed, never tried, and stops nobody else', async () => {
  const { publication } = storedPublication();
  const people = publication.people.map((person, index) =>
    index === 0 ? { ...person, recipient: 'joerg@x.example\r\nBcc: all@x.example' } : person,
  );
  queueMails(await renderRosterMails({ ...publication, people }));
  expect(await deliverWaiting()).toEqual({ sent: 1, failed: 0 });
  expect(files()).toHaveLength(1);
  const failed = rows().find(({ state }) => state === 'failed');
  expect(failed?.lastError).toContain('is not an address that mail can be sent to');
});

test('a name with a line break adds no header', async () => {
  const { publication } = storedPublication();
  const mails = await renderRosterMails(publication);
  queueMails(mails.map((mail) => ({ ...mail, subject: 'Your shifts\r\nBcc: all@x.example' })));
  await deliverWaiting();
  const [mail] = await keptMails();
  expect(mail?.subject).toBe('Your shifts Bcc: all@x.example');
  expect(mail?.headers.has('bcc')).toBe(false);
});

test('the fake goes on with its numbers after a restart', async () => {
  await publish();
  await deliverWaiting();
  await fake.close();
  fake = await openFakeSmtp({ folder, port: 0 });
  replaceSmtpUrl(`smtp://127.0.0.1:${fake.port}`);
  await publish();
  await deliverWaiting();
  expect(files()).toEqual(['000001.eml', '000002.eml', '000003.eml', '000004.eml']);
});

/** A port of this machine on which nobody listens. */
function closedPort(): Promise<number> {
  return new Promise((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}

/** Drops the first connection and passes later ones on to the fake. */
async function hangingUpOnce(port: number) {
  const { connect } = await import('node:net');
  let connections = 0;
  const server = createServer((socket) => {
    connections += 1;
    if (connections === 1) return socket.destroy();
    const onward = connect(port, '127.0.0.1');
    socket.pipe(onward).pipe(socket);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const address = server.address();
  const own = typeof address === 'object' && address ? address.port : 0;
  return { port: own, close: () => server.close() };
}
