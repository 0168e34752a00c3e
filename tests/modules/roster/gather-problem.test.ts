import { expect, test } from 'vitest';
import { requireTeam } from '@/modules/access/server';
import { listShiftKinds } from '@/modules/coverage/server';
import { gatherProblem } from '@/modules/roster/gather-problem';
import { openPeriod } from '@/modules/roster/server';
import { getNewestVersion, markPublished, replaceShifts } from '@/modules/roster/store';
import type { KeptShift } from '@/modules/roster/stored';
import type { LocalDate } from '@/modules/units';
import { mustBeOk, type SmallTeam, smallStart, smallTeam } from '@/tests/support/small-team';

/** Opens a period and gives the first nurse the first kind on some dates of it. */
function plan(team: SmallTeam, startsOn: LocalDate, dates: readonly LocalDate[]) {
  const rosterId = mustBeOk(openPeriod(team.supervisor, team.teamId, { startsOn })).id;
  const [kind] = listShiftKinds(team.teamId);
  const [person] = team.people;
  if (!kind || !person) throw new Error('The small team has neither kinds nor people.');
  const version = getNewestVersion(rosterId);
  replaceShifts(
    version.id,
    dates.map((date): Omit<KeptShift, 'id'> => {
      const midnight = Date.parse(`${date}T00:00:00Z`);
      return {
        personId: person.id,
        date,
        shiftKindId: kind.id,
        skillId: team.nurse,
        startsAtUtc: midnight + kind.startMinute * 60_000,
        endsAtUtc: midnight + kind.endMinute * 60_000,
        paidMinutes: 480,
        isPinned: false,
      };
    }),
  );
  return version.id;
}

test('shifts around the period come into its problem once they are published', () => {
  const team = smallTeam();
  const info = mustBeOk(requireTeam(team.supervisor, 'rosters.read', team.teamId));
  const period = { id: null, startsOn: smallStart, endsOn: '2027-02-07' };
  const neighbours = () => {
    const [first] = gatherProblem(info, period).problem.people;
    const days = (shifts: readonly { dayIndex: number }[] = []) =>
      shifts.map(({ dayIndex }) => dayIndex);
    return { history: days(first?.history), following: days(first?.following) };
  };
  const before = plan(team, '2027-01-25', ['2027-01-25', '2027-01-31']);
  const after = plan(team, '2027-02-08', ['2027-02-08', '2027-02-14']);
  const later = plan(team, '2027-02-15', ['2027-02-15']);
  expect(neighbours()).toEqual({ history: [], following: [] });
  for (const id of [before, after, later]) {
    const { supervisor } = team;
    markPublished(id, {
      publishedAtUtc: 1,
      publishedBy: supervisor.userId,
      confirmBy: '2027-01-20',
      proof: null as never,
    });
  }
  // A week back and a week on: the Monday after the next period is too far away.
  expect(neighbours()).toEqual({ history: [-7, -1], following: [7, 13] });
});
