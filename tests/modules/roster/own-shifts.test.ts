import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { auditEvents, confirmations, floorNeeds, people } from '@/db/schema';
import {
  confirmRoster,
  publishRoster,
  readBoard,
  readOwnCalendar,
  readOwnShifts,
  readTeamCalendar,
  startRun,
  waitForRun,
} from '@/modules/roster/server';
import type { RosterId, VersionId } from '@/modules/units';
import {
  addNurse,
  codeOf,
  mustBeOk,
  planSmallPeriod,
  type SmallTeam,
  smallTeam,
} from '@/tests/support/small-team';
import { addSkill } from '@/tests/support/staff-list';

vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:05:00Z') }));
vi.mock('@/modules/mail/server', async (original) => ({
  ...(await original<typeof import('@/modules/mail/server')>()),
  nudgeSender: vi.fn(),
}));

const week = { from: '2027-02-01', to: '2027-02-07' };
let team: SmallTeam;
let ada: SmallTeam['people'][number];
beforeEach(() => {
  team = smallTeam(['Ada', 'Bo', 'Cy', 'Di', 'Eve', 'Flo']);
  db().update(floorNeeds).set({ people: 2 }).run();
  const [first] = team.people;
  if (!first) throw new Error('no people');
  ada = first;
});

const board = (rosterId: RosterId) => mustBeOk(readBoard(team.supervisor, rosterId));

async function publish(rosterId: RosterId): Promise<VersionId> {
  mustBeOk(await publishRoster(team.supervisor, rosterId, {}));
  return board(rosterId).version.id;
}

async function runAgain(rosterId: RosterId): Promise<VersionId> {
  await waitForRun(mustBeOk(startRun(team.supervisor, rosterId, { limitSeconds: 20 })).id);
  return board(rosterId).version.id;
}

test('staff see nothing of a draft', async () => {
  await planSmallPeriod(team);
  expect(mustBeOk(readOwnShifts(ada.actor)).periods).toEqual([]);
  expect(mustBeOk(readOwnCalendar(ada.actor, week))).toEqual([]);
});

test('once published, each sees their own shifts and who is on with them, and nothing else of others', async () => {
  const rosterId = await planSmallPeriod(team);
  const versionId = await publish(rosterId);
  const cells = board(rosterId).cells;
  for (const { id, name, actor } of team.people) {
    const own = mustBeOk(readOwnShifts(actor));
    const cellsOfPerson = cells.filter(({ personId }) => personId === id);
    expect(own).toMatchObject({
      personName: name,
      teamName: 'Ward',
      today: '2027-01-14',
      nowMinute: 545,
      weeklyMinutes: 2400,
    });
    expect(own.periods).toMatchObject([
      { versionId, versionNumber: 1, confirmBy: '2027-01-17', confirmedAtUtc: null },
    ]);
    const shifts = own.periods[0]?.shifts ?? [];
    expect(shifts.map(({ date }) => date)).toEqual(cellsOfPerson.map(({ date }) => date));
    for (const shift of shifts) {
      const cell = cellsOfPerson.find(({ date }) => date === shift.date);
      const others = cells.filter(
        (other) =>
          other.personId !== id && other.date === shift.date && other.kindId === cell?.kindId,
      );
      const names = others.map((other) => team.people.find((one) => one.id === other.personId));
      expect([...shift.withNames].sort()).toEqual(names.map((one) => one?.name).sort());
      expect(shift.endMinute - shift.startMinute).toBe(480);
      expect(shift.paidMinutes).toBe(480);
    }
    const others = team.people.filter((one) => one.id !== id);
    for (const other of others) expect(JSON.stringify(own)).not.toContain(other.id);
    const calendar = mustBeOk(readOwnCalendar(actor, week));
    expect(calendar.map(({ personId }) => personId)).toEqual(cellsOfPerson.map(() => id));
  }
});

test('hours, nights and weekends of a period are those of the proof', async () => {
  const rosterId = await planSmallPeriod(team);
  await publish(rosterId);
  const proven = board(rosterId).proof?.people.find(({ personId }) => personId === ada.id);
  const [period] = mustBeOk(readOwnShifts(ada.actor)).periods;
  expect(period).toMatchObject({
    contractMinutes: 2400,
    plannedMinutes: proven?.workedMinutes,
    nights: proven?.nights,
    weekends: proven?.weekends,
  });
});

