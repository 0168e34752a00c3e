import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { type Problem, type ProblemPerson, problemSchema } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import type { RosterProgress } from '@/modules/solver';
import { solveLinearModel } from '@/modules/solver/highs-adapter';
import type { LinearSolver } from '@/modules/solver/linear-solver';
import { type RosterOptions, searchRoster } from '@/modules/solver/search-roster';
import { buildProblem, houseKinds, type ProblemSketch } from '@/tests/support/problem-builder';

const highs = await loadHighs();
const realSolver: LinearSolver = (model, name, options) =>
  solveLinearModel(highs, model, name, options);

interface Watch {
  readonly solve?: LinearSolver;
  readonly options?: Partial<RosterOptions>;
  readonly isStopRequested?: () => boolean;
}

/** Runs a search in this thread on a clock that goes one second further each time it is read. */
function search(problem: Problem, watch: Watch = {}) {
  problemSchema.parse(problem);
  const calls: string[] = [];
  const progress: RosterProgress[] = [];
  let milliseconds = 0;
  const outcome = searchRoster(
    (model, name, options) => {
      calls.push(name);
      return (watch.solve ?? realSolver)(model, name, options);
    },
    problem,
    { limitSeconds: 10_000, targetGap: 0, seed: 1, start: null, ...watch.options },
    {
      clock: () => {
        milliseconds += 1000;
        return milliseconds;
      },
      isStopRequested: watch.isStopRequested ?? (() => false),
      onProgress: (report) => progress.push(report),
      onRoster: () => undefined,
    },
  );
  return { outcome, progress, stages: calls.filter((name) => name !== 'turn') };
}

/** A floor of one nurse on each of the first days, 07:00 to 15:00. */
const earlies = (days: number) =>
  Array.from({ length: days }, (_, day) => ({
    startMinute: day * 1440 + 420,
    endMinute: day * 1440 + 900,
  }));

/** Hours for one and a half shifts: the relaxation works the half, a roster cannot. */
const halfMore = { contractMinutes: 480, maximumMinutes: 720 };
const team = (count: number, person: Partial<ProblemPerson>, sketch: ProblemSketch) =>
  buildProblem({ ...sketch, people: Array.from({ length: count }, () => person) });

describe('the way of a search', () => {
  it('takes the shortcut when the relaxation can be reached, and is done', () => {
    const { outcome, stages } = search(team(2, { contractMinutes: 1920 }, { floors: earlies(4) }));
    expect(outcome).toMatchObject({ kind: 'optimal', shortageMinutes: 0, gap: 0 });
    expect(stages).toEqual(['shortage1', 'cost']);
  });

  it('goes straight on to the least cost when the first roster already has the least shortage', () => {
    // With Early alone nobody comes or goes within a floor: shortage counts in steps of 480 minutes.
    const kinds = houseKinds.slice(0, 1);
    const { outcome, stages } = search(team(2, halfMore, { kinds, floors: earlies(3) }));
    expect(outcome).toMatchObject({
      kind: 'optimal',
      shortageMinutes: 480,
      shortageBoundMinutes: 480,
    });
    expect(stages).toEqual(['shortage1', 'cost', 'cost']);
  });

  it('searches for the least shortage when the shortcut fails, then for the least cost', () => {
    const { outcome, stages } = search(team(4, halfMore, { floors: earlies(6) }));
    expect(outcome).toMatchObject({
      kind: 'optimal',
      shortageMinutes: 960,
      shortageBoundMinutes: 960,
    });
    expect(stages).toEqual(['shortage1', 'cost', 'shortage1', 'cost']);
  });

  it('never ends with a worse roster than the one it starts from', () => {
    const problem = team(4, halfMore, { floors: earlies(6) });
    const best = search(problem).outcome;
    if (best.kind !== 'optimal') throw new Error(`expected the optimum, got ${best.kind}`);
    const outOfTime: LinearSolver = (model, name, options) =>
      name === 'turn'
        ? realSolver(model, name, options)
        : { kind: 'out-of-time', solution: null, bound: Number.NEGATIVE_INFINITY };
    const { outcome } = search(problem, { solve: outOfTime, options: { start: best.roster } });
    expect(outcome).toMatchObject({
      shortageMinutes: best.shortageMinutes,
      costCents: best.costCents,
    });
  });

  it('gives the shortcut up after its share of the time', () => {
    const solve: LinearSolver = (model, name, options) => {
      const isShortcut = name === 'cost' && model.rowUpper.at(-1) === 0;
      if (!isShortcut) return realSolver(model, name, options);
      let asked = 0;
      while (!options.shouldStop?.()) asked += 1;
      expect(asked).toBeGreaterThan(10);
      return { kind: 'interrupted', solution: null, bound: Number.NEGATIVE_INFINITY };
    };
    const { outcome, stages } = search(team(4, halfMore, { floors: earlies(6) }), { solve });
    expect(outcome).toMatchObject({ kind: 'optimal', shortageMinutes: 960 });
    expect(stages).toEqual(['shortage1', 'cost', 'shortage1', 'cost']);
  });

  it('reports stages in order and bounds that never cross what is found', () => {
    const { progress } = search(team(4, halfMore, { floors: earlies(6) }));
    expect(progress.at(-1)).toMatchObject({ stage: 2, shortageMinutes: 960 });
    progress.forEach((report, index) => {
      expect(report.stage).toBeGreaterThanOrEqual(progress[index - 1]?.stage ?? 1);
      expect(report.shortageBoundMinutes ?? 0).toBeLessThanOrEqual(
        report.shortageMinutes ?? Number.POSITIVE_INFINITY,
      );
      expect(report.boundCents ?? 0).toBeLessThanOrEqual(
        report.bestCostCents ?? Number.POSITIVE_INFINITY,
      );
    });
  });
});

