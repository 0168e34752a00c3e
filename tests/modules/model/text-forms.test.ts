import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { buildRosterModel, type LinearModel, writeLp, writeMps } from '@/modules/model';
import { type LeastValue, solveLevels } from '@/tests/support/level-by-level';
import { solveWithCbc, solveWithGlpk } from '@/tests/support/outside-solvers';
import { smallProblems } from '@/tests/support/random-problems';

/*
 * Every model of these small problems is written in both formats and read by three solvers that share
 * nothing: they must agree on every level and on the cost.
 */

const highs = await loadHighs();

function highsReading(format: 'lp' | 'mps', write: typeof writeLp): LeastValue {
  return (model: LinearModel, objective) =>
    highs.withModel({ format, data: write(model, objective) }, (loaded) => {
      loaded.options.set('output_flag', false);
      loaded.options.set('mip_rel_gap', 0);
      loaded.options.set('mip_abs_gap', 0);
      loaded.run();
      const { optimal, infeasible } = highs.constants.modelStatus;
      const status = loaded.getModelStatus();
      if (status === infeasible) return null;
      expect(status).toBe(optimal);
      return loaded.getObjectiveValue();
    });
}

const outside: readonly (readonly [string, LeastValue])[] = [
  ['HiGHS, MPS', highsReading('mps', writeMps)],
  ['CBC, LP', (model, objective) => solveWithCbc(writeLp(model, objective))],
  ['CBC, MPS', (model, objective) => solveWithCbc(writeMps(model, objective), 'mps')],
  ['GLPK, LP', (model, objective) => solveWithGlpk(writeLp(model, objective))],
  ['GLPK, MPS', (model, objective) => solveWithGlpk(writeMps(model, objective), 'mps')],
];

const problems = smallProblems(8, 31).map((problem, index) => ({ number: index + 1, problem }));

describe('levels and cost of small problems', () => {
  const seen = new Set<string>();

  it.each(problems)('problem $number: both files give the same optimum', ({ problem }) => {
    const model = buildRosterModel(problem);
    for (const { objective } of model.levels) seen.add(objective);
    const values = solveLevels(model, highsReading('lp', writeLp));
    if (values) seen.add('solved');
    for (const [solver, least] of outside) {
      const others = solveLevels(model, least);
      expect([solver, others === null]).toEqual([solver, values === null]);
      others?.forEach((value, index) => {
        // A whole-number column may be off by a millionth, and one shift costs up to 30,000 cents.
        expect(value, solver).toBeCloseTo(values?.[index] ?? Number.NaN, 0);
      });
    }
  });

  it('include every kind of level and problems that have a solution', () => {
    expect([...seen]).toEqual(
      expect.arrayContaining(['teamRules', 'surplus', 'shortage1', 'shortage2', 'solved']),
    );
  });
});