test('a person confirms once; a second time changes nothing', async () => {
  const rosterId = await planSmallPeriod(team);
  const versionId = await publish(rosterId);
  const [period] = mustBeOk(confirmRoster(ada.actor, { versionId })).periods;
  expect(period?.confirmedAtUtc).toBe(Date.parse('2027-01-14T09:05:00Z'));
  mustBeOk(confirmRoster(ada.actor, { versionId }));
  expect(db().select().from(confirmations).all()).toEqual([
    { versionId, personId: ada.id, confirmedAtUtc: period?.confirmedAtUtc },
  ]);
  const audit = db().select().from(auditEvents).all();
  expect(audit.filter(({ action }) => action === 'roster.confirm')).toHaveLength(1);
  const confirmed = board(rosterId).people.filter((person) => person.confirmedAtUtc !== null);
  expect(confirmed.map(({ id }) => id)).toEqual([ada.id]);
});

test('only the newest published version is confirmed, and only by its own people', async () => {
  const rosterId = await planSmallPeriod(team);
  const draftId = board(rosterId).version.id;
  const confirm = (versionId: VersionId, actor = ada.actor) =>
    codeOf(confirmRoster(actor, { versionId }));
  expect(confirm(draftId)).toBe('not-found');
  const first = await publish(rosterId);
  const secondDraft = await runAgain(rosterId);
  expect(confirm(secondDraft)).toBe('not-found');
  const second = await publish(rosterId);
  expect(confirm(first)).toBe('conflict');
  expect(confirm(second)).toBe('ok');
  expect(confirm('ver_none')).toBe('not-found');
  expect(confirm(second, team.supervisor)).toBe('not-found');
  const { organisationId, otherTeamId } = team;
  const skill = addSkill(otherTeamId, 'Nurse');
  const outsider = addNurse(organisationId, otherTeamId, skill, 'Oz', 0);
  expect(confirm(second, outsider.actor)).toBe('not-found');
  const newcomer = addNurse(organisationId, team.teamId, team.nurse, 'New', 9);
  expect(confirm(second, newcomer.actor)).toBe('conflict');
});

test('an account that is nobody in a staff list is told so', () => {
  expect(codeOf(readOwnShifts(team.owner))).toBe('not-found');
  expect(codeOf(readOwnCalendar(team.hr, week))).toBe('not-found');
  db().update(people).set({ isActive: false }).run();
  expect(codeOf(readOwnShifts(ada.actor))).toBe('not-found');
});

test('the role decides, not the place in the staff list', () => {
  const asSupervisor = { ...ada.actor, memberships: team.supervisor.memberships };
  expect(codeOf(readOwnShifts(asSupervisor))).toBe('not-allowed');
});

test('the calendar of the team shows drafts, marked, to those who read rosters', async () => {
  const rosterId = await planSmallPeriod(team);
  const entries = () => mustBeOk(readTeamCalendar(team.hr, team.teamId, week));
  expect(entries()).toHaveLength(28);
  expect(entries().every(({ isPublished }) => !isPublished)).toBe(true);
  await publish(rosterId);
  expect(entries().every(({ isPublished }) => isPublished)).toBe(true);
  const oneDay = { from: week.to, to: week.to };
  expect(mustBeOk(readTeamCalendar(team.hr, team.teamId, oneDay))).toHaveLength(4);
  expect(codeOf(readTeamCalendar(ada.actor, team.teamId, week))).toBe('not-allowed');
  expect(codeOf(readTeamCalendar(team.otherSupervisor, team.teamId, week))).toBe('not-found');
  expect(codeOf(readTeamCalendar(team.stranger, team.teamId, week))).toBe('not-found');
});

test('a person who also plans the team sees drafts in their own calendar, marked', async () => {
  await planSmallPeriod(team);
  const { memberships } = team.supervisor;
  const both = { ...ada.actor, memberships: [...ada.actor.memberships, ...memberships] };
  const entries = mustBeOk(readOwnCalendar(both, week));
  expect(entries.length).toBeGreaterThan(0);
  for (const { isPublished, personId } of entries) {
    expect([isPublished, personId]).toEqual([false, ada.id]);
  }
});