describe('the end of a search', () => {
  const problem = team(4, halfMore, { floors: earlies(6) });

  it('is good enough within the gap that was asked for', () => {
    const dear = team(2, { contractMinutes: 480, maximumMinutes: 1440 }, { floors: earlies(4) });
    const solve: LinearSolver = (model, name, options) => {
      const outcome = realSolver(model, name, options);
      if (name !== 'cost' || outcome.kind !== 'optimal') return outcome;
      const bound = outcome.bound * 0.98;
      return { kind: 'good-enough', solution: outcome.solution, bound, gap: 0.02 };
    };
    // Contracts 400.00 and two overtime shifts 600.00: 1000.00, and a bound of 980.00.
    const options = { targetGap: 0.05 };
    expect(search(dear, { solve, options }).outcome).toMatchObject({
      kind: 'good-enough',
      costCents: 100_000,
      boundCents: 98_000,
      gap: 0.02,
    });
    expect(search(dear, { solve }).outcome).toMatchObject({ kind: 'out-of-time', gap: 0.02 });
  });

  it('is out of time with the first lawful roster and honest bounds when nothing else fits in', () => {
    const solve: LinearSolver = (model, name, options) =>
      name === 'turn'
        ? realSolver(model, name, options)
        : { kind: 'out-of-time', solution: null, bound: Number.NEGATIVE_INFINITY };
    const { outcome } = search(problem, { solve });
    expect(outcome).toMatchObject({
      kind: 'out-of-time',
      shortageMinutes: 960,
      shortageBoundMinutes: 0,
      boundCents: 4 * 20_000,
    });
  });

  it('is a failure with a sentence when there is no time for a first roster', () => {
    expect(search(problem, { options: { limitSeconds: 0 } }).outcome).toEqual({
      kind: 'failed',
      message: 'The time was over before a first lawful roster was found; allow more seconds.',
    });
  });

  it('is a stop that keeps the best roster, or says that there is none', () => {
    let isStopped = false;
    const solve: LinearSolver = (model, name, options) => {
      isStopped ||= name !== 'turn';
      return realSolver(model, name, options);
    };
    const { outcome } = search(problem, { solve, isStopRequested: () => isStopped });
    expect(outcome).toMatchObject({ kind: 'stopped', best: { shortageMinutes: 960 } });
    const before: LinearSolver = () => ({ kind: 'interrupted', solution: null, bound: 0 });
    const none = search(problem, { solve: before, isStopRequested: () => true });
    expect(none.outcome).toEqual({ kind: 'stopped', best: null });
  });

  it.each(['shortage1', 'cost'])(
    'passes on a failure of the solver in a solve for %s',
    (failing) => {
      const solve: LinearSolver = (model, name, options) =>
        name === failing ? { kind: 'failed', message: 'no' } : realSolver(model, name, options);
      expect(search(problem, { solve }).outcome).toEqual({ kind: 'failed', message: 'no' });
    },
  );
});

describe('what a roster costs', () => {
  it('is proven to the cent but for the rounding of pay', () => {
    // 465 paid minutes at 19.33 an hour come to 149.8075 each: sums are rounded, the model's are not.
    const kinds = [{ id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 15 }];
    const person = { payCentsPerHour: 1933, paidBy: 'hours' as const, contractMinutes: 930 };
    const problem = team(3, person, { kinds, floors: earlies(7) });
    const { outcome } = search(problem);
    if (outcome.kind !== 'optimal') throw new Error(outcome.kind);
    expect(outcome.costCents).toBe(proveRoster(problem, outcome.roster).costCents);
    expect(outcome.costCents - outcome.boundCents).toBeLessThanOrEqual(4);
    expect(outcome.boundCents).toBeLessThanOrEqual(outcome.costCents);
  });

  it('weighs a wished floor against the pay it takes', () => {
    const person = { paidBy: 'hours' as const, payCentsPerHour: 2000 };
    const wished = (priceCentsPerHour: number) => [{ priceCentsPerHour }];
    const cheap = search(team(1, person, { floors: wished(1900) })).outcome;
    expect(cheap).toMatchObject({ kind: 'optimal', roster: [], costCents: 8 * 1900 });
    const dear = search(team(1, person, { floors: wished(2100) })).outcome;
    expect(dear).toMatchObject({ kind: 'optimal', costCents: 8 * 2000 });
  });

  it('is nothing, with no gap, for a team without people', () => {
    expect(search(buildProblem({ people: [], floors: earlies(1) })).outcome).toMatchObject({
      kind: 'optimal',
      roster: [],
      shortageMinutes: 480,
      costCents: 0,
      gap: 0,
    });
  });
});
