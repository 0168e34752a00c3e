import { expect, test } from 'vitest';
import { ruleLines } from '@/modules/roster/rule-lines';
import { buildProblem, buildRules, type ProblemSketch } from '@/tests/support/problem-builder';

const linesOf = (sketch: ProblemSketch): string[] =>
  ruleLines(buildProblem(sketch)).map(({ label, limit }) => `${label}: ${limit}`);

test('each rule that is on is told with its limit and its source', () => {
  const rules = {
    longestRunDays: 5,
    longestRunNights: 1,
    weekendsPerPeriod: 3,
  };
  expect(linesOf({ rules })).toEqual([
    'Rest between shifts: 11 h',
    'Days in a row, at most: 5 days',
    'Nights in a row, at most: 1 night',
    'Weekends worked in a period, at most: 3 weekends',
  ]);
  expect(ruleLines(buildProblem({ rules }))[0]?.source).toContain('2003/88/EC');
});

test('shortest runs and kinds that may not follow are told by their names', () => {
  const rules = {
    shortestRunDays: 2,
    shortestRunFreeDays: 1,
    kindsThatMayNotFollow: [
      { kindId: 'Late', nextKindId: 'Early' },
      { kindId: 'Night', nextKindId: 'gone' },
    ],
  };
  expect(linesOf({ rules }).slice(1)).toEqual([
    'Days in a row, at least: 2 days',
    'Days off in a row, at least: 1 day',
    'Never on the next day: Late before Early, Night before gone',
  ]);
});

test('people with limits of their own are counted', () => {
  const people = [
    { rules: buildRules(), kindLimits: [{ kindId: 'Night', most: 1 }] },
    { rules: buildRules() },
    {},
  ];
  expect(linesOf({ people }).slice(1)).toEqual([
    'Limits of their own in place of these: 2 people',
    'Most shifts of a kind: 1 person',
  ]);
});

test('firm rules that join people are told, a budget without its amount, priced ones are not', () => {
  const pair: [string, string] = ['ione', 'ravi'];
  const terms = [{ personId: 'ione', shiftIndex: 0, coefficient: 1 }];
  const common = { priceCents: null };
  const teamRules: ProblemSketch['teamRules'] = [
    { ...common, id: '1', name: 'Mentor', kind: 'together', personIds: pair },
    { ...common, id: '2', name: 'Siblings', kind: 'apart', personIds: pair },
    { ...common, id: '3', name: 'Leads', kind: 'mostFree', personIds: pair, most: 1 },
    { ...common, id: '4', name: 'Budget', kind: 'budget', mostCents: 100 },
    { ...common, id: '5', name: 'Keys', kind: 'linear', terms, least: 0, most: 1 },
    { ...common, id: '6', name: 'Spare keys', kind: 'linear', terms, least: null, most: 1 },
    { id: '7', name: 'Liked', kind: 'apart', personIds: pair, priceCents: 5 },
  ];
  expect(linesOf({ teamRules }).slice(1)).toEqual([
    'Mentor: both or neither',
    'Siblings: never at once',
    'Leads: 1 free',
    'Budget: pay',
    'Keys: least 0, most 1',
    'Spare keys: most 1',
  ]);
});
