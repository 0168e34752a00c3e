import loadHighs from 'highs';
import { expect, it } from 'vitest';
import type { SizingProblem } from '@/modules/problem';
import { solveLinearModel } from '@/modules/solver/highs-adapter';
import type { LinearSolver } from '@/modules/solver/linear-solver';
import { searchSizing } from '@/modules/solver/search-sizing';

const highs = await loadHighs();
const realSolver: LinearSolver = (model, name, options) =>
  solveLinearModel(highs, model, name, options);

/** Three floors of one person each; every pattern covers two of them: 1.5 people, or 2 whole ones. */
const threeOfTwo: SizingProblem = {
  version: 1,
  cycleMinutes: 1440,
  objective: 'people',
  floors: [0, 480, 960].map((startMinute) => ({
    floorId: `floor-${startMinute}`,
    weekday: 0,
    label: 'Floor',
    skillId: null,
    startMinute,
    endMinute: startMinute + 480,
    people: 1,
  })),
  patterns: [0, 480, 960].map((startMinute) => ({
    id: `pattern-${startMinute}`,
    lineId: 'all',
    label: 'Pattern',
    skillId: null,
    duties: [{ startMinute, endMinute: startMinute + 960 }],
    costCents: 0,
  })),
  caps: [],
};

const run = (solve: LinearSolver, isStopRequested = false) =>
  searchSizing(
    solve,
    threeOfTwo,
    { limitSeconds: 100, isStopRequested: () => isStopRequested },
    () => 0,
  );

it('keeps the bound of the relaxation and of whole people apart', () => {
  expect(run(realSolver)).toMatchObject({
    kind: 'answered',
    answer: { objective: 2, linearBound: 1.5, provenBound: 2, isProven: true },
  });
});

it('answers with what stage one found, unproven, when stage two found nothing', () => {
  const solve: LinearSolver = (model, name, options) =>
    name === 'size' && model.isInteger.includes(1)
      ? { kind: 'out-of-time', solution: null, bound: Number.NEGATIVE_INFINITY }
      : realSolver(model, name, options);
  const outcome = run(solve);
  expect(outcome).toMatchObject({
    kind: 'answered',
    answer: { floorsHold: true, linearBound: 1.5, provenBound: 2, isProven: false },
  });
});

it('has no answer when even the relaxation was stopped', () => {
  const solve: LinearSolver = (model, name, options) =>
    model.isInteger.includes(1)
      ? realSolver(model, name, options)
      : { kind: 'interrupted', solution: null, bound: Number.NEGATIVE_INFINITY };
  expect(run(solve, true)).toEqual({ kind: 'stopped' });
});

it('breaks off when the solver says what cannot be', () => {
  expect(() => run(() => ({ kind: 'infeasible' }))).toThrow(/always has a solution/);
});
