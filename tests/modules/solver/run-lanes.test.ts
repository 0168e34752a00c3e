import { afterAll, describe, expect, it } from 'vitest';
import type { PlannedRoster, Problem } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import type { RosterOutcome, RosterProgress, SolvedRoster } from '@/modules/solver';
import { solverPool } from '@/modules/solver/pool';
import { closeSolver, type SolveRosterOptions, solveRoster } from '@/modules/solver/server';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';

/*
 * Whole runs in real threads, on a problem that none of them solves in the time it gets: a hospital of 24
 * people with wishes, and a price on how far apart people's Nights and weekends are.
 */

afterAll(closeSolver);

function hospital(): Problem {
  const demo = demoSizedProblem();
  const wishesOf = (person: number) =>
    [3, 10, 17, 24].map((day, index) => ({
      dayIndex: (day + person * 5) % demo.days.length,
      shiftIndex: null,
      wants: (person + index) % 3 === 0 ? ('on' as const) : ('off' as const),
      priceCents: 2000 + 300 * ((person * 7 + index) % 11),
    }));
  return {
    ...demo,
    people: demo.people.map((person, index) => ({ ...person, wishes: wishesOf(index) })),
    fairness: [
      { kind: 'spread', measure: 'nights', priceCents: 7000 },
      { kind: 'spread', measure: 'weekends', priceCents: 5000 },
    ],
  };
}

const problem = hospital();
const solve = (options: Partial<SolveRosterOptions>) =>
  solveRoster(problem, { limitSeconds: 20, ...options });

/** What a run ended with, which must be a lawful roster with its true figures. */
function foundIn(outcome: RosterOutcome): SolvedRoster {
  const found = outcome.kind === 'stopped' ? outcome.best : outcome;
  if (!found || !('roster' in found)) throw new Error(`ended as ${JSON.stringify(outcome)}`);
  const { roster, shortageMinutes, costCents } = found;
  expect(proveRoster(problem, roster)).toMatchObject({ breaches: [], shortageMinutes, costCents });
  expect(found.boundCents).toBeLessThanOrEqual(costCents);
  return found;
}

describe.each([1, 2] as const)('a run on %i threads with a budget of work', (lanes) => {
  it('ends with the same roster, cost and bound each time, and with another seed elsewhere', async () => {
    const budget = { workSeconds: 0.5, lanes };
    const first = await solve({ ...budget, seed: 1 });
    expect(await solve({ ...budget, seed: 1 })).toEqual(first);
    const other = await solve({ ...budget, seed: 2 });
    expect(foundIn(other).roster).not.toEqual(foundIn(first).roster);
  });
});

/** Ends some threads of the solver as soon as a run on both of them has told its first roster. */
async function solveWithout(isEnded: (thread: number) => boolean, limitSeconds: number) {
  // Starts them: a lane that still waits for its thread when the other one dies fails with it.
  await solve({ limitSeconds: 1, lanes: 2 });
  const pool = await solverPool();
  let told = 0;
  return solve({
    limitSeconds,
    lanes: 2,
    onRoster: () => {
      told += 1;
      if (told > 1) return;
      pool.threads.forEach((thread, index) => {
        if (isEnded(index)) void thread.terminate();
      });
    },
  });
}

describe('a run on two threads', () => {
  it('names the one person of a hospital who has no lawful line, before it searches', async () => {
    const people = problem.people.map((person, index) =>
      index === 7 ? { ...person, minimumMinutes: 60_000, maximumMinutes: 60_000 } : person,
    );
    const named = problem.people[7];
    const startedAt = performance.now();
    const outcome = await solveRoster({ ...problem, people }, { limitSeconds: 60, lanes: 2 });
    // A second is asked for; a busy machine needs more to start the threads.
    expect(performance.now() - startedAt).toBeLessThan(8000);
    expect(outcome).toEqual({
      kind: 'impossible',
      clashes: [{ personId: named?.id, sentence: expect.stringContaining(named?.name ?? '-') }],
    });
  });

  it.each([0, 1])('goes on when thread %i dies, and answers with a roster', async (dead) => {
    foundIn(await solveWithout((thread) => thread === dead, 4));
  });

  it('is a failure with its cause when both die', async () => {
    const outcome = await solveWithout(() => true, 10);
    expect(outcome).toMatchObject({ kind: 'failed', cause: expect.any(Error) });
  });

  it('is over within a moment of its limit, by its own reports and by the clock on the wall', async () => {
    const progress: RosterProgress[] = [];
    const told: PlannedRoster[] = [];
    const startedAt = performance.now();
    const outcome = await solve({
      limitSeconds: 3,
      onProgress: (one) => progress.push(one),
      onRoster: (roster) => told.push(roster),
    });
    // A second is asked for; starting a thread on a busy machine takes more than that by itself.
    expect(performance.now() - startedAt).toBeLessThan(3000 + 4000);
    expect(progress.at(-1)?.elapsedMs).toBeLessThan(3000 + 1500);
    expect(outcome.kind).toBe('out-of-time');
    expectBestOf(told, foundIn(outcome));
  });

  it.each([200, 900, 1500])(
    'is stopped within two seconds, %i ms after its first roster, and keeps the best one',
    async (wait) => {
      const stop = new AbortController();
      let stoppedAt = Number.POSITIVE_INFINITY;
      const told: PlannedRoster[] = [];
      const end = () => {
        stoppedAt = performance.now();
        stop.abort();
      };
      const outcome = await solve({
        stop: stop.signal,
        onRoster: (roster) => {
          if (told.length === 0) setTimeout(end, wait);
          told.push(roster);
        },
      });
      expect(performance.now() - stoppedAt).toBeLessThan(2500);
      expect(outcome.kind).toBe('stopped');
      expectBestOf(told, foundIn(outcome));
    },
  );
});

/** Whichever thread told of it: the last roster told is the best, and the run ends with none that is worse. */
function expectBestOf(told: readonly PlannedRoster[], found: SolvedRoster) {
  const worths = [...told, found.roster].map((roster) => {
    const { shortageMinutes, costCents } = proveRoster(problem, roster);
    return shortageMinutes * 1_000_000 + costCents;
  });
  expect(worths).toEqual([...worths].sort((one, other) => other - one));
}
