import { expect, it } from 'vitest';
import { ModelBuilder, writeMps } from '@/modules/model';

function sample(sense: 'minimise' | 'maximise') {
  const builder = new ModelBuilder('sample', { cost: sense });
  const on = builder.addColumn({
    name: 'work(p0,s1)',
    upper: 1,
    isInteger: true,
    costs: { cost: -2.5 },
  });
  const free = builder.addColumn({ name: 'e1', lower: Number.NEGATIVE_INFINITY });
  builder.addColumn({ name: 'alone', lower: 3, upper: 3 });
  builder.addRow({
    name: 'rest(p0)',
    lower: 1,
    upper: 4,
    entries: [
      [on, 1],
      [free, -1],
    ],
  });
  builder.addRow({ name: 'cost', lower: 1, upper: 1, entries: [[on, 1]] });
  builder.addRow({ name: 'most', upper: 0, entries: [[free, 1]] });
  builder.addRow({ name: 'no limit', entries: [[on, 1]] });
  builder.addOffset('cost', 7);
  builder.explain('p0 = Zoë Müller');
  return builder.build();
}

it('writes names as in the LP file, ranges, every bound and the constant as a fixed column', () => {
  expect(writeMps(sample('minimise'), 'cost')).toBe(
    [
      '* sample, objective cost',
      '* p0 = Zoe Muller',
      'NAME roster FREE',
      'ROWS',
      ' N objective_cost',
      ' G rest_p0',
      ' E cost',
      ' L most',
      'COLUMNS',
      ' x_e1 rest_p0 -1',
      ' x_e1 most 1',
      ' alone rest_p0 0',
      ' constant_part objective_cost 7',
      " M1 'MARKER' 'INTORG'",
      ' work_p0_s1 objective_cost -2.5',
      ' work_p0_s1 rest_p0 1',
      ' work_p0_s1 cost 1',
      " M2 'MARKER' 'INTEND'",
      'RHS',
      ' RHS rest_p0 1',
      ' RHS cost 1',
      'RANGES',
      ' RNG rest_p0 3',
      'BOUNDS',
      ' FX BND constant_part 1',
      ' LO BND work_p0_s1 0',
      ' UP BND work_p0_s1 1',
      ' FR BND x_e1',
      ' FX BND alone 3',
      'ENDATA',
      '',
    ].join('\n'),
  );
});

it('turns the signs of an objective that is made greatest', () => {
  const text = writeMps(sample('maximise'), 'cost');
  expect(text).toContain(' work_p0_s1 objective_cost 2.5\n');
  expect(text).toContain(' constant_part objective_cost -7\n');
});
