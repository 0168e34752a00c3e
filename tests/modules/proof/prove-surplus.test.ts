import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlannedRoster, Problem, ProblemCeiling } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import { assign, buildProblem } from '@/tests/support/problem-builder';

const people = [
  { id: 'ione', skillIds: ['nurse'] },
  { id: 'ravi', skillIds: ['nurse', 'desk'] },
  { id: 'gwen', skillIds: ['desk'] },
];

type Plan = readonly (readonly [personId: string, kindId: string, postSkillId: string])[];

const prove = (ceilings: readonly Partial<ProblemCeiling>[], plan: Plan, dayIndex = 0): Proof => {
  const problem = buildProblem({ ceilings, people });
  return proveRoster(
    problem,
    plan.map(([personId, kindId, post]) => assign(problem, personId, dayIndex, kindId, post)),
  );
};

const twoEarly = [
  ['ione', 'Early', 'nurse'],
  ['ravi', 'Early', 'nurse'],
] as const;

describe('firm ceilings', () => {
  it('are kept by as many people as they take', () => {
    expect(prove([{}], twoEarly.slice(0, 1))).toMatchObject({ surplusMinutes: 0, surpluses: [] });
  });

  it('are passed over the whole window, named by date, window and skill', () => {
    const proof = prove([{ people: 0 }], twoEarly);
    expect(proof.surpluses).toEqual([
      {
        ceilingId: 'ceiling-1',
        skillId: 'nurse',
        date: '2027-02-01',
        startMinute: 420,
        endMinute: 900,
        surplusPeople: 2,
        isFirm: true,
      },
    ]);
    expect(proof).toMatchObject({ surplusMinutes: 960, pricedSurplusMinutes: 0, costCents: 3e5 });
    expect(proof.breaches).toEqual([]);
  });

  it.each([
    ['a shift that ends as the window begins', { startMinute: 900, endMinute: 1000 }, 0],
    ['a shift that starts as the window ends', { startMinute: 300, endMinute: 420 }, 0],
    ['a shift that reaches one minute into it', { startMinute: 899, endMinute: 1000 }, 1],
    ['a window within the shift', { startMinute: 500, endMinute: 560 }, 60],
  ])('%s', (_, window, minutes) => {
    expect(prove([{ ...window, people: 0 }], twoEarly.slice(0, 1)).surplusMinutes).toBe(minutes);
  });

  it('run past midnight with the day they belong to', () => {
    const ceiling = { dayIndex: 1, startMinute: 1440 + 1320, endMinute: 2 * 1440 + 480, people: 0 };
    const { surpluses } = prove([ceiling], [['ione', 'Night', 'nurse']], 1);
    expect(surpluses).toMatchObject([
      { date: '2027-02-02', startMinute: 1440 + 1380, endMinute: 1440 + 1860 },
    ]);
  });
});

describe('who counts', () => {
  const plan = [
    ['ione', 'Early', 'nurse'],
    ['ravi', 'Early', 'desk'],
    ['gwen', 'Early', 'desk'],
  ] as const;
  it.each([
    ['seated, in the post', { skillId: 'nurse', counting: 'seated' }, 1],
    ['seated, any post', { skillId: null, counting: 'seated' }, 3],
    ['shared, everybody who holds the skill', { skillId: 'nurse', counting: 'shared' }, 2],
    ['shared, everybody', { skillId: null, counting: 'shared' }, 3],
  ] as const)('%s', (_, ceiling, count) => {
    expect(prove([{ ...ceiling, people: 0 }], plan).surplusMinutes).toBe(count * 480);
  });

  it('each ceiling stands alone: two of one time are both passed', () => {
    expect(prove([{ people: 0 }, { people: 1 }], twoEarly).surplusMinutes).toBe(960 + 480);
  });
});

describe('priced ceilings', () => {
  it('cost the minutes too many, rounded once for each stretch', () => {
    // 100 minutes of one too many and 20 of two: 100 x 17 / 60 = 28.33 and 40 x 17 / 60 = 11.33.
    const ceiling = { startMinute: 440, endMinute: 560, people: 0, priceCentsPerHour: 17 };
    const proof = prove(
      [ceiling],
      [
        ['ione', 'Early', 'nurse'],
        ['ravi', 'Day', 'nurse'],
      ],
    );
    expect(proof).toMatchObject({
      surplusMinutes: 0,
      pricedSurplusMinutes: 140,
      pricedSurplusCents: 28 + 11,
      costCents: 3e5 + 39,
    });
    expect(proof.surpluses.map(({ isFirm, surplusPeople }) => [isFirm, surplusPeople])).toEqual([
      [false, 1],
      [false, 2],
    ]);
  });
});

/** By the definition, one minute and one ceiling at a time. */
function countPlainly(problem: Problem, roster: PlannedRoster) {
  const result = { surplusMinutes: 0, pricedSurplusMinutes: 0, pricedSurplusCents: 0 };
  for (let minute = 0; minute < 60; minute += 1) {
    const isOn = (window: { startMinute: number; endMinute: number } | undefined) =>
      window !== undefined && window.startMinute <= minute && minute < window.endMinute;
    const onDuty = roster.filter(({ shiftIndex }) => isOn(problem.shifts[shiftIndex]));
    for (const ceiling of problem.ceilings.filter(isOn)) {
      const { skillId, counting, priceCentsPerHour } = ceiling;
      const counted = onDuty.filter(({ personId, postSkillId }) => {
        const held = people.find(({ id }) => id === personId)?.skillIds ?? [];
        return (
          skillId === null ||
          (counting === 'seated' ? postSkillId === skillId : held.includes(skillId))
        );
      });
      const surplus = Math.max(0, counted.length - ceiling.people);
      if (priceCentsPerHour === null) result.surplusMinutes += surplus;
      else {
        result.pricedSurplusMinutes += surplus;
        result.pricedSurplusCents += (surplus * priceCentsPerHour) / 60;
      }
    }
  }
  return result;
}

it('any ceilings and any roster come to the same as a plain count', () => {
  const kinds = [
    { id: 'A', startMinute: 0, endMinute: 10 },
    { id: 'B', startMinute: 5, endMinute: 20 },
    { id: 'C', startMinute: 12, endMinute: 30 },
  ];
  const ceilings = fc.array(
    fc
      .record({
        startMinute: fc.nat(25),
        length: fc.integer({ min: 1, max: 15 }),
        people: fc.nat(2),
        skillId: fc.constantFrom('nurse', 'desk', null),
        counting: fc.constantFrom('seated' as const, 'shared' as const),
        priceCentsPerHour: fc.constantFrom(null, 60, 120),
      })
      .map(({ length, ...one }) => ({ ...one, endMinute: one.startMinute + length })),
    { maxLength: 4 },
  );
  const roster = fc.array(
    fc.record({
      personId: fc.constantFrom('ione', 'ravi', 'gwen'),
      shiftIndex: fc.nat(2),
      postSkillId: fc.constantFrom('nurse', 'desk'),
    }),
    { maxLength: 6 },
  );
  fc.assert(
    fc.property(ceilings, roster, (asked, planned) => {
      const problem = buildProblem({ kinds, people, dayCount: 1, ceilings: asked });
      expect(proveRoster(problem, planned)).toMatchObject(countPlainly(problem, planned));
    }),
    { numRuns: 300 },
  );
});
