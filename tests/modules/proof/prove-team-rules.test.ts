import { describe, expect, it } from 'vitest';
import type { TeamRule } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import { assign, buildProblem } from '@/tests/support/problem-builder';

/** Mon 1 Feb 2027 and the three days after it; Ione, Ravi and Gwen are nurses at 25.00 an hour. */
const people = [
  { id: 'ione', name: 'Ione' },
  { id: 'ravi', name: 'Ravi' },
  { id: 'gwen', name: 'Gwen' },
];
type Plan = readonly (readonly [personId: string, dayIndex: number, kindId: string])[];

const prove = (
  rule: TeamRule,
  plan: Plan,
  sketch: Parameters<typeof buildProblem>[0] = {},
): Proof => {
  const problem = buildProblem({
    dayCount: 4,
    people,
    rules: { restMinutes: 0 },
    teamRules: [rule],
    ...sketch,
  });
  return proveRoster(
    problem,
    plan.map(([personId, dayIndex, kindId]) => assign(problem, personId, dayIndex, kindId)),
  );
};

const sentences = (proof: Proof) => proof.breaches.map(({ sentence }) => sentence);
const firm = { id: 'rule', name: 'Pair', priceCents: null };

describe('together', () => {
  const rule: TeamRule = { ...firm, kind: 'together', personIds: ['ione', 'ravi'] };
  it.each<[string, Plan, number]>([
    ['nobody', [], 0],
    [
      'both on one shift',
      [
        ['ione', 0, 'Early'],
        ['ravi', 0, 'Early'],
      ],
      0,
    ],
    ['others do as they like', [['gwen', 0, 'Early']], 0],
    ['one alone', [['ravi', 0, 'Early']], 1],
    [
      'each on another shift of the day',
      [
        ['ione', 0, 'Early'],
        ['ravi', 0, 'Late'],
      ],
      2,
    ],
  ])('%s', (_, plan, units) => {
    const proof = prove(rule, plan);
    expect(proof.teamRuleUnits).toBe(units);
    expect(proof.breaches).toHaveLength(units);
  });

  it('is explained with both names, shift and date', () => {
    const { breaches } = prove(rule, [['ravi', 1, 'Late']]);
    expect(breaches).toEqual([
      {
        rule: 'teamRules',
        personId: 'ravi',
        date: '2027-02-02',
        sentence: 'Pair: Ravi is on Late on Tue 2 Feb and Ione is not; both or neither may be.',
      },
    ]);
  });
});

describe('apart', () => {
  const rule: TeamRule = { ...firm, kind: 'apart', personIds: ['ione', 'ravi', 'gwen'] };
  it.each<[string, Plan, number]>([
    [
      'shifts that touch',
      [
        ['ione', 0, 'Early'],
        ['ravi', 0, 'Late'],
      ],
      0,
    ],
    // Both are on duty at 07:00 and at 09:00, when the Day starts; at 15:00 nobody is.
    [
      'one shift, within which another starts',
      [
        ['ione', 0, 'Early'],
        ['ravi', 0, 'Early'],
      ],
      2,
    ],
    // 09:00: Ione still, Ravi just.
    [
      'shifts that overlap',
      [
        ['ione', 0, 'Early'],
        ['ravi', 0, 'Day'],
      ],
      1,
    ],
    [
      'all three at 07:00 and 09:00',
      [
        ['ione', 0, 'Early'],
        ['ravi', 0, 'Early'],
        ['gwen', 0, 'Early'],
      ],
      4,
    ],
    // 23:00 alone: the Early of the next day starts as the Night ends.
    [
      'a Night of two past midnight',
      [
        ['ione', 0, 'Night'],
        ['ravi', 0, 'Night'],
        ['gwen', 1, 'Early'],
      ],
      1,
    ],
  ])('%s', (_, plan, units) => {
    expect(prove(rule, plan).teamRuleUnits).toBe(units);
  });

  it('is told once for the same people on a day, from the first minute on', () => {
    const plan: Plan = [
      ['ione', 0, 'Early'],
      ['ravi', 0, 'Early'],
      ['gwen', 0, 'Day'],
    ];
    expect(sentences(prove(rule, plan))).toEqual([
      'Pair: Ione and Ravi are on duty together on Mon 1 Feb at 07:00; the most is 1 of them.',
      'Pair: Gwen, Ione and Ravi are on duty together on Mon 1 Feb at 09:00; the most is 1 of them.',
    ]);
  });
});

