import { expect, test } from 'vitest';
import { proveRoster } from '@/modules/proof';
import { withoutPay } from '@/modules/roster/hide-pay';
import { assign, buildProblem } from '@/tests/support/problem-builder';

/** A roster that costs something in every way there is, and breaks a budget and a run. */
const problem = buildProblem({
  people: [
    {
      contractMinutes: 60,
      wishes: [{ dayIndex: 0, shiftIndex: null, wants: 'off', priceCents: 5 }],
    },
    {},
  ],
  kinds: [{ id: 'Night', startMinute: 1380, endMinute: 1860, isNight: true, nightMinutes: 420 }],
  floors: [{ priceCentsPerHour: 100 }],
  ceilings: [{ startMinute: 1380, endMinute: 1860, people: 0, priceCentsPerHour: 100 }],
  rules: { longestRunDays: 1 },
  teamRules: [
    { id: 'b', name: 'February', kind: 'budget', mostCents: 100, priceCents: null },
    { id: 'm', name: 'Leads', kind: 'mostFree', personIds: ['ione'], most: 0, priceCents: 7 },
  ],
  fairness: [
    { kind: 'spread', measure: 'nights', priceCents: 3 },
    { kind: 'share', measure: 'nights', steps: [{ above: 0, priceCents: 2 }] },
  ],
});
const proof = proveRoster(problem, [
  assign(problem, 'ione', 0, 'Night'),
  assign(problem, 'ione', 1, 'Night'),
]);

test('no amount of money is left in a proof for those who may not see pay', () => {
  const amounts = Object.entries(proof).filter(([field]) => field.endsWith('Cents'));
  expect(amounts.filter(([, cents]) => cents === 0)).toEqual([]);
  const hidden = withoutPay(proof);
  const left = Object.entries(hidden).filter(([field]) => field.endsWith('Cents'));
  expect(left).toHaveLength(amounts.length);
  expect(left.filter(([, cents]) => cents !== 0)).toEqual([]);
  expect([proof.teamRuleUnits > 0, hidden.teamRuleUnits]).toEqual([true, 0]);
});

test('what became of the bound is pay, and is left out as a whole', () => {
  const bound = { recheckedCents: 1, solverCents: 2, sentence: 'No roster can cost less.' };
  expect(withoutPay({ ...proof, bound })).not.toHaveProperty('bound');
});

test('sentences that tell of pay leave it out, others stay', () => {
  expect(withoutPay(proof).breaches.map(({ sentence }) => sentence)).toEqual([
    'Ione Baptisto: 2 days in a row, Mon 1 Feb to Tue 2 Feb; the most is 1.',
    'February: the pay is above the budget.',
  ]);
  expect(JSON.stringify(withoutPay(proof))).not.toContain('€');
});
