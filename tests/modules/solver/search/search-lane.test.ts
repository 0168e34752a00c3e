import { describe, expect, it } from 'vitest';
import { type ProblemPerson, problemSchema, type TeamRule } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import type { LinearSolver } from '@/modules/solver/linear-solver';
import type { LinearTools } from '@/modules/solver/search/search-lane';
import { buildProblem, houseKinds, type ProblemSketch } from '@/tests/support/problem-builder';
import { realTools } from '../analysis-solver';
import { optimalOf, runLane, solvedOf } from './run-lane';

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

/** Four people for six Earlies, of whom each can work one: two shifts are short, 960 minutes. */
const shortTeam = team(4, halfMore, { floors: earlies(6) });

/** A solver that is out of time before it has anything. */
const outOfTime = { kind: 'out-of-time', solution: null, bound: Number.NEGATIVE_INFINITY } as const;
const noTools: LinearTools = {
  solve: () => outOfTime,
  open: (model, name) => ({ ...realTools.open(model, name), solve: () => outOfTime }),
};

/**
 * Two people paid by the hour, 160.00 a shift, and a rule that wants two shifts of theirs to make at least 3
 * at 2 each: the relaxation works one and a half. Neither costs 3 x 200.00, one 360.00 and both 320.00;
 * the bound is 240.00. A contract of 5000.00 stands beside them.
 */
const oddRule: TeamRule = {
  id: 'odd',
  name: 'Odd',
  priceCents: 20_000,
  kind: 'linear',
  terms: ['ione', 'person-2'].map((personId) => ({ personId, shiftIndex: 0, coefficient: 2 })),
  least: 3,
  most: null,
};
const byHour = { paidBy: 'hours', payCentsPerHour: 2000, maximumMinutes: 480 } as const;
const oddTeam = buildProblem({
  people: [byHour, byHour, { contractMinutes: 12_000, maximumMinutes: 0 }],
  teamRules: [oddRule],
});

