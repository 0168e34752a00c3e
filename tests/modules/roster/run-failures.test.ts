import { eq } from 'drizzle-orm';
import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { assignments, runs } from '@/db/schema';
import {
  publishRoster,
  readBoard,
  readRun,
  recoverInterruptedRuns,
  startRun,
  stopRun,
  waitForRun,
} from '@/modules/roster/server';
import type { RosterOutcome } from '@/modules/solver';
import type { RosterId, RunId } from '@/modules/units';
import {
  codeOf,
  mustBeOk,
  openSmallPeriod,
  type SmallTeam,
  shiftMinutes,
  smallTeam,
} from '@/tests/support/small-team';
import { onlyMonday, optimal, solved, solver } from '@/tests/support/stand-in-solver';

vi.mock('@/modules/solver/server', async (original) => ({
  ...(await original<typeof import('@/modules/solver/server')>()),
  ...(await import('@/tests/support/stand-in-solver')).standIns,
}));
vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:00:00Z') }));

let team: SmallTeam;
let rosterId: RosterId;
beforeEach(async () => {
  team = smallTeam();
  rosterId = openSmallPeriod(team);
  solver.solve = async (problem) => optimal(problem, onlyMonday(problem));
  solver.knots = async () => ({ kind: 'ended', wasStopped: false });
  await run();
});

async function run(): Promise<RunId> {
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, { limitSeconds: 5 }));
  await waitForRun(id);
  return id;
}

const viewOf = (id: RunId) => mustBeOk(readRun(team.supervisor, id));
const board = () => mustBeOk(readBoard(team.supervisor, rosterId));
const draft = () => db().select().from(assignments).all();

/** Runs and expects a failure with a sentence, and the draft as it was before. */
async function expectFailure(sentence: string | RegExp): Promise<RunId> {
  const before = draft();
  const id = await run();
  expect(viewOf(id)).toMatchObject({ state: 'failed', failure: expect.stringMatching(sentence) });
  expect(draft()).toEqual(before);
  return id;
}

test('a solver that breaks off fails the run and leaves the draft untouched', async () => {
  solver.solve = () => Promise.reject(new Error('worker died'));
  await expectFailure(/^The computation broke off\. The draft is unchanged; run again\.$/);
});

test('a solver that reports a failure fails the run with its message', async () => {
  solver.solve = async () => ({ kind: 'failed', message: 'Out of memory.' });
  await expectFailure('Out of memory.');
});

test('people whose own rules clash are named', async () => {
  const sentence = 'Ada cannot reach 40 h within the days that leave gives.';
  solver.solve = async () => ({ kind: 'impossible', clashes: [{ personId: 'per_1', sentence }] });
  await expectFailure(sentence);
});

test('a roster that breaks a rule is refused loudly and kept out of the draft', async () => {
  solver.solve = async (problem) => {
    const [first] = onlyMonday(problem);
    if (!first) throw new Error('no shift');
    return optimal(problem, [first, { ...first, shiftIndex: 1 }]);
  };
  const id = await expectFailure(/^The independent re-check refused the roster: .*Ada.*Mon 1 Feb/);
  expect(viewOf(id).proof?.breaches).not.toEqual([]);
  expect(viewOf(id)).toMatchObject({ bestCostCents: null, shortageMinutes: null });
});

test.each([
  ['cost', { costCents: 16_001 }, 'The solver counts 16001 minor units of cost'],
  ['shortage', { shortageMinutes: 0 }, 'The solver counts 0 missing minutes, the re-check 6240'],
  ['bound', { boundCents: 16_001 }, "The solver's bound of 16001 lies above the cost of 16000"],
])('a %s that the re-check does not confirm is refused loudly', async (_, claim, sentence) => {
  solver.solve = async (problem) => optimal(problem, onlyMonday(problem), claim);
  await expectFailure(sentence);
});

