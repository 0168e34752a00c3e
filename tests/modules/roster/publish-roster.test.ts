import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { assignments, auditEvents, outbox, rosterVersions, shiftKinds } from '@/db/schema';
import { nudgeSender } from '@/modules/mail/server';
import {
  confirmRoster,
  listRosters,
  publishRoster,
  readBoard,
  startRun,
  waitForRun,
} from '@/modules/roster/server';
import type { RosterId } from '@/modules/units';
import {
  codeOf,
  mustBeOk,
  openSmallPeriod,
  planSmallPeriod,
  type SmallTeam,
  shiftMinutes,
  smallTeam,
} from '@/tests/support/small-team';
import { addLeave } from '@/tests/support/staff-list';

const clock = vi.hoisted(() => ({ now: 0 }));
vi.mock('@/db/clock', () => ({ now: () => clock.now }));

/** The real mail module, whose sender sleeps and whose outbox can be made to break. */
const mail = vi.hoisted(() => ({ isBroken: false }));
vi.mock('@/modules/mail/server', async (original) => {
  const real = await original<typeof import('@/modules/mail/server')>();
  return {
    ...real,
    nudgeSender: vi.fn(),
    queueMails: (mails: Parameters<typeof real.queueMails>[0]) => {
      real.queueMails(mails);
      if (mail.isBroken) throw new Error('disk full');
    },
  };
});

let team: SmallTeam;
beforeEach(() => {
  clock.now = Date.parse('2027-01-14T09:00:00Z');
  mail.isBroken = false;
  vi.mocked(nudgeSender).mockClear();
  team = smallTeam();
});

const publish = (rosterId: RosterId, acceptShortage?: boolean, actor = team.supervisor) =>
  publishRoster(actor, rosterId, acceptShortage === undefined ? {} : { acceptShortage });
const mails = () => db().select().from(outbox).all();
const published = () =>
  db()
    .select()
    .from(rosterVersions)
    .all()
    .filter(({ publishedAtUtc }) => publishedAtUtc !== null);

async function runAgain(rosterId: RosterId): Promise<void> {
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, { limitSeconds: 20 }));
  await waitForRun(id);
}

test('publishing makes version 1 and puts one mail per person into the outbox', async () => {
  const rosterId = await planSmallPeriod(team);
  expect(mustBeOk(await publish(rosterId))).toMatchObject({
    state: 'published',
    versionNumber: 1,
    shiftCount: 14,
    shortageMinutes: 0,
    confirmedCount: 0,
    peopleCount: 3,
    warnings: [],
  });
  const { version } = mustBeOk(readBoard(team.hr, rosterId));
  expect(version).toMatchObject({
    number: 1,
    publishedAtUtc: clock.now,
    publishedByName: team.supervisor.name,
    confirmBy: '2027-01-17',
  });
  expect(mails().map(({ personId }) => personId)).toEqual(team.people.map(({ id }) => id));
  for (const { state, versionId, calendar } of mails()) {
    expect([state, versionId]).toEqual(['waiting', version.id]);
    expect(calendar).toContain('BEGIN:VEVENT');
  }
  const events = mails().map(({ calendar }) => calendar?.match(/BEGIN:VEVENT/g)?.length ?? 0);
  expect(events.reduce((sum, count) => sum + count, 0)).toBe(14);
  expect(nudgeSender).toHaveBeenCalledTimes(1);
  const audit = db().select().from(auditEvents).all();
  expect(audit.find(({ action }) => action === 'roster.publish')).toMatchObject({
    userId: team.supervisor.userId,
    detail: { version: 1, mails: 3, shortageMinutes: 0 },
  });
});

test('a draft without shifts, and a version without changes, are not published', async () => {
  const empty = openSmallPeriod(team);
  expect(await publish(empty)).toMatchObject({
    error: { code: 'conflict', detail: 'The draft has no shifts yet. Start a run first.' },
  });
  await runAgain(empty);
  mustBeOk(await publish(empty));
  expect(await publish(empty)).toMatchObject({ error: { code: 'conflict' } });
  expect(mails()).toHaveLength(3);
});

test('missing cover is listed and published only when that is accepted', async () => {
  team = smallTeam(['Ada', 'Bo']);
  const rosterId = await planSmallPeriod(team);
  const refused = await publish(rosterId);
  expect(codeOf(refused)).toBe('conflict');
  const fields = refused.ok ? [] : (refused.error.fields ?? []);
  expect(fields).toHaveLength(4);
  for (const { path, message } of fields) {
    expect(path).toBe('acceptShortage');
    expect(message).toMatch(/^\w{3} \d Feb \d\d:00-\d\d:00, Nurse: short 1$/);
  }
  expect([published(), mails()]).toEqual([[], []]);
  expect(codeOf(await publish(rosterId, false))).toBe('conflict');
  expect(mustBeOk(await publish(rosterId, true))).toMatchObject({
    state: 'published',
    shortageMinutes: 4 * shiftMinutes,
  });
});

