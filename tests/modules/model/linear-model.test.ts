import { describe, expect, it } from 'vitest';
import { ModelBuilder, objectiveOf, relaxed, withBlend, withRowBounds } from '@/modules/model';

function sample() {
  const builder = new ModelBuilder('sample', { one: 'minimise', other: 'maximise' });
  const x = builder.addColumn({ name: 'x', costs: { one: 2 } });
  const y = builder.addColumn({
    name: 'y',
    lower: -1,
    upper: 4,
    isInteger: true,
    costs: { other: 3 },
  });
  builder.addRow({ name: 'free', entries: [] });
  builder.addRow({
    name: 'both',
    lower: 1,
    upper: 5,
    entries: [
      [x, 1],
      [y, -2],
    ],
  });
  builder.addOffset('one', 10);
  builder.addOffset('one', 5);
  return builder.build();
}

describe('a linear model', () => {
  it('packs columns, rows and objectives into arrays', () => {
    const infinity = Number.POSITIVE_INFINITY;
    expect(sample()).toEqual({
      name: 'sample',
      legend: [],
      columnNames: ['x', 'y'],
      columnLower: Float64Array.of(0, -1),
      columnUpper: Float64Array.of(infinity, 4),
      isInteger: Uint8Array.of(0, 1),
      rowNames: ['free', 'both'],
      rowLower: Float64Array.of(-infinity, 1),
      rowUpper: Float64Array.of(infinity, 5),
      starts: Int32Array.of(0, 0, 2),
      indices: Int32Array.of(0, 1),
      values: Float64Array.of(1, -2),
      objectives: {
        one: { sense: 'minimise', offset: 15, costs: Float64Array.of(2, 0) },
        other: { sense: 'maximise', offset: 0, costs: Float64Array.of(0, 3) },
      },
    });
  });

  it('stays as it is when a changed copy is made', () => {
    const model = sample();
    expect(withRowBounds(model, 1, 2, 3).rowUpper).toEqual(
      Float64Array.of(Number.POSITIVE_INFINITY, 3),
    );
    expect(relaxed(model).isInteger).toEqual(Uint8Array.of(0, 0));
    expect(model).toEqual(sample());
  });

  it('blends two objectives, constants included', () => {
    const blend = objectiveOf(
      withBlend(sample(), 'blend', [
        ['one', 100],
        ['other', 1],
      ]),
      'blend',
    );
    expect(blend).toEqual({ sense: 'minimise', offset: 1500, costs: Float64Array.of(200, 3) });
  });

  it('refuses an objective it does not have', () => {
    expect(() => objectiveOf(sample(), 'third')).toThrow(
      'The model sample has no objective third.',
    );
  });
});
