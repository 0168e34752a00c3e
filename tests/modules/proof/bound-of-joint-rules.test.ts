import { describe, expect, it } from 'vitest';
import type { Problem } from '@/modules/problem';
import { proveBound } from '@/modules/proof';
import { buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';
import { boundOf, emptyRecord, nothing, oneEarly } from './bound-of';

describe('rules that join people', () => {
  const two = (sketch: ProblemSketch): Problem =>
    oneEarly({
      people: [
        { paidBy: 'hours', minimumMinutes: 480 },
        { paidBy: 'hours', skillIds: ['desk'] },
      ],
      ...sketch,
    });

  it('a firm pair: who comes brings the other along', () => {
    const problem = two({
      teamRules: [
        {
          id: 'pair',
          name: 'Pair',
          kind: 'together',
          personIds: ['ione', 'person-2'],
          priceCents: null,
        },
      ],
    });
    expect(boundOf(problem, {})).toBe(20_000);
    expect(boundOf(problem, { teamRules: [{ ruleId: 'pair', at: 0, cents: -20_000 }] })).toBe(
      40_000,
    );
  });

  it('a firm pair: the second brings the first along too', () => {
    const problem = two({
      people: [{ paidBy: 'hours' }, { paidBy: 'hours', skillIds: ['desk'], minimumMinutes: 480 }],
      teamRules: [
        {
          id: 'pair',
          name: 'Pair',
          kind: 'together',
          personIds: ['ione', 'person-2'],
          priceCents: null,
        },
      ],
    });
    expect(boundOf(problem, { teamRules: [{ ruleId: 'pair', at: 0, cents: 20_000 }] })).toBe(
      40_000,
    );
  });

  it('a pair with a price: no more than the price', () => {
    const problem = two({
      teamRules: [
        {
          id: 'pair',
          name: 'Pair',
          kind: 'together',
          personIds: ['ione', 'person-2'],
          priceCents: 300,
        },
      ],
    });
    const at = (cents: number) =>
      boundOf(problem, { teamRules: [{ ruleId: 'pair', at: 0, cents }] });
    expect(at(-300)).toBe(20_300);
    expect(at(-500)).toBe(20_300);
    expect(at(-20_500)).toBe(19_800);
  });

  it('apart: the second on duty is one too many', () => {
    const both = [
      { paidBy: 'hours' as const, minimumMinutes: 480 },
      { paidBy: 'hours' as const, minimumMinutes: 480 },
    ];
    const rule = { id: 'apart', name: 'Apart', kind: 'apart' as const, priceCents: 300 };
    const problem = two({
      people: both,
      teamRules: [{ ...rule, personIds: ['ione', 'person-2'] }],
    });
    const at = (cents: number) =>
      boundOf(problem, { teamRules: [{ ruleId: 'apart', at: 420, cents }] });
    expect([at(0), at(-300), at(-600), at(100)]).toEqual([40_000, 40_300, 40_300, 39_800]);
  });

  it('at most so many free: somebody has to come', () => {
    const rule = { id: 'free', name: 'Free', kind: 'mostFree' as const };
    const free = [
      { paidBy: 'hours' as const },
      { paidBy: 'hours' as const },
      { paidBy: 'hours' as const },
    ];
    const at = (most: number, priceCents: number | null, cents: number) => {
      const personIds = ['ione', 'person-2', 'person-3'];
      const problem = two({
        people: free,
        teamRules: [{ ...rule, personIds, most, priceCents }],
      });
      return boundOf(problem, { teamRules: [{ ruleId: 'free', at: 0, cents }] });
    };
    expect(at(1, null, 20_000)).toBe(40_000);
    expect(at(0, null, 20_000)).toBe(60_000);
    expect(at(1, 700, 700)).toBe(1400);
    expect(at(3, null, 20_000)).toBe(0);
  });

  it('any linear rule, from below and from above', () => {
    const at = (least: number | null, most: number | null, cents: number) => {
      const terms = [
        { personId: 'ione', shiftIndex: 0, coefficient: 1 },
        { personId: 'person-2', shiftIndex: 0, coefficient: 3 },
      ];
      const problem = two({
        teamRules: [{ id: 'l', name: 'L', kind: 'linear', terms, least, most, priceCents: 1000 }],
      });
      return boundOf(problem, { teamRules: [{ ruleId: 'l', at: null, cents }] });
    };
    // Ione comes and counts 1. Two units below the least, or one above the most.
    expect(at(3, null, 1000)).toBe(22_000);
    expect(at(null, 0, -1000)).toBe(21_000);
    expect(at(1, 1, 500)).toBe(20_000);
  });

  it('a budget with a price: pay counts more, and the budget is given back', () => {
    const problem = two({
      teamRules: [
        { id: 'budget', name: 'Budget', kind: 'budget', mostCents: 15_000, priceCents: 1 },
      ],
    });
    const at = (cents: number) =>
      boundOf(problem, { teamRules: [{ ruleId: 'budget', at: null, cents }] });
    expect(at(0)).toBe(20_000);
    expect(at(-1)).toBe(25_000);
    // Beyond the price of the rule, and on the wrong side, the nearest figure of use is taken.
    expect(at(-7)).toBe(25_000);
    expect(at(3)).toBe(20_000);
  });

  it('a firm rule that nobody can keep is told', () => {
    const problem = two({
      teamRules: [
        {
          id: 'keys',
          name: 'Keys',
          kind: 'linear',
          terms: [{ personId: 'ione', shiftIndex: 0, coefficient: 1 }],
          least: 2,
          most: null,
          priceCents: null,
        },
      ],
    });
    const record = { ...emptyRecord, teamRules: [{ ruleId: 'keys', at: null, cents: 1 }] };
    expect(proveBound(problem, record, nothing)).toEqual({
      kind: 'refused',
      sentence: 'No roster can keep the rule Keys.',
    });
  });
});

describe('a spread of fairness', () => {
  // Ione must work two of two nights, Ravi none may.
  const problem = buildProblem({
    dayCount: 2,
    kinds: [{ id: 'Night', startMinute: 1380, endMinute: 1860, isNight: true }],
    people: [
      { paidBy: 'hours', payCentsPerHour: 0, minimumMinutes: 960 },
      { id: 'ravi', paidBy: 'hours', payCentsPerHour: 0, mayWorkNights: false },
    ],
    fairness: [{ kind: 'spread', measure: 'nights', priceCents: 500 }],
  });
  const share = (personId: string, mostCents: number, leastCents: number) => ({
    term: 0,
    personId,
    mostCents,
    leastCents,
  });

  it('is reached when the person with most and the one with least take the whole price', () => {
    expect(boundOf(problem, { spreads: [share('ione', 500, 0), share('ravi', 0, 500)] })).toBe(
      1000,
    );
  });

  it('holds when the shares are less than the price', () => {
    expect(boundOf(problem, { spreads: [share('ione', 200, 0), share('ravi', 0, 300)] })).toBe(400);
    // More of the least than the price is worth nothing more, more of the most takes some away.
    expect(boundOf(problem, { spreads: [share('ione', 500, 0), share('ravi', 0, 700)] })).toBe(
      1000,
    );
    expect(boundOf(problem, { spreads: [share('ione', 600, 0), share('ravi', 0, 500)] })).toBe(
      1000,
    );
    expect(boundOf(problem, { spreads: [share('ione', 600, 0), share('ravi', 0, 600)] })).toBe(
      1000,
    );
    // Without a share of the least, the person with least might have as many as the one with most.
    expect(boundOf(problem, { spreads: [share('ione', 500, 0)] })).toBe(0);
  });
});
