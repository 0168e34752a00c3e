import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { holidays } from '@/db/schema';
import { openPeriod, readCalendarFrame } from '@/modules/roster/server';
import {
  codeOf,
  mustBeOk,
  type SmallTeam,
  smallStart,
  smallTeam,
} from '@/tests/support/small-team';

vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:05:00Z') }));

let team: SmallTeam;
beforeEach(() => {
  team = smallTeam();
});

test('a team without periods has its clock and nothing around it', () => {
  expect(mustBeOk(readCalendarFrame(team.supervisor, team.teamId))).toEqual({
    zone: 'Europe/Dublin',
    dayStartsAtMinute: 420,
    today: '2027-01-14',
    nowMinute: 545,
    periods: [],
    holidays: [],
  });
});

test('periods say whether they are published, holidays in them are named', () => {
  db()
    .insert(holidays)
    .values({ teamId: team.teamId, date: '2027-02-03', name: 'Lantern Day' })
    .run();
  mustBeOk(openPeriod(team.supervisor, team.teamId, { startsOn: smallStart }));
  expect(mustBeOk(readCalendarFrame(team.hr, team.teamId))).toMatchObject({
    periods: [{ startsOn: '2027-02-01', endsOn: '2027-02-07', isPublished: false }],
    holidays: [{ date: '2027-02-03', name: 'Lantern Day' }],
  });
});

test('staff may not read the calendar of the team, strangers do not learn that it exists', () => {
  const [nurse] = team.people;
  if (!nurse) throw new Error('The small team has nobody');
  expect(codeOf(readCalendarFrame(nurse.actor, team.teamId))).toBe('not-allowed');
  expect(codeOf(readCalendarFrame(team.stranger, team.teamId))).toBe('not-found');
});