describe('at most so many free', () => {
  const rule: TeamRule = {
    ...firm,
    name: 'Leads',
    kind: 'mostFree',
    personIds: ['ione', 'ravi'],
    most: 1,
  };
  const allDays = [0, 1, 2, 3].map((day) => ['ione', day, 'Early'] as const);

  it('is kept when one of two is there every day', () => {
    expect(prove(rule, allDays)).toMatchObject({ teamRuleUnits: 0, breaches: [] });
  });

  it('counts each person too many on each day, and a night only for the day it starts on', () => {
    const proof = prove({ ...rule, most: 0 }, [...allDays.slice(1), ['ravi', 0, 'Night']]);
    expect(proof.teamRuleUnits).toBe(4);
    expect(sentences(proof)[1]).toBe('Leads: 1 of 2 are free on Tue 2 Feb (Ravi); the most is 0.');
  });

  it('counts days of leave as free', () => {
    const away = { startMinute: 0, endMinute: 4 * 1440, reason: 'Leave' };
    const onLeave = people.map((person) => ({ ...person, absences: [away] }));
    const proof = prove(rule, [], { people: onLeave });
    expect(proof.teamRuleUnits).toBe(4);
    expect(sentences(proof)[0]).toBe(
      'Leads: 2 of 2 are free on Mon 1 Feb (Ione and Ravi); the most is 1.',
    );
  });
});

describe('budget', () => {
  // Contracts of 40 h at 25.00 for three people: 3,000.00.
  const rule = (mostCents: number): TeamRule => ({
    ...firm,
    name: 'February',
    kind: 'budget',
    mostCents,
  });

  it('takes ordinary pay, premiums and overtime, and is kept to the cent', () => {
    const kinds = [{ id: 'Early', startMinute: 420, endMinute: 900, nightMinutes: 60 }];
    const plan: Plan = [['ione', 0, 'Early']];
    expect(prove(rule(300_625), plan, { kinds }).teamRuleUnits).toBe(0);
    expect(prove(rule(300_624), plan, { kinds }).teamRuleUnits).toBe(1);
  });

  it('leaves prices of floors and wishes out', () => {
    const proof = prove(rule(300_000), [], { floors: [{ priceCentsPerHour: 100 }] });
    expect(proof).toMatchObject({ costCents: 300_800, teamRuleUnits: 0 });
  });

  it('is told with the figures, and without them for those who may not see pay', () => {
    expect(prove(rule(250_000), []).breaches).toEqual([
      {
        rule: 'teamRules',
        personId: '',
        date: '2027-02-01',
        sentence: 'February: the pay is €3,000.00; the most is €2,500.00.',
        sentenceWithoutPay: 'February: the pay is above the budget.',
      },
    ]);
  });
});

describe('any linear rule', () => {
  const rule = (least: number | null, most: number | null): TeamRule => ({
    ...firm,
    name: 'Keys',
    kind: 'linear',
    terms: [
      { personId: 'ione', shiftIndex: 4, coefficient: 2 },
      { personId: 'ravi', shiftIndex: 4, coefficient: -3 },
    ],
    least,
    most,
  });
  const [ione, ravi] = [['ione', 1, 'Early'] as const, ['ravi', 1, 'Early'] as const];
  it.each<[string, Plan, number | null, number | null, number]>([
    ['at the most', [ione], null, 2, 0],
    ['above the most', [ione], null, 0, 2],
    ['at the least', [ravi], -3, null, 0],
    ['below the least', [ravi], 0, 5, 3],
    ['both cancel in part', [ione, ravi], -1, -1, 0],
    ['nobody, within no limits', [], null, null, 0],
    ['nobody, below the least', [], 1, null, 1],
    ['a shift that is not named', [['ione', 1, 'Late']], 0, 0, 0],
  ])('%s', (_, plan, least, most, units) => {
    expect(prove(rule(least, most), plan).teamRuleUnits).toBe(units);
  });

  it('is told with its sum and limit on the first of its days', () => {
    expect(prove(rule(null, 1), [ione]).breaches).toMatchObject([
      { personId: 'ione', date: '2027-02-02', sentence: 'Keys: comes to 2; the most is 1.' },
    ]);
    expect(sentences(prove(rule(0, null), [ravi]))).toEqual(['Keys: comes to -3; the least is 0.']);
  });
});

it('a rule with a price costs its units and is no breach', () => {
  const rule: TeamRule = {
    id: 'rule',
    name: 'Pair',
    priceCents: 250,
    kind: 'together',
    personIds: ['ione', 'ravi'],
  };
  const proof = prove(rule, [
    ['ione', 0, 'Early'],
    ['ravi', 0, 'Late'],
  ]);
  expect(proof).toMatchObject({
    teamRuleUnits: 0,
    teamRuleCents: 500,
    costCents: 300_500,
    breaches: [],
  });
});

it('counts the places that were looked at', () => {
  const casesOf = (rule: TeamRule) =>
    prove(rule, []).checked.find((line) => line.rule === 'teamRules')?.cases;
  expect(casesOf({ ...firm, kind: 'together', personIds: ['ione', 'ravi'] })).toBe(16);
  expect(casesOf({ ...firm, kind: 'apart', personIds: ['ione', 'ravi'] })).toBe(16);
  expect(casesOf({ ...firm, kind: 'mostFree', personIds: ['ione'], most: 1 })).toBe(4);
  expect(casesOf({ ...firm, kind: 'budget', mostCents: 1 })).toBe(1);
});
