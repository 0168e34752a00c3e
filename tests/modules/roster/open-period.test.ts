import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { auditEvents } from '@/db/schema';
import { listRosters, openPeriod, readBoard, suggestNextStart } from '@/modules/roster/server';
import {
  codeOf,
  mustBeOk,
  type SmallTeam,
  smallStart,
  smallTeam,
} from '@/tests/support/small-team';

vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:00:00Z') }));

let team: SmallTeam;
beforeEach(() => {
  team = smallTeam();
});

const open = (startsOn: string, actor = team.supervisor) =>
  openPeriod(actor, team.teamId, { startsOn });

test('a period lasts as long as the team says and begins with an empty draft of version 1', () => {
  const opened = mustBeOk(open(smallStart));
  expect(opened).toMatchObject({
    startsOn: '2027-02-01',
    endsOn: '2027-02-07',
    state: 'draft',
    versionNumber: 1,
    hasFloors: true,
    shiftCount: 0,
    shortageMinutes: null,
    confirmedCount: 0,
    peopleCount: 3,
  });
  expect(mustBeOk(listRosters(team.hr, team.teamId))).toEqual([opened]);
  const audit = db().select().from(auditEvents).all();
  expect(audit.filter(({ action }) => action === 'roster.open')).toHaveLength(1);
});

test.each(['2027-01-26', '2027-02-01', '2027-02-07'])(
  'a period that starts on %s would share days and is refused with the fix',
  (startsOn) => {
    mustBeOk(open(smallStart));
    const refused = open(startsOn);
    expect(refused).toMatchObject({
      ok: false,
      error: {
        code: 'conflict',
        detail:
          'The period Mon 1 Feb to Sun 7 Feb 2027 is open already and shares days with this one.',
        fields: [
          {
            path: 'startsOn',
            message: 'Start on Mon 8 Feb or later, or so early that it ends before.',
          },
        ],
      },
    });
    expect(mustBeOk(listRosters(team.hr, team.teamId))).toHaveLength(1);
  },
);

test('periods that touch are fine, and the next start follows the last period', () => {
  expect(mustBeOk(suggestNextStart(team.supervisor, team.teamId))).toBe('2027-01-18');
  mustBeOk(open(smallStart));
  mustBeOk(open('2027-02-08'));
  mustBeOk(open('2027-01-25'));
  expect(mustBeOk(suggestNextStart(team.supervisor, team.teamId))).toBe('2027-02-15');
});

test('a period before the floors take effect says that it has none', () => {
  expect(mustBeOk(open('2027-01-25')).hasFloors).toBe(false);
});

test('only those who plan the team open a period; others learn as little as they may', () => {
  expect(codeOf(open(smallStart, team.people[0]?.actor))).toBe('not-allowed');
  expect(codeOf(open(smallStart, team.hr))).toBe('not-allowed');
  expect(codeOf(open(smallStart, team.otherSupervisor))).toBe('not-found');
  expect(codeOf(open(smallStart, team.stranger))).toBe('not-found');
  expect(codeOf(openPeriod(team.owner, 'tea_none', { startsOn: smallStart }))).toBe('not-found');
  const rosterId = mustBeOk(open(smallStart)).id;
  expect(codeOf(readBoard(team.people[0]?.actor ?? team.hr, rosterId))).toBe('not-allowed');
  expect(codeOf(readBoard(team.otherSupervisor, rosterId))).toBe('not-found');
  expect(codeOf(readBoard(team.stranger, rosterId))).toBe('not-found');
  expect(codeOf(readBoard(team.supervisor, 'ros_none'))).toBe('not-found');
});
