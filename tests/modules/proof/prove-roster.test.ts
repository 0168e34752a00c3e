import { describe, expect, it } from 'vitest';
import type { PlannedRoster, Problem } from '@/modules/problem';
import { proofRules, proveRoster } from '@/modules/proof';
import { assign, buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';
import { patternCases } from './pattern-cases';
import { type Plan, past, ruleCases } from './rule-cases';

/** The roster of Ione Baptisto; the period starts on Mon 1 Feb 2027. */
const planOf = (problem: Problem, plan: Plan): PlannedRoster =>
  plan.map(([dayIndex, kindId, post]) => assign(problem, 'ione', dayIndex, kindId, post));

const breachesOf = (sketch: ProblemSketch, plan: Plan): { rule: string; sentence: string }[] => {
  const problem = buildProblem(sketch);
  return proveRoster(problem, planOf(problem, plan)).breaches.map(({ rule, sentence }) => ({
    rule,
    sentence,
  }));
};

const cases = [...ruleCases, ...patternCases];

describe('each rule is re-checked', () => {
  it.each(cases)('$title: held', ({ sketch = {}, held }) => {
    expect(breachesOf(sketch, held)).toEqual([]);
  });

  it.each(cases)('$title: broken', ({ rule, sketch = {}, broken, sentence }) => {
    expect(breachesOf(sketch, broken)).toEqual([{ rule, sentence }]);
  });

  it('a pinned shift that nobody works is missed', () => {
    const problem = buildProblem({
      people: [{ pins: [{ dayIndex: 0, shiftIndex: 0, postSkillId: null }] }],
    });
    expect(proveRoster(problem, []).breaches[0]?.sentence).toBe(
      'Ione Baptisto: Mon 1 Feb is pinned to Early, the roster has no shift.',
    );
  });

  it('least hours are asked of people without any shift too', () => {
    const problem = buildProblem({ people: [{ minimumMinutes: 60 }] });
    expect(proveRoster(problem, []).breaches.map(({ rule }) => rule)).toEqual(['contractHours']);
  });

  it('a run that ended before the period is past', () => {
    const history = [-4, -3, -2].map((dayIndex) => past(dayIndex, 420, 900));
    const sketch = { rules: { longestRunDays: 2 }, people: [{ history }] };
    expect(breachesOf(sketch, [[0, 'Early']])).toEqual([]);
  });

  it('a run too long before the period may not go on, and the first day of the period is named', () => {
    const history = [-3, -2, -1].map((dayIndex) => past(dayIndex, 420, 900));
    const problem = buildProblem({ rules: { longestRunDays: 2 }, people: [{ history }] });
    const { breaches } = proveRoster(problem, [assign(problem, 'ione', 0, 'Early')]);
    expect(breaches.map(({ date }) => date)).toEqual(['2027-02-01']);
  });

  it('runs and rest that lie outside the period altogether stand fast', () => {
    const people = [
      {
        history: [-3, -2].map((dayIndex) => past(dayIndex, 420, 900)),
        following: [7, 8, 9].map((dayIndex) => past(dayIndex, 0, 1400)),
      },
    ];
    expect(breachesOf({ rules: { longestRunDays: 1 }, people }, [[3, 'Early']])).toEqual([]);
  });

  it('what breaks a rule with the days after the period is told on the last day within it', () => {
    const following = [past(7, 420, 900)];
    const problem = buildProblem({ rules: { longestRunDays: 1 }, people: [{ following }] });
    const { breaches } = proveRoster(problem, planOf(problem, [[6, 'Late']]));
    expect(breaches.map(({ rule, date }) => [rule, date])).toEqual([
      ['restMinutes', '2027-02-07'],
      ['longestRunDays', '2027-02-07'],
    ]);
  });

  it('rest to the period after is counted in minutes that truly elapse', () => {
    // Clocks go forward in the night to 29 March 2026; instants by the IANA zone database.
    const sketch = {
      startsOn: '2026-03-22',
      zone: 'Europe/Berlin',
      people: [{ following: [past(7, 540, 1020)] }],
    };
    expect(breachesOf(sketch, [[6, 'Late']]).map(({ sentence }) => sentence)).toEqual([
      'Ione Baptisto: Late on Sat 28 Mar ends 23:00 and the shift on Sun 29 Mar starts 10:00, 10 h apart; the least is 11 h.',
    ]);
  });

  it.each([
    ['a person', { personId: 'nobody', shiftIndex: 0, postSkillId: 'nurse' }, 'the person nobody'],
    ['a shift', { personId: 'ione', shiftIndex: 999, postSkillId: 'nurse' }, 'the shift 999'],
    ['a post', { personId: 'ione', shiftIndex: 0, postSkillId: 'pilot' }, 'the post pilot'],
  ])('%s that is unknown is named and counts for nothing', (_, assignment, name) => {
    const problem = buildProblem({ floors: [{}] });
    const proof = proveRoster(problem, [assignment]);
    expect(proof.breaches.map(({ sentence }) => sentence)).toEqual([
      `An assignment names ${name}, unknown in this period.`,
    ]);
    expect(proof.shortageMinutes).toBe(480);
    expect(proof.people.map(({ workedMinutes }) => workedMinutes)).toEqual([0]);
  });

  it('lists every rule once, with the cases looked at', () => {
    const problem = buildProblem({ rules: { nightsPerPeriod: 8 } });
    const proof = proveRoster(
      problem,
      planOf(problem, [
        [0, 'Early'],
        [1, 'Early'],
      ]),
    );
    expect(proof.checked.map(({ rule }) => rule)).toEqual(Object.keys(proofRules));
    const casesOf = (rule: string) => proof.checked.find((line) => line.rule === rule)?.cases;
    expect(casesOf('references')).toBe(2);
    expect(casesOf('restMinutes')).toBe(1);
    expect(casesOf('nightsPerPeriod')).toBe(1);
    expect(casesOf('longestRunDays')).toBe(0);
  });

  it('counts the work of each person', () => {
    const problem = buildProblem({
      people: [
        {
          contractMinutes: 900,
          wishes: [{ dayIndex: 6, shiftIndex: null, wants: 'off', priceCents: 0 }],
        },
        {},
      ],
      rules: { weekendCountsFridayNight: true },
    });
    const proof = proveRoster(
      problem,
      planOf(problem, [
        [4, 'Night'],
        [6, 'Late'],
      ]),
    );
    expect(proof.people).toEqual([
      {
        personId: 'ione',
        workedMinutes: 960,
        overtimeMinutes: 60,
        nights: 1,
        weekends: 1,
        refusedWishes: 1,
      },
      {
        personId: 'person-2',
        workedMinutes: 0,
        overtimeMinutes: 0,
        nights: 0,
        weekends: 0,
        refusedWishes: 0,
      },
    ]);
  });
});
