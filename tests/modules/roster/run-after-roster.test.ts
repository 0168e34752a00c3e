import { afterAll, beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { assignments } from '@/db/schema';
import { readBoard, readRun, startRun, stopRun, waitForRun } from '@/modules/roster/server';
import { closeSolver } from '@/modules/solver/server';
import type { RosterId, RunId } from '@/modules/units';
import {
  codeOf,
  mustBeOk,
  openSmallPeriod,
  type SmallTeam,
  smallTeam,
} from '@/tests/support/small-team';
import { onlyMonday, optimal, solver } from '@/tests/support/stand-in-solver';

/* What a run does once it has a roster: it has the bound reckoned anew and looks for knots. */

vi.mock('@/modules/solver/server', async (original) => ({
  ...(await original<typeof import('@/modules/solver/server')>()),
  ...(await import('@/tests/support/stand-in-solver')).standIns,
}));
vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:00:00Z') }));

let team: SmallTeam;
let rosterId: RosterId;
beforeEach(() => {
  team = smallTeam();
  rosterId = openSmallPeriod(team);
  solver.solve = async (problem) => optimal(problem, onlyMonday(problem));
  solver.knots = async () => ({ kind: 'ended', wasStopped: false });
});
afterAll(closeSolver);

async function run(): Promise<RunId> {
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, { limitSeconds: 5 }));
  await waitForRun(id);
  return id;
}

const viewOf = (id: RunId) => mustBeOk(readRun(team.supervisor, id));

/** A record whose prices are all nothing: what everybody is paid whatever happens is the bound. */
const emptyRecord = {
  shortage: [],
  surplusCentsPerMinute: 0,
  slices: [],
  teamRules: [],
  spreads: [],
};

test('a bound that its record confirms is kept with the proof', async () => {
  const claim = { boundCents: 0, boundRecord: emptyRecord, recordedBoundCents: 0 };
  solver.solve = async (problem) => optimal(problem, onlyMonday(problem), claim);
  expect(viewOf(await run()).proof?.bound).toEqual({
    recheckedCents: 0,
    solverCents: 0,
    sentence:
      'No roster as well covered can cost less than €0.00: reckoned anew from the prices of the floors by separate code.',
  });
});

test.each([
  [
    'a record of another problem',
    { ...emptyRecord, shortage: [{ priority: 7, centsPerMinute: 1 }] },
    0,
    'The record of the bound prices firm floors of priority 7, which the problem does not have.',
  ],
  [
    'a bound that its record does not give',
    emptyRecord,
    16_000,
    'The solver reckons 16000 minor units from its record, the re-check 0;',
  ],
])('%s is refused loudly, with both kept', async (_, boundRecord, recordedBoundCents, finding) => {
  const claim = { boundRecord, recordedBoundCents };
  solver.solve = async (problem) => optimal(problem, onlyMonday(problem), claim);
  expect(viewOf(await run())).toMatchObject({
    state: 'failed',
    failure: expect.stringContaining(`The independent re-check refused the bound: ${finding}`),
    proof: {
      costCents: 16_000,
      bound: { solverCents: 16_000, sentence: expect.stringContaining(finding) },
    },
  });
  expect(db().select().from(assignments).all()).toEqual([]);
});

test('knots are looked for where the roster is short, once it stands in the draft', async () => {
  let asked: readonly number[] = [];
  const words = ['Nurse Early on Mon 1 Feb needs 1'];
  solver.knots = async (problem, { shortAtMinutes }) => {
    asked = shortAtMinutes;
    const board = mustBeOk(readBoard(team.supervisor, rosterId));
    expect([board.run?.state, board.cells.length]).toEqual(['done', 1]);
    const { floorId, dayIndex } = problem.floors[0] ?? { floorId: '', dayIndex: 0 };
    const members = [{ kind: 'floor' as const, floorId, dayIndex }];
    const knot = { members, words, isMinimal: true, sentence: null };
    return { kind: 'answered', answer: { knots: [knot], isComplete: true } };
  };
  const id = await run();
  expect(asked).toHaveLength(13);
  expect(viewOf(id)).toMatchObject({
    isLookingForKnots: false,
    mayWorkOut: true,
    knots: {
      knots: [{ sentence: null, isMinimal: true, members: [{ words: words[0] }] }],
      isComplete: true,
    },
  });
});

test('what cannot be given to anybody is looked into too', async () => {
  solver.solve = async () => ({ kind: 'impossible', clashes: [] });
  const view = viewOf(await run());
  expect(view).toMatchObject({ state: 'failed', knots: { knots: [], isComplete: false } });
  expect(view.mayWorkOut).toBe(false);
});

test('the search for knots ends with a stop, and the roster stays', async () => {
  solver.knots = (_, { stop }) =>
    new Promise((resolve) => {
      stop.addEventListener('abort', () => resolve({ kind: 'ended', wasStopped: true }));
    });
  const { id } = mustBeOk(startRun(team.supervisor, rosterId, {}));
  await vi.waitUntil(() => viewOf(id).isLookingForKnots);
  expect(viewOf(id)).toMatchObject({ state: 'done', mayStop: true, knots: null });
  expect(mustBeOk(await stopRun(team.supervisor, id)).state).toBe('done');
  expect(viewOf(id)).toMatchObject({ isLookingForKnots: false, mayStop: false });
  expect(codeOf(await stopRun(team.supervisor, id))).toBe('conflict');
});