test('stopping keeps the best roster, re-checked, in the draft', async () => {
  solver.solve = (problem, { stop }) =>
    new Promise((resolve) => {
      const roster = onlyMonday(problem, 2);
      const found: RosterOutcome = { kind: 'stopped', best: solved(problem, roster) };
      stop.addEventListener('abort', () => resolve(found));
    });
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, {}));
  expect(mustBeOk(await stopRun(team.supervisor, id))).toMatchObject({
    state: 'stopped',
    isProvenOptimal: false,
    shortageMinutes: 13 * shiftMinutes,
  });
  expect(board().cells.map(({ personId }) => personId)).toEqual([team.people[2]?.id]);
  expect(codeOf(await stopRun(team.supervisor, id))).toBe('conflict');
});

test('stopping before a first roster says so and leaves the draft', async () => {
  solver.solve = (_, { stop }) =>
    new Promise((resolve) => {
      stop.addEventListener('abort', () => resolve({ kind: 'stopped', best: null }));
    });
  const before = draft();
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, {}));
  const stopped = mustBeOk(await stopRun(team.supervisor, id));
  expect(stopped).toMatchObject({
    state: 'stopped',
    failure: 'Stopped before a first roster was found. The draft is unchanged.',
  });
  expect(draft()).toEqual(before);
});

test('a shift pinned while the run is on is never lost: the run is not taken over', async () => {
  solver.solve = async (problem) => {
    db().update(assignments).set({ isPinned: true }).run();
    return optimal(problem, onlyMonday(problem, 1));
  };
  const id = mustBeOk(startRun(team.supervisor, rosterId, {})).id;
  await waitForRun(id);
  expect(viewOf(id)).toMatchObject({
    state: 'failed',
    failure:
      'Ada was pinned to Early on Mon 1 Feb while the run was on. The draft is unchanged; run again.',
  });
  expect(draft()).toMatchObject([{ personId: team.people[0]?.id, isPinned: true }]);
});

test('a roster published while a run is on gets the result as a new draft', async () => {
  let finish = () => {};
  solver.solve = (problem) =>
    new Promise((resolve) => {
      finish = () => resolve(optimal(problem, onlyMonday(problem, 1)));
    });
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, {}));
  mustBeOk(await publishRoster(team.supervisor, rosterId, { acceptShortage: true }));
  finish();
  await waitForRun(id);
  expect(board().version).toMatchObject({ number: 2, publishedAtUtc: null });
  expect(board().cells).toMatchObject([{ personId: team.people[1]?.id }]);
  expect(draft()).toHaveLength(2);
});

/** What a new process finds: no memory of the runs of the old one. */
const forgetRuns = () =>
  (globalThis as { floorwrightRuns?: Map<string, unknown> }).floorwrightRuns?.clear();

test('after a crash a run is marked as interrupted, with its best roster re-checked', async () => {
  solver.solve = (problem, { onRoster }) => {
    onRoster(onlyMonday(problem, 1));
    return new Promise(() => {});
  };
  const before = draft();
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, {}));
  expect(recoverInterruptedRuns()).toBe(0);
  forgetRuns();
  expect(recoverInterruptedRuns()).toBe(1);
  expect(viewOf(id)).toMatchObject({
    state: 'interrupted',
    shortageMinutes: 13 * shiftMinutes,
    failure: expect.stringContaining('The best roster found until then is shown with this run.'),
  });
  expect(db().select().from(runs).where(eq(runs.id, id)).get()?.roster).toHaveLength(1);
  expect(draft()).toEqual(before);
  expect(recoverInterruptedRuns()).toBe(0);
  solver.solve = async (problem) => optimal(problem, onlyMonday(problem));
  expect(viewOf(await run()).state).toBe('done');
});

test('a run that no process computes any more can be stopped all the same', async () => {
  solver.solve = () => new Promise(() => {});
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, {}));
  forgetRuns();
  expect(mustBeOk(await stopRun(team.supervisor, id)).state).toBe('interrupted');
});
