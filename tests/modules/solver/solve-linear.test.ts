import { afterAll, describe, expect, it } from 'vitest';
import { ModelBuilder } from '@/modules/model';
import type { LinearOutcome } from '@/modules/solver';
import { closeSolver, solveLinear } from '@/modules/solver/server';
import { buildPlainModel, plainModels } from './plain-models';

afterAll(closeSolver);

const solve = (model: Parameters<typeof solveLinear>[0]) =>
  solveLinear(model, 'value', { limitSeconds: 20 });

function optimal(outcome: LinearOutcome) {
  if (outcome.kind !== 'optimal') throw new Error(`ended as ${outcome.kind}`);
  return outcome;
}

const near = (numbers: readonly number[]) => numbers.map((number) => expect.closeTo(number, 6));

describe('plain models of the literature', () => {
  it.each(plainModels)('$id, $source', async (plain) => {
    const outcome = await solve(buildPlainModel(plain));
    if (plain.objective === null) {
      expect(outcome).toEqual({ kind: 'infeasible' });
      return;
    }
    const { solution, bound, duals } = optimal(outcome);
    expect(solution.objective).toBeCloseTo(plain.objective, 6);
    expect(bound).toBeCloseTo(plain.objective, 6);
    if (plain.point) expect([...solution.values]).toEqual(near(plain.point));
    if (plain.duals) expect([...(duals?.rowDuals ?? [])]).toEqual(near(plain.duals));
  });

  it.each(plainModels.filter(({ wholeObjective }) => wholeObjective !== undefined))(
    '$id in whole numbers',
    async (plain) => {
      const { solution, duals } = optimal(await solve(buildPlainModel(plain, true)));
      expect(solution.objective).toBeCloseTo(plain.wholeObjective ?? 0, 6);
      if (plain.wholePoint) expect([...solution.values]).toEqual(near(plain.wholePoint));
      expect(duals).toBeNull();
    },
  );

  it('says infeasible of A4.2 and A4.4 in whole numbers too', async () => {
    for (const plain of plainModels.filter(({ objective }) => objective === null)) {
      expect(await solve(buildPlainModel(plain, true))).toEqual({ kind: 'infeasible' });
    }
  });
});

describe('other ends', () => {
  it('tells unbounded from infeasible', async () => {
    const builder = new ModelBuilder('unbounded', { value: 'maximise' });
    const column = builder.addColumn({ name: 'x', isInteger: true, costs: { value: 1 } });
    builder.addRow({ name: 'least', lower: 1, entries: [[column, 1]] });
    expect(await solve(builder.build())).toEqual({ kind: 'unbounded' });
  });

  it('gives the constant of a model without columns', async () => {
    const builder = new ModelBuilder('empty', { value: 'minimise' });
    builder.addOffset('value', 12);
    expect(optimal(await solve(builder.build())).solution.objective).toBe(12);
  });

  it('answers at once when there is no time', async () => {
    const [plain] = plainModels;
    if (!plain) throw new Error('no model');
    const outcome = await solveLinear(buildPlainModel(plain), 'value', { limitSeconds: 0 });
    expect(outcome).toEqual({
      kind: 'out-of-time',
      solution: null,
      bound: Number.NEGATIVE_INFINITY,
    });
  });

  it('turns a broken model into a failure with a sentence and a cause', async () => {
    const [plain] = plainModels;
    if (!plain) throw new Error('no model');
    const outcome = await solveLinear(buildPlainModel(plain), 'nonsense', { limitSeconds: 5 });
    expect(outcome).toMatchObject({ kind: 'failed', cause: expect.any(Error) });
  });
});
