import { afterAll, expect, test, vi } from 'vitest';
import { readRun, startRun, waitForRun, workOutWays } from '@/modules/roster/server';
import { closeSolver } from '@/modules/solver/server';
import {
  codeOf,
  mustBeOk,
  openSmallPeriod,
  shiftMinutes,
  smallTeam,
} from '@/tests/support/small-team';

vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:00:00Z') }));
afterAll(closeSolver);

test('a team that is too small is told why, and what each way out would do', async () => {
  const team = smallTeam(['Ada', 'Bo']);
  const { id } = mustBeOk(startRun(team.supervisor, openSmallPeriod(team), { limitSeconds: 20 }));
  await waitForRun(id);
  const { knots } = mustBeOk(readRun(team.supervisor, id));
  // Two nurses of 40 h, at most five days each, for 14 shifts of 8 h.
  const [sum] = knots?.knots ?? [];
  expect(sum?.sentence).toBe(
    'In the week of 1 Feb the Nurse floors need 112 h; people who hold Nurse can give 80 h at most.',
  );
  const ask = (knot: number) =>
    workOutWays(team.supervisor, id, { knot }, new AbortController().signal);
  const ways = mustBeOk(await ask(0));
  expect(ways.length).toBeGreaterThan(0);
  const lower = ways.find(({ changes }) => changes[0]?.words.startsWith('One person fewer: Nurse'));
  // A shift less to fill is one missing less; the ten that two nurses can take stay ten.
  expect(lower?.effect?.shortageChangeMinutes).toEqual({
    least: -shiftMinutes,
    most: -shiftMinutes,
  });
  expect(lower?.changes[0]).toMatchObject({
    ask: 'Whoever answers for this floor',
    asksPerson: false,
  });
  expect(codeOf(await ask(9))).toBe('not-found');
  const hr = workOutWays(team.hr, id, { knot: 0 }, new AbortController().signal);
  expect(codeOf(await hr)).toBe('not-allowed');
});