describe('the way of a search', () => {
  it('proves a roster that costs no more than the relaxation', () => {
    const run = runLane(team(2, { contractMinutes: 1920 }, { floors: earlies(4) }));
    expect(optimalOf(run)).toMatchObject({ shortageMinutes: 0, gap: 0, levels: [0] });
  });

  it.each([
    [2, 3, 480],
    [4, 6, 960],
  ])(
    'proves the least shortage that the relaxation hides: %i people, %i floors, %i minutes',
    (people, days, missing) => {
      expect(optimalOf(runLane(team(people, halfMore, { floors: earlies(days) })))).toMatchObject({
        shortageMinutes: missing,
        shortageBoundMinutes: missing,
        levels: [missing],
      });
    },
  );

  it('proves the least cost where all relaxations lie below it', () => {
    const options = { limitSeconds: 3 };
    expect(optimalOf(runLane(oddTeam, { options }))).toMatchObject({ costCents: 532_000, gap: 0 });
  });

  it('never ends with a worse roster than the one it starts from', () => {
    const best = optimalOf(runLane(shortTeam));
    const options = { start: best.roster, limitSeconds: 0 };
    const { outcome } = runLane(shortTeam, { tools: noTools, options });
    const { shortageMinutes, costCents } = best;
    expect(outcome).toMatchObject({ shortageMinutes, costCents });
  });

  it('reports stages in order and bounds that never cross what is found', () => {
    const { progress } = runLane(shortTeam, { tick: 300 });
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

  it('reports at most five times a second, but for the end', () => {
    const { progress } = runLane(shortTeam, { tick: 10, options: { limitSeconds: 300 } });
    const times = progress.slice(0, -1).map(({ elapsedMs }) => elapsedMs);
    expect(times.length).toBeGreaterThan(1);
    times.slice(1).forEach((elapsed, index) => {
      expect(elapsed - (times[index] ?? 0)).toBeGreaterThanOrEqual(200);
    });
  });

  it('tells every roster that is better than all before it, each lawful and with its true figures', () => {
    const { rosters, outcome } = runLane(shortTeam);
    expect(rosters.at(-1)).toMatchObject({ levels: [960] });
    rosters.forEach((solved, index) => {
      const { breaches, shortageMinutes, costCents } = proveRoster(shortTeam, solved.roster);
      expect([breaches, shortageMinutes, costCents]).toEqual([
        [],
        solved.shortageMinutes,
        solved.costCents,
      ]);
      const before = rosters[index - 1];
      if (!before) return;
      const isShorter = solved.shortageMinutes < before.shortageMinutes;
      expect(isShorter || solved.costCents < before.costCents).toBe(true);
    });
    expect(outcome).toMatchObject({ roster: rosters.at(-1)?.roster });
  });
});

describe('the end of a search', () => {
  it('is good enough within the gap that was asked for', () => {
    expect(runLane(oddTeam, { options: { targetGap: 0.05 } }).outcome).toMatchObject({
      kind: 'good-enough',
      costCents: 532_000,
      boundCents: 524_000,
      gap: 8000 / 532_000,
    });
  });

  it('is out of time with the bound it has when the search tree proves nothing more', () => {
    const solve: LinearSolver = (model, name, options) =>
      model.isInteger.includes(1) ? outOfTime : realTools.solve(model, name, options);
    expect(runLane(oddTeam, { tools: { solve }, tick: 100 }).outcome).toMatchObject({
      kind: 'out-of-time',
      costCents: 532_000,
      boundCents: 524_000,
    });
  });

  it('is out of time with a lawful roster and honest bounds when the solver has no time at all', () => {
    const { outcome } = runLane(shortTeam, { tools: noTools, tick: 100 });
    expect(outcome).toMatchObject({
      kind: 'out-of-time',
      shortageMinutes: 960,
      shortageBoundMinutes: 0,
      boundCents: 4 * 20_000,
    });
  });

  it('has a lawful roster even when there is no time', () => {
    const { outcome } = runLane(shortTeam, { options: { limitSeconds: 0 } });
    if (outcome.kind !== 'out-of-time') throw new Error(outcome.kind);
    expect(proveRoster(shortTeam, outcome.roster).breaches).toEqual([]);
  });

  it('is a stop that keeps the best roster', () => {
    let isStopped = false;
    const solve: LinearSolver = (model, name, options) => {
      isStopped = true;
      return realTools.solve(model, name, options);
    };
    const run = runLane(shortTeam, { tools: { solve }, isStopRequested: () => isStopped });
    expect(run.outcome).toMatchObject({ kind: 'stopped', best: { shortageMinutes: 960 } });
    const atOnce = runLane(shortTeam, { isStopRequested: () => true }).outcome;
    if (atOnce.kind !== 'stopped' || !atOnce.best) throw new Error(atOnce.kind);
    expect(proveRoster(shortTeam, atOnce.best.roster).breaches).toEqual([]);
  });

  it.each([
    ['shortage1', shortTeam],
    ['cost', oddTeam],
  ])(
    'keeps the best roster, unproven, when the solver breaks in a solve for %s',
    (failing, problem) => {
      const solve: LinearSolver = (model, name, options) =>
        name === failing
          ? { kind: 'failed', message: 'no' }
          : realTools.solve(model, name, options);
      const run = runLane(problem, { tools: { solve }, options: { limitSeconds: 3 } });
      expect(run.outcome.kind).toBe('out-of-time');
      const { roster, costCents, boundCents } = solvedOf(run);
      expect(proveRoster(problem, roster)).toMatchObject({ breaches: [], costCents });
      expect(boundCents).toBeLessThanOrEqual(costCents);
    },
  );

  it('names everybody who has no lawful line, and nobody else', () => {
    const people = [
      { minimumMinutes: 10_000 },
      {},
      { pins: [{ dayIndex: 0, shiftIndex: 3, postSkillId: null }], mayWorkNights: false },
    ];
    const { outcome } = runLane(buildProblem({ people, floors: earlies(2) }));
    expect(outcome).toMatchObject({
      kind: 'impossible',
      clashes: [
        { personId: 'ione', sentence: expect.stringMatching(/^Ione Baptisto can reach at most/) },
        { personId: 'person-3', sentence: expect.stringMatching(/^Person 3 is pinned to Night/) },
      ],
    });
  });

  it('names a person whom only limits of kinds keep from a lawful line', () => {
    // Seven shifts are asked for; three kinds at two each allow six, more than a net counts.
    const kindLimits = ['Early', 'Late', 'Night'].map((kindId) => ({ kindId, most: 2 }));
    const kinds = houseKinds.filter(({ id }) => id !== 'Day');
    const person = { kindLimits, minimumMinutes: 7 * 480 };
    const rules = { restMinutes: 0 };
    const { outcome } = runLane(buildProblem({ kinds, rules, people: [person], dayCount: 8 }));
    expect(outcome).toMatchObject({ kind: 'impossible', clashes: [{ personId: 'ione' }] });
    const lawful = { ...person, minimumMinutes: 6 * 480 };
    const found = runLane(buildProblem({ kinds, rules, people: [lawful], dayCount: 8 }));
    expect(optimalOf(found).roster).toHaveLength(6);
  });
});

describe('what a roster costs', () => {
  it('is proven to the cent but for the rounding of pay', () => {
    // 465 paid minutes at 19.33 an hour come to 149.8075 each: sums are rounded, the model's are not.
    const kinds = [{ id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 15 }];
    const person = { payCentsPerHour: 1933, paidBy: 'hours' as const, contractMinutes: 930 };
    const problem = team(3, person, { kinds, floors: earlies(7) });
    const found = optimalOf(runLane(problem));
    expect(found.costCents).toBe(proveRoster(problem, found.roster).costCents);
    expect(found.costCents - found.boundCents).toBeLessThanOrEqual(4);
    expect(found.boundCents).toBeLessThanOrEqual(found.costCents);
  });

  it('weighs a wished floor against the pay it takes', () => {
    const person = { paidBy: 'hours' as const, payCentsPerHour: 2000 };
    const wished = (priceCentsPerHour: number) =>
      optimalOf(runLane(team(1, person, { floors: [{ priceCentsPerHour }] })));
    expect(wished(1900)).toMatchObject({ roster: [], costCents: 8 * 1900 });
    expect(wished(2100)).toMatchObject({ costCents: 8 * 2000 });
  });

  it.each([null, 2])(
    'is nothing, with no gap, for a team without people (work: %s)',
    (workSeconds) => {
      const problem = buildProblem({ people: [], floors: earlies(1) });
      expect(problemSchema.safeParse(problem).success).toBe(true);
      expect(
        solvedOf(runLane(problem, { options: { workSeconds, limitSeconds: 5 } })),
      ).toMatchObject({
        roster: [],
        shortageMinutes: 480,
        costCents: 0,
        gap: 0,
      });
    },
  );
});
