import Papa from 'papaparse';
import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { auditEvents, outbox } from '@/db/schema';
import { exportHoursCsv, readHours, recordWorkedShifts } from '@/modules/hours/server';
import { confirmRoster, listRosters, publishRoster, readBoard } from '@/modules/roster/server';
import { type PersonId, toInstant } from '@/modules/units';
import {
  codeOf,
  mustBeOk,
  planSmallPeriod,
  type SmallTeam,
  shiftMinutes,
  smallTeam,
} from '@/tests/support/small-team';
import { addLeave } from '@/tests/support/staff-list';

const clock = vi.hoisted(() => ({ now: 0 }));
vi.mock('@/db/clock', () => ({ now: () => clock.now }));
vi.mock('@/modules/mail/server', async (original) => ({
  ...(await original<typeof import('@/modules/mail/server')>()),
  nudgeSender: vi.fn(),
}));

const week = { from: '2027-02-01', to: '2027-02-07' };
let team: SmallTeam;
beforeEach(() => {
  clock.now = Date.parse('2027-01-14T09:00:00Z');
  team = smallTeam(['Ada', 'Bo', '=1+1']);
});

const hours = (range = week) => mustBeOk(readHours(team.hr, team.teamId, range));

/** Work of a person on one day, in minutes of the team's wall clock. */
function work(personId: PersonId, date: string, start: number, end: number, reason = '') {
  const at = (minute: number) => toInstant(date, minute, 'Europe/Dublin');
  recordWorkedShifts([
    {
      personId,
      date,
      startsAtUtc: at(start),
      endsAtUtc: at(end),
      paidMinutes: end - start,
      recordedBy: team.hr.userId,
      reason,
    },
  ]);
}

test('from opened period to pay: run, publish, mail, confirm, hours, CSV', async () => {
  const rosterId = await planSmallPeriod(team);
  expect(hours().people.map(({ plannedMinutes }) => plannedMinutes)).toEqual([0, 0, 0]);
  mustBeOk(await publishRoster(team.supervisor, rosterId, {}));
  expect(db().select().from(outbox).all()).toHaveLength(3);
  const board = mustBeOk(readBoard(team.supervisor, rosterId));
  for (const { actor } of team.people) {
    mustBeOk(confirmRoster(actor, { versionId: board.version.id }));
  }
  expect(mustBeOk(listRosters(team.hr, team.teamId))).toMatchObject([{ confirmedCount: 3 }]);

  clock.now = Date.parse('2027-03-01T09:00:00Z');
  const [first] = board.cells;
  if (!first) throw new Error('nothing planned');
  const start = first.startMinute;
  work(first.personId, first.date, start, start + 390, 'Left early, "unwell"');

  const view = hours();
  expect(view).toMatchObject({
    teamName: 'Ward',
    today: '2027-03-01',
    periods: [{ startsOn: '2027-02-01', endsOn: '2027-02-07' }],
  });
  const planned = view.people.map(({ plannedMinutes }) => plannedMinutes);
  expect(planned.reduce((sum, minutes) => sum + minutes, 0)).toBe(14 * shiftMinutes);
  const person = view.people.find(({ personId }) => personId === first.personId);
  expect(person).toMatchObject({ workedMinutes: 390, differenceMinutes: -90 });

  const file = mustBeOk(exportHoursCsv(team.hr, team.teamId, week));
  expect(file.fileName).toBe('hours-Ward-2027-02-01-to-2027-02-07-open-as-of-2027-03-01.csv');
  const { data, errors } = Papa.parse<Record<string, string>>(file.text, { header: true });
  expect(errors).toEqual([]);
  expect(data).toHaveLength(14);
  expect(new Set(data.map(({ name }) => name))).toEqual(new Set(['Ada', 'Bo', "'=1+1"]));
  const sum = data.reduce((total, line) => total + Number(line['planned hours']), 0);
  expect(sum).toBe((14 * shiftMinutes) / 60);
  expect(data.filter(({ reason }) => reason !== '')).toMatchObject([
    {
      date: first.date,
      'planned hours': '8.00',
      'worked hours': '6.50',
      difference: '-1.50',
      reason: 'Left early, "unwell"',
    },
  ]);
  const audit = db().select().from(auditEvents).all();
  expect(audit.find(({ action }) => action === 'hours.export')).toMatchObject({
    userId: team.hr.userId,
    teamId: team.teamId,
    detail: week,
  });
});

test('weekend hours of the plan are those between Saturday 00:00 and Sunday 24:00', async () => {
  mustBeOk(await publishRoster(team.supervisor, await planSmallPeriod(team), {}));
  const weekend = hours().people.reduce((sum, person) => sum + person.weekendMinutes, 0);
  expect(weekend).toBe(4 * shiftMinutes);
  expect(
    hours({ from: '2027-02-06', to: '2027-02-06' }).people.flatMap(({ days }) => days),
  ).toHaveLength(2);
});

test('work without a plan is counted, on its own date', () => {
  const [ada] = team.people;
  if (!ada) throw new Error('no people');
  work(ada.id, '2027-02-03', 600, 720, 'Called in');
  work(ada.id, '2027-02-08', 600, 720, 'Next week');
  expect(hours().people[0]).toMatchObject({
    plannedMinutes: 0,
    workedMinutes: 120,
    differenceMinutes: 120,
    days: [{ date: '2027-02-03', shift: '', plannedMinutes: 0, reason: 'Called in' }],
  });
});

test('contract hours and leave are those of the range', () => {
  const [ada] = team.people;
  if (!ada) throw new Error('no people');
  addLeave(ada.id, '2027-02-06', '2027-02-09', 960);
  expect(hours().people[0]).toMatchObject({ contractMinutes: 2400, leaveMinutes: 480 });
  expect(hours({ from: '2027-02-01', to: '2027-02-14' }).people[0]).toMatchObject({
    contractMinutes: 4800,
    leaveMinutes: 960,
  });
});

test('hours are for HR and owners of the organisation only', () => {
  const ask = (actor = team.hr) => [
    codeOf(readHours(actor, team.teamId, week)),
    codeOf(exportHoursCsv(actor, team.teamId, week)),
  ];
  expect(ask(team.owner)).toEqual(['ok', 'ok']);
  expect(ask(team.supervisor)).toEqual(['not-allowed', 'not-allowed']);
  expect(ask(team.people[0]?.actor)).toEqual(['not-allowed', 'not-allowed']);
  expect(ask(team.otherSupervisor)).toEqual(['not-found', 'not-found']);
  expect(ask(team.stranger)).toEqual(['not-found', 'not-found']);
  expect(codeOf(readHours(team.hr, 'tea_none', week))).toBe('not-found');
});