test('rules are re-checked against the data of today: leave granted since is in the way', async () => {
  const rosterId = await planSmallPeriod(team);
  const [cell] = mustBeOk(readBoard(team.supervisor, rosterId)).cells;
  if (!cell) throw new Error('nothing planned');
  addLeave(cell.personId, cell.date, cell.date, 0);
  const refused = await publish(rosterId, true);
  expect(refused).toMatchObject({ error: { code: 'conflict', fields: [{ path: 'roster' }] } });
  expect(refused.ok ? '' : refused.error.fields?.[0]?.message).toMatch(
    /(Ada|Bo|Cy): (Early|Late) on .*Leave/,
  );
  expect([published(), mails()]).toEqual([[], []]);
});

test('a draft with a kind that was retired since is not published', async () => {
  const rosterId = await planSmallPeriod(team);
  db().update(shiftKinds).set({ isRetired: true }).run();
  const refused = await publish(rosterId, true);
  expect(codeOf(refused)).toBe('conflict');
  expect(refused.ok ? [] : refused.error.fields).toHaveLength(14);
});

test('when the outbox breaks, nothing of the publishing is stored', async () => {
  const rosterId = await planSmallPeriod(team);
  mail.isBroken = true;
  await expect(publish(rosterId)).rejects.toThrow('disk full');
  expect([published(), mails()]).toEqual([[], []]);
  expect(nudgeSender).not.toHaveBeenCalled();
  const audit = db().select().from(auditEvents).all();
  expect(audit.some(({ action }) => action === 'roster.publish')).toBe(false);
  mail.isBroken = false;
  mustBeOk(await publish(rosterId));
  expect(mails()).toHaveLength(3);
});

test('a draft that changes while its mails are written is not published unseen', async () => {
  const rosterId = await planSmallPeriod(team);
  const publishing = publish(rosterId);
  db().update(assignments).set({ isPinned: true }).run();
  expect(await publishing).toMatchObject({
    error: { code: 'conflict', detail: expect.stringContaining('changed while') },
  });
  expect([published(), mails()]).toEqual([[], []]);
});

test('short notice is published with a warning', async () => {
  const rosterId = await planSmallPeriod(team);
  clock.now = Date.parse('2027-01-31T09:00:00Z');
  const warning = 'People get 1 day of notice; this team promises 14 days.';
  expect(mustBeOk(readBoard(team.supervisor, rosterId)).noticeWarning).toBe(warning);
  expect(mustBeOk(await publish(rosterId)).warnings).toEqual([warning]);
  expect(mustBeOk(readBoard(team.supervisor, rosterId))).toMatchObject({
    noticeWarning: null,
    version: { confirmBy: '2027-01-31' },
  });
});

test('a second version tells everybody, those too who lost all their shifts, and asks anew', async () => {
  const rosterId = await planSmallPeriod(team);
  mustBeOk(await publish(rosterId));
  const first = mustBeOk(readBoard(team.supervisor, rosterId)).version;
  const [ada, , cy] = team.people;
  if (!ada || !cy) throw new Error('no people');
  mustBeOk(confirmRoster(ada.actor, { versionId: first.id }));
  addLeave(cy.id, '2027-02-01', '2027-02-07', 0);
  await runAgain(rosterId);
  expect(mustBeOk(readBoard(team.supervisor, rosterId)).version).toMatchObject({
    number: 2,
    publishedAtUtc: null,
  });
  expect(mustBeOk(listRosters(team.hr, team.teamId))).toMatchObject([
    { state: 'draft', versionNumber: 2, confirmedCount: 1, peopleCount: 3 },
  ]);
  mustBeOk(await publish(rosterId, true));
  const second = mustBeOk(readBoard(team.supervisor, rosterId)).version;
  const told = mails().filter(({ versionId }) => versionId === second.id);
  expect(told.map(({ personId }) => personId)).toEqual(team.people.map(({ id }) => id));
  const calendar = told.find(({ personId }) => personId === cy.id)?.calendar ?? '';
  expect(calendar).toContain('STATUS:CANCELLED');
  expect(calendar).not.toContain('STATUS:CONFIRMED');
  expect(mustBeOk(listRosters(team.hr, team.teamId))).toMatchObject([
    { state: 'published', versionNumber: 2, confirmedCount: 0, peopleCount: 2 },
  ]);
});

test('only those who publish for the team may publish', async () => {
  const rosterId = await planSmallPeriod(team);
  const staff = team.people[0]?.actor;
  expect(codeOf(await publish(rosterId, true, staff))).toBe('not-allowed');
  expect(codeOf(await publish(rosterId, true, team.hr))).toBe('not-allowed');
  expect(codeOf(await publish(rosterId, true, team.otherSupervisor))).toBe('not-found');
  expect(codeOf(await publish(rosterId, true, team.stranger))).toBe('not-found');
  expect(codeOf(await publish('ros_none', true))).toBe('not-found');
  expect([published(), mails()]).toEqual([[], []]);
});
