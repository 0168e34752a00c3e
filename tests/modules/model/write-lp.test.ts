import { expect, it } from 'vitest';
import { buildRosterModel, ModelBuilder, withRowBounds, writeLp } from '@/modules/model';
import { buildFloor, buildProblem } from '@/tests/support/problem-builder';

it('writes a model with safe names, ranges as two rows, and the constant as a fixed column', () => {
  const builder = new ModelBuilder('sample', { cost: 'minimise' });
  const on = builder.addColumn({
    name: 'work(p0,s1)',
    upper: 1,
    isInteger: true,
    costs: { cost: -2.5 },
  });
  const free = builder.addColumn({ name: 'e1', lower: Number.NEGATIVE_INFINITY });
  builder.addRow({
    name: 'rest(p0)',
    lower: 1,
    upper: 4,
    entries: [
      [on, 1],
      [free, -1],
    ],
  });
  builder.addRow({ name: 'pin', lower: 1, upper: 1, entries: [[on, 1]] });
  builder.addRow({ name: 'no limit', entries: [[on, 1]] });
  builder.addOffset('cost', 7);
  builder.explain('p0 = Zoë Müller');
  expect(writeLp(builder.build(), 'cost')).toBe(
    [
      '\\ sample, objective cost',
      '\\ p0 = Zoe Muller',
      'Minimize',
      '  cost: - 2.5 work_p0_s1 + 7 constant_part',
      'Subject To',
      '  rest_p0_from: + 1 work_p0_s1 - 1 x_e1 >= 1',
      '  rest_p0_to: + 1 work_p0_s1 - 1 x_e1 <= 4',
      '  pin: + 1 work_p0_s1 = 1',
      'Bounds',
      ' constant_part = 1',
      ' 0 <= work_p0_s1 <= 1',
      ' x_e1 free',
      'General',
      '  work_p0_s1',
      'End',
      '',
    ].join('\n'),
  );
});

it('keeps every line of a roster model short and explains its names', () => {
  const floors = Array.from({ length: 7 }, (_, day) =>
    buildFloor({ startMinute: day * 1440 + 420, endMinute: day * 1440 + 900 }),
  );
  const model = buildRosterModel(
    buildProblem({ people: Array.from({ length: 12 }, () => ({})), floors }),
  );
  const stageTwo = withRowBounds(model.linear, model.levels[0]?.row ?? -1, 0, 0);
  const lines = writeLp(stageTwo, 'cost').split('\n');
  expect(Math.max(...lines.map(({ length }) => length))).toBeLessThan(250);
  expect(lines).toContain('\\ p0 = Ione Baptisto');
  expect(lines).toContain('\\ s4 = 2027-02-02 Early');
  expect(lines.filter((line) => line.startsWith('  shortage1:'))).toHaveLength(1);
});
