import { MessageChannel } from 'node:worker_threads';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  buildRosterModel,
  levelSlacks,
  type RosterModel,
  roundingSlackCents,
  withRowBounds,
  writeLp,
} from '@/modules/model';
import type { BoundRecord, Problem } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import reckonBound from '@/modules/roster/bound-worker';
import { judgeBound } from '@/modules/roster/judge-bound';
import type { SolvedRoster } from '@/modules/solver';
import { type OutsideSolver, solveWithCbc, solveWithGlpk } from '@/tests/support/outside-solvers';
import { anyProblem } from './lines/any-ground';
import { optimalOf, runLane } from './search/run-lane';

/*
 * The whole engine on small problems in which everything a problem can say occurs: its rosters against the
 * proof, and its optima against solvers that share nothing with it.
 */

const problems = fc
  .sample(anyProblem, { numRuns: 200, seed: 20_270_201 })
  .map((problem, index) => ({ number: index + 1, problem }));

/** What the proof says of each level of the model. */
const provenLevels = (model: RosterModel, proof: Proof): number[] =>
  model.levels.map(({ name, priority }) => {
    if (name === 'teamRules') return proof.teamRuleUnits;
    if (name === 'surplus') return proof.surplusMinutes;
    return proof.shortageByPriority.find((one) => one.priority === priority)?.minutes ?? 0;
  });

/** The roster is lawful and what the engine says of it is what the proof says. */
function compareWithProof(problem: Problem, model: RosterModel, solved: SolvedRoster) {
  const proof = proveRoster(problem, solved.roster);
  expect(proof.breaches.filter(({ rule }) => rule !== 'teamRules')).toEqual([]);
  expect({
    levels: solved.levels,
    shortageMinutes: solved.shortageMinutes,
    costCents: solved.costCents,
  }).toEqual({
    levels: provenLevels(model, proof),
    shortageMinutes: proof.shortageMinutes,
    costCents: proof.costCents,
  });
  expect(solved.boundCents).toBeLessThanOrEqual(solved.costCents);
  if (!solved.boundRecord || proof.teamRuleUnits > 0) return;
  compareBounds(problem, proof, solved, solved.boundRecord);
}

/** What a run does with the bound: reckoned anew from its record, it is no reason to doubt the roster. */
function compareBounds(problem: Problem, proof: Proof, solved: SolvedRoster, record: BoundRecord) {
  const job = { problem, record, figures: proof };
  const { port1 } = new MessageChannel();
  const answer = reckonBound({ job, port: port1, stopFlag: new SharedArrayBuffer(4) });
  const verdict = judgeBound(solved, proof, { kind: 'answered', answer }, problem.currency);
  expect(verdict.doubt).toBeNull();
}

/** Other solvers take a column that is a millionth off for a whole number, and a shift costs up to 300.00. */
const arithmetic = 0.4;

/**
 * Confirms levels and cost, one after the other with those before kept. A level at 0 needs no solve: that it
 * can be kept at 0 shows in those after it.
 */
function confirm(model: RosterModel, solved: SolvedRoster, least: OutsideSolver) {
  const slacks = levelSlacks(model);
  let linear = model.linear;
  let isExact = true;
  const compare = (objective: string, value: number, slack: number) => {
    const found = least(writeLp(linear, objective)) ?? Number.NaN;
    // What was kept with room for rounding may leave less for what comes after it, and never more.
    if (isExact) expect(value, objective).toBeGreaterThanOrEqual(found - slack - arithmetic);
    expect(found, objective).toBeLessThanOrEqual(value + slack + arithmetic);
    const rounding = slack === 0 ? 0 : 2 * Math.ceil(slack) + 1;
    if (isExact)
      expect(value, objective).toBeLessThanOrEqual(found + slack + rounding + arithmetic);
  };
  model.levels.forEach(({ objective, row }, position) => {
    const [value = Number.NaN, slack = 0] = [solved.levels[position], slacks[position]];
    if (value > 0) compare(objective, value, slack);
    linear = withRowBounds(linear, row, Number.NEGATIVE_INFINITY, value + slack + 1e-4);
    isExact &&= slack === 0;
  });
  compare('cost', solved.costCents, roundingSlackCents(model));
}

describe('200 small problems of every kind', () => {
  const ends = new Set<string>();

  it.each(problems)(
    'problem $number: the optimum is that of CBC or GLPK',
    ({ number, problem }) => {
      const model = buildRosterModel(problem);
      const outside = number % 2 === 0 ? solveWithCbc : solveWithGlpk;
      const options = { limitSeconds: 60, seed: number };
      const run = runLane(problem, { haste: 20, onlyProves: number % 4 > 0, options });
      ends.add(run.outcome.kind);
      if (run.outcome.kind === 'impossible') {
        expect(outside(writeLp(model.linear, 'cost'))).toBeNull();
        return;
      }
      const solved = optimalOf(run);
      if (solved.levels.some((value) => value > 0)) ends.add('short');
      compareWithProof(problem, model, solved);
      confirm(model, solved, outside);
    },
  );

  it('include people without a lawful line, floors that cannot hold and others that can', () => {
    expect([...ends].sort()).toEqual(['impossible', 'optimal', 'short']);
  });
});
