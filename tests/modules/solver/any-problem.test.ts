import { describe, expect, it } from 'vitest';
import {
  buildRosterModel,
  type RosterModel,
  roundingSlackCents,
  withRowBounds,
  writeLp,
} from '@/modules/model';
import type { Problem } from '@/modules/problem';
import { type Proof, proveBound, proveRoster } from '@/modules/proof';
import type { SolvedRoster } from '@/modules/solver';
import { type OutsideSolver, solveWithCbc, solveWithGlpk } from '@/tests/support/outside-solvers';
import { smallProblems } from '@/tests/support/random-problems';
import { optimalOf, runLane } from './search/run-lane';

/*
 * The whole engine on small problems in which everything a problem can say occurs: its rosters against the
 * proof, and its optima against solvers that share nothing with it.
 */

const problems = smallProblems(200, 20_270_201).map((problem, index) => ({
  number: index + 1,
  problem,
}));

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
  const proven = proveBound(problem, solved.boundRecord, proof);
  if (proven.kind === 'bound') expect(proven.boundCents).toBeLessThanOrEqual(solved.costCents);
}

/** Room for the arithmetic of the other solver where a level is kept at its value. */
const tolerance = 1e-4;

/**
 * Confirms levels and cost, one after the other with those before kept. A level at 0 needs no solve: that it
 * can be kept at 0 shows in those after it.
 */
function confirm(model: RosterModel, solved: SolvedRoster, least: OutsideSolver) {
  const slack = roundingSlackCents(model);
  let linear = model.linear;
  model.levels.forEach(({ objective, row, name }, position) => {
    const value = solved.levels[position] ?? Number.NaN;
    // A firm budget is held against pay that is not rounded.
    const room = name === 'teamRules' ? slack : 0;
    if (value > 0) {
      const found = least(writeLp(linear, objective)) ?? Number.NaN;
      expect(Math.abs(found - value), objective).toBeLessThanOrEqual(room + 1e-3);
    }
    linear = withRowBounds(linear, row, Number.NEGATIVE_INFINITY, value + room + tolerance);
  });
  const cost = least(writeLp(linear, 'cost')) ?? Number.NaN;
  expect(Math.abs(cost - solved.costCents), 'cost').toBeLessThanOrEqual(slack + 0.01);
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
