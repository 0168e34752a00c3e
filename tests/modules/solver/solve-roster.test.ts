import { afterAll, expect, it } from 'vitest';
import { proveRoster } from '@/modules/proof';
import type { RosterProgress } from '@/modules/solver';
import { solverPool } from '@/modules/solver/pool';
import { closeSolver, solveRoster } from '@/modules/solver/server';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildFloor, buildProblem } from '@/tests/support/problem-builder';

afterAll(closeSolver);

/** Two nurses and a week of Earlies, which each of them may work four times. */
const small = buildProblem({
  people: [
    { contractMinutes: 1920, maximumMinutes: 1920 },
    { contractMinutes: 1920, maximumMinutes: 1920 },
  ],
  floors: Array.from({ length: 7 }, (_, day) =>
    buildFloor({ startMinute: day * 1440 + 420, endMinute: day * 1440 + 900 }),
  ),
});

it('solves in a thread and reports rosters and progress on the way', async () => {
  const progress: RosterProgress[] = [];
  const rosters: number[] = [];
  const outcome = await solveRoster(small, {
    limitSeconds: 30,
    onProgress: (report) => progress.push(report),
    onRoster: (roster) => rosters.push(roster.length),
  });
  expect(outcome).toMatchObject({ kind: 'optimal', shortageMinutes: 0, costCents: 2 * 80_000 });
  expect(rosters.length).toBeGreaterThan(0);
  expect(progress.at(-1)).toMatchObject({
    stage: 2,
    shortageMinutes: 0,
    shortageBoundMinutes: 0,
    bestCostCents: 160_000,
    boundCents: 160_000,
  });
});

/** C1 of the check values: from 22:00 to 09:00 it is 10 h on the spring night, to 08:00 11 h on the autumn night. */
it.each([
  ['2026-03-28', 540, 300],
  ['2026-03-28', 600, 0],
  ['2026-10-24', 480, 0],
])(
  'keeps the rest across the clock change after %s, next start at minute %d',
  async (startsOn, start, missing) => {
    const kinds = [
      { id: 'Late', startMinute: 1020, endMinute: 1320 },
      { id: 'Morning', startMinute: start, endMinute: start + 400 },
    ];
    const sketch = { zone: 'Europe/Berlin', startsOn, dayCount: 2, kinds };
    // The Late of Saturday and the Morning of Sunday: with too little rest the shorter Late stays short.
    const floors = buildProblem(sketch)
      .shifts.filter(({ index }) => index === 0 || index === 3)
      .map(({ startMinute, endMinute }) => ({ startMinute, endMinute }));
    const outcome = await solveRoster(buildProblem({ ...sketch, floors }), { limitSeconds: 30 });
    expect(outcome).toMatchObject({ kind: 'optimal', shortageMinutes: missing });
  },
);

it('holds every floor of a hospital of 24 people within one percent of the least cost', async () => {
  const problem = demoSizedProblem();
  const outcome = await solveRoster(problem, { limitSeconds: 280, targetGap: 0.01 });
  if (outcome.kind !== 'optimal' && outcome.kind !== 'good-enough') throw new Error(outcome.kind);
  const { roster, costCents, gap } = outcome;
  expect(gap).toBeLessThanOrEqual(0.01);
  expect(proveRoster(problem, roster)).toMatchObject({
    breaches: [],
    shortageMinutes: 0,
    costCents,
  });
}, 300_000);

it('keeps the best roster, lawful and with honest figures, when it is stopped', async () => {
  const stop = new AbortController();
  const problem = demoSizedProblem();
  const outcome = await solveRoster(problem, {
    limitSeconds: 50,
    stop: stop.signal,
    onRoster: () => stop.abort(),
  });
  if (outcome.kind !== 'stopped' || !outcome.best) throw new Error(`ended as ${outcome.kind}`);
  const { roster, shortageMinutes, costCents, boundCents } = outcome.best;
  expect(proveRoster(problem, roster)).toMatchObject({ breaches: [], shortageMinutes, costCents });
  expect(boundCents).toBeLessThanOrEqual(costCents);
});

it('ends as failed when its thread dies, and the next run has a new one', async () => {
  const outcome = await solveRoster(demoSizedProblem(), {
    limitSeconds: 50,
    onRoster: async () => {
      for (const thread of (await solverPool()).threads) thread.terminate();
    },
  });
  expect(outcome).toMatchObject({ kind: 'failed', cause: expect.any(Error) });
  expect(await solveRoster(small, { limitSeconds: 30 })).toMatchObject({ kind: 'optimal' });
});

it('never waits for the solver on the event loop', async () => {
  let turns = 0;
  const beat = setInterval(() => {
    turns += 1;
  }, 5);
  await solveRoster(small, { limitSeconds: 30 });
  clearInterval(beat);
  expect(turns).toBeGreaterThan(0);
});
