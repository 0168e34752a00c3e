import { and, eq } from 'drizzle-orm';
import { beforeEach, expect, test, vi } from 'vitest';
import { db } from '@/db/client';
import { assignments, auditEvents, floors, people, shiftKinds } from '@/db/schema';
import { addFloor } from '@/modules/coverage/server';
import {
  followRun,
  listRuns,
  openPeriod,
  readBoard,
  readFooting,
  readRun,
  readRunModel,
  startRun,
  stopRun,
  waitForRun,
} from '@/modules/roster/server';
import type { RosterId } from '@/modules/units';
import {
  codeOf,
  mustBeOk,
  openSmallPeriod,
  planSmallPeriod,
  type SmallTeam,
  shiftMinutes,
  smallCostCents,
  smallStart,
  smallTeam,
} from '@/tests/support/small-team';

vi.mock('@/db/clock', () => ({ now: () => Date.parse('2027-01-14T09:00:00Z') }));

let team: SmallTeam;
beforeEach(() => {
  team = smallTeam();
});

const start = (rosterId: RosterId, limitSeconds = 20) =>
  startRun(team.supervisor, rosterId, { limitSeconds });

async function run(rosterId: RosterId) {
  const started = mustBeOk(start(rosterId));
  await waitForRun(started.id);
  return mustBeOk(readRun(team.supervisor, started.id));
}

test('a run fills the draft with a proven cheapest roster', async () => {
  const rosterId = openSmallPeriod(team);
  const view = await run(rosterId);
  expect(view).toMatchObject({
    number: 1,
    state: 'done',
    failure: null,
    isProvenOptimal: true,
    bestCostCents: smallCostCents,
    shortageMinutes: 0,
    shortageBoundMinutes: 0,
    peopleCount: 3,
    dayCount: 7,
    shortageLines: [],
    mayStop: false,
    bySkill: [{ name: 'Nurse', neededMinutes: 14 * shiftMinutes, missingMinutes: 0 }],
  });
  // Half a cent of rounding for each sum of pay is all that may lie between.
  expect(view.boundCents).toBeGreaterThanOrEqual(smallCostCents - 3);
  expect(view.boundCents).toBeLessThanOrEqual(smallCostCents);
  expect(view.proof?.breaches).toEqual([]);
  expect(view.proof?.costCents).toBe(smallCostCents);
  expect(view.rules[0]).toMatchObject({ label: 'Rest between shifts', limit: '11 h' });

  const board = mustBeOk(readBoard(team.supervisor, rosterId));
  expect(board.cells).toHaveLength(14);
  expect(board.version).toMatchObject({ number: 1, publishedAtUtc: null });
  expect(board.run?.id).toBe(view.id);
  expect(view.proof?.bound).toMatchObject({
    solverCents: view.boundCents,
    sentence: expect.stringMatching(/^No roster can cost less than €2,36\d\.\d\d: reckoned anew/),
  });
  expect(view).toMatchObject({ knots: null, isLookingForKnots: false });
  // The board re-checks the draft against today's data, of which no run knows a bound.
  expect({ ...board.proof, bound: view.proof?.bound }).toEqual(view.proof);
  expect(board.activeRunId).toBeNull();
  expect(board.people.reduce((sum, person) => sum + person.plannedMinutes, 0)).toBe(
    14 * shiftMinutes,
  );
  expect(board.lanes).toEqual(view.lanes);
  expect(board.noticeWarning).toBeNull();
});

test('reports of a run are numbered from 1 and never get worse within a stage', async () => {
  const { events } = await run(openSmallPeriod(team));
  expect(events.map(({ sequence }) => sequence)).toEqual(events.map((_, index) => index + 1));
  const costs = events.flatMap(({ stage, bestCostCents }) =>
    stage === 2 && bestCostCents !== null ? [bestCostCents] : [],
  );
  expect(costs).toEqual([...costs].sort((one, other) => other - one));
});

test('where floors cannot be held, the least shortage is kept and told by date, window and skill', async () => {
  team = smallTeam(['Ada', 'Bo']);
  const view = await run(openSmallPeriod(team));
  // Two nurses, five days each: 10 of 14 shifts.
  expect(view).toMatchObject({
    state: 'done',
    shortageMinutes: 4 * shiftMinutes,
    shortageBoundMinutes: 4 * shiftMinutes,
  });
  expect(view.shortageLines).toHaveLength(4);
  expect(view.shortageLines[0]).toMatch(
    /^(Mon|Tue|Wed|Thu|Fri|Sat|Sun) \d Feb (07:00-15:00|15:00-23:00), Nurse: short 1$/,
  );
  expect(view.bySkill).toMatchObject([{ missingMinutes: 4 * shiftMinutes }]);
});

