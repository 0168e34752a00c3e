import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { ModelBuilder, writeLp } from '@/modules/model';
import { solveWithCbc, solveWithGlpk } from '@/tests/support/outside-solvers';
import { buildPlainModel, plainModels } from './plain-models';

const highs = await loadHighs();

function solveWithHighs(lp: string): number | null {
  return highs.withModel({ format: 'lp', data: lp }, (model) => {
    model.options.set('output_flag', false);
    model.run();
    const isOptimal = model.getModelStatus() === highs.constants.modelStatus.optimal;
    return isOptimal ? model.getObjectiveValue() : null;
  });
}

const solvers = [
  ['HiGHS', solveWithHighs],
  ['CBC', solveWithCbc],
  ['GLPK', solveWithGlpk],
] as const;

describe.each(solvers)('the LP file, read by %s', (_, solve) => {
  it.each(plainModels)('gives the published value of $id', (plain) => {
    const value = solve(writeLp(buildPlainModel(plain), 'value'));
    if (plain.objective === null) expect(value).toBeNull();
    else expect(value).toBeCloseTo(plain.objective, 6);
  });

  it('keeps whole numbers, both bounds of a row, bounds of columns and the constant', () => {
    const builder = new ModelBuilder('everything', { value: 'minimise' });
    const whole = builder.addColumn({ name: 'e1', isInteger: true, costs: { value: 3 } });
    const free = builder.addColumn({
      name: 'free one',
      lower: Number.NEGATIVE_INFINITY,
      costs: { value: 1 },
    });
    const below = builder.addColumn({
      name: 'work(p0,s1)',
      lower: Number.NEGATIVE_INFINITY,
      upper: -2,
      costs: { value: -1 },
    });
    const fixed = builder.addColumn({ name: '2', lower: 5, upper: 5, costs: { value: 10 } });
    const boxed = builder.addColumn({
      name: 'work.p0.s1',
      lower: 1,
      upper: 4,
      costs: { value: -1 },
    });
    builder.addRow({ name: 'range', lower: 2.5, upper: 8, entries: [[whole, 1]] });
    builder.addRow({ name: 'free row', entries: [[free, 1]] });
    builder.addRow({
      name: 'least',
      lower: -7,
      entries: [
        [free, 1],
        [below, 0.5],
      ],
    });
    builder.addRow({
      name: 'least',
      upper: 100,
      entries: [
        [fixed, 1],
        [boxed, 1],
      ],
    });
    builder.addOffset('value', 1000);
    // whole 3: 9; free -7 - below / 2 and below -2: -6 and 2; fixed 50; boxed -4; constant 1000.
    expect(solve(writeLp(builder.build(), 'value'))).toBeCloseTo(1051, 6);
  });

  it('keeps a row without entries that nothing can meet', () => {
    const builder = new ModelBuilder('nothing', { value: 'minimise' });
    builder.addColumn({ name: 'x', costs: { value: 1 } });
    builder.addRow({ name: 'pin', lower: 1, upper: 1, entries: [] });
    expect(solve(writeLp(builder.build(), 'value'))).toBeNull();
  });
});