test('one run of a roster at a time: the second is refused, after the first ended it is run 2', async () => {
  const rosterId = openSmallPeriod(team);
  const first = mustBeOk(start(rosterId));
  expect(mustBeOk(readBoard(team.supervisor, rosterId)).activeRunId).toBe(first.id);
  expect(start(rosterId)).toMatchObject({
    ok: false,
    error: {
      code: 'conflict',
      detail: 'Run 1 of this period is still on. Wait for it or stop it first.',
    },
  });
  await waitForRun(first.id);
  const second = await run(rosterId);
  expect(second.number).toBe(2);
  expect(mustBeOk(listRuns(team.hr, team.teamId)).map(({ number }) => number)).toEqual([2, 1]);
});

test('two rosters may run at once', async () => {
  const one = openSmallPeriod(team);
  const other = mustBeOk(openPeriod(team.supervisor, team.teamId, { startsOn: '2027-02-08' })).id;
  const runs = [mustBeOk(start(one)), mustBeOk(start(other))];
  await Promise.all(runs.map(({ id }) => waitForRun(id)));
  const states = runs.map(({ id }) => mustBeOk(readRun(team.hr, id)).state);
  expect(states).toEqual(['done', 'done']);
});

test.each([
  ['floors', () => db().update(floors).set({ effectiveFrom: '2028-01-01' }).run(), /Add floors/],
  ['shift kinds', () => db().update(shiftKinds).set({ isRetired: true }).run(), /shift kinds/],
  ['people', () => db().update(people).set({ isActive: false }).run(), /Add people first/],
])('without %s there is nothing to run, and the fix is named', (_, remove, fix) => {
  const rosterId = openSmallPeriod(team);
  remove();
  const refused = start(rosterId);
  expect(codeOf(refused)).toBe('conflict');
  expect(refused.ok ? '' : refused.error.detail).toMatch(fix);
  expect(mustBeOk(listRuns(team.supervisor, team.teamId))).toEqual([]);
});

test('a run longer than the server allows is refused at its field', () => {
  expect(start(openSmallPeriod(team), 61)).toMatchObject({
    ok: false,
    error: {
      code: 'invalid',
      fields: [{ path: 'limitSeconds', message: 'Write at most 60 seconds.' }],
    },
  });
});

test('pinned shifts are kept by the next run and stay pinned', async () => {
  const rosterId = await planSmallPeriod(team);
  const [first] = mustBeOk(readBoard(team.supervisor, rosterId)).cells;
  if (!first) throw new Error('nothing planned');
  const isFirst = and(eq(assignments.personId, first.personId), eq(assignments.date, first.date));
  db().update(assignments).set({ isPinned: true }).where(isFirst).run();
  const view = await run(rosterId);
  expect(view.state).toBe('done');
  const cells = mustBeOk(readBoard(team.supervisor, rosterId)).cells;
  expect(cells.filter(({ isPinned }) => isPinned)).toEqual([{ ...first, isPinned: true }]);
});

test('a pin on a retired kind is named before any run', async () => {
  const rosterId = await planSmallPeriod(team);
  db().update(assignments).set({ isPinned: true }).run();
  db().update(shiftKinds).set({ isRetired: true }).where(eq(shiftKinds.name, 'Late')).run();
  const refused = start(rosterId);
  expect(refused.ok ? '' : refused.error.detail).toMatch(/^A pin does not fit any more: Late is/);
});

test('a changed floor shows on the draft at once', async () => {
  const rosterId = await planSmallPeriod(team);
  mustBeOk(
    addFloor(team.supervisor, team.teamId, {
      skillId: team.nurse,
      startMinute: 420,
      endMinute: 900,
      needs: [1, 0, 0, 0, 0, 0, 0, 0],
      counting: 'seated',
      priceCentsPerHour: 100,
      effectiveFrom: smallStart,
      effectiveTo: null,
    }),
  );
  const { proof, lanes } = mustBeOk(readBoard(team.supervisor, rosterId));
  expect(proof).toMatchObject({ shortageMinutes: 0, wishedShortageMinutes: shiftMinutes });
  expect(lanes[0]?.slots.find(({ need }) => need === 2)).toMatchObject({ startMinute: 420 });
});

test('the model of stage two is text of the LP or MPS format that holds the shortage found', async () => {
  team = smallTeam(['Ada', 'Bo']);
  const { id } = await run(openSmallPeriod(team));
  const file = mustBeOk(readRunModel(team.supervisor, id, 'lp'));
  expect(file.fileName).toBe('roster-2027-02-01-run-1.lp');
  expect(file.text).toContain('Minimize');
  expect(file.text.replaceAll(/\s+/g, ' ')).toMatch(/shortage1: .*? <= 1920 /);
  expect(file.text.trimEnd().endsWith('End')).toBe(true);
  const other = mustBeOk(readRunModel(team.supervisor, id, 'mps'));
  expect(other.fileName).toBe('roster-2027-02-01-run-1.mps');
  expect(other.text).toMatch(/^ RHS shortage1 1920$/m);
  expect(other.text.trimEnd().endsWith('ENDATA')).toBe(true);
});

test('a follower is told what it missed, what comes, and the end, each once', async () => {
  const rosterId = openSmallPeriod(team);
  const { id } = mustBeOk(start(rosterId));
  const told: string[] = [];
  const follower = {
    onEvent: ({ sequence }: { sequence: number }) => void told.push(`${sequence}`),
    onEnd: ({ state }: { state: string }) => void told.push(state),
  };
  mustBeOk(followRun(team.hr, id, 0, follower));
  const left = mustBeOk(followRun(team.hr, id, 0, { onEvent: fail, onEnd: fail }));
  left();
  await waitForRun(id);
  const count = mustBeOk(readRun(team.hr, id)).events.length;
  const all = Array.from({ length: count }, (_, index) => `${index + 1}`);
  expect(told).toEqual([...all, 'done']);
  told.length = 0;
  mustBeOk(followRun(team.hr, id, 1, follower));
  expect(told).toEqual([...all.slice(1), 'done']);
});

const fail = () => {
  throw new Error('nobody follows any more');
};

test('the footing of a range weighs floors against contracts', () => {
  const footing = mustBeOk(
    readFooting(team.supervisor, team.teamId, { from: smallStart, to: '2027-02-07' }),
  );
  expect(footing).toMatchObject({
    neededMinutes: 14 * shiftMinutes,
    availableMinutes: 3 * 2400,
    overtimeNeededMinutes: 0,
  });
});

test('every look at a run and every change is refused to other roles and teams', async () => {
  const rosterId = openSmallPeriod(team);
  const { id } = await run(rosterId);
  const staff = team.people[0]?.actor ?? team.hr;
  const follower = { onEvent: fail, onEnd: fail };
  for (const [actor, code] of [
    [staff, 'not-allowed'],
    [team.otherSupervisor, 'not-found'],
    [team.stranger, 'not-found'],
  ] as const) {
    expect(codeOf(startRun(actor, rosterId, {}))).toBe(code);
    expect(codeOf(readRun(actor, id))).toBe(code);
    expect(codeOf(readRunModel(actor, id, 'lp'))).toBe(code);
    expect(codeOf(followRun(actor, id, 0, follower))).toBe(code);
    expect(codeOf(await stopRun(actor, id))).toBe(code);
    expect(codeOf(listRuns(actor, team.teamId))).toBe(code);
    expect(codeOf(readFooting(actor, team.teamId, { from: smallStart, to: smallStart }))).toBe(
      code,
    );
  }
  expect(codeOf(startRun(team.hr, rosterId, {}))).toBe('not-allowed');
  expect(codeOf(await stopRun(team.hr, id))).toBe('not-allowed');
  expect(codeOf(readRun(team.owner, 'run_none'))).toBe('not-found');
  expect(codeOf(await stopRun(team.supervisor, id))).toBe('conflict');
  const board = mustBeOk(readBoard(team.hr, rosterId));
  expect([board.mayEdit, board.maySeePay]).toEqual([false, true]);
  const actions = db()
    .select()
    .from(auditEvents)
    .all()
    .map(({ action }) => action);
  expect(actions.filter((action) => action.startsWith('run.'))).toEqual(['run.start']);
});
