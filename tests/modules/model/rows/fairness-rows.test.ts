import { describe, expect, it } from 'vitest';
import { buildRosterModel, completeValues, placeRoster, weighRoster } from '@/modules/model';
import type { FairnessTerm, ProblemPerson } from '@/modules/problem';
import { assign, buildProblem } from '@/tests/support/problem-builder';

type Planned = readonly (readonly [personId: string, dayIndex: number, kindId: string])[];

const free = { contractMinutes: 0, paidBy: 'hours' as const, payCentsPerHour: 0 };

/** Cost of a roster of two people in two weeks, of whom nobody is paid: fairness alone. */
function cost(
  fairness: FairnessTerm[],
  planned: Planned,
  people: readonly Partial<ProblemPerson>[] = [{}, {}],
): number {
  const problem = buildProblem({
    dayCount: 14,
    fairness,
    people: people.map((person) => ({ ...free, ...person })),
  });
  const model = buildRosterModel(problem);
  const roster = planned.map(([person, day, kind]) => assign(problem, person, day, kind));
  return weighRoster(model, placeRoster(model, roster)).costCents;
}

const nights: Planned = [
  ['ione', 0, 'Night'],
  ['ione', 1, 'Night'],
  ['ione', 2, 'Night'],
  ['person-2', 0, 'Night'],
];

describe('a spread', () => {
  const spread = (measure: 'nights' | 'weekends' | 'refusedWishes'): FairnessTerm[] => [
    { kind: 'spread', measure, priceCents: 500 },
  ];
  it('costs its price for each Night between most and least', () => {
    expect(cost(spread('nights'), nights)).toBe(1000);
    expect(cost(spread('nights'), [])).toBe(0);
  });
  it('counts weekends, not the days of them', () => {
    // Days 5 and 6 are one weekend, 12 another.
    const weekends: Planned = [
      ['ione', 5, 'Early'],
      ['ione', 6, 'Early'],
      ['ione', 12, 'Early'],
    ];
    expect(cost(spread('weekends'), weekends)).toBe(1000);
    expect(cost(spread('weekends'), [...weekends, ['person-2', 13, 'Early']])).toBe(500);
  });
  it('counts wishes that are not granted, those for a shift too', () => {
    const on = { dayIndex: 0, shiftIndex: 0, wants: 'on' as const, priceCents: 0 };
    const off = { dayIndex: 1, shiftIndex: null, wants: 'off' as const, priceCents: 0 };
    const people = [{ wishes: [on, off] }, {}];
    expect(cost(spread('refusedWishes'), [], people)).toBe(500);
    expect(cost(spread('refusedWishes'), [['ione', 0, 'Early']], people)).toBe(0);
    expect(cost(spread('refusedWishes'), [['ione', 1, 'Late']], people)).toBe(1000);
  });
  it('is nothing with fewer than two people, and leaves outside cover out', () => {
    expect(cost(spread('nights'), [['ione', 0, 'Night']], [{}])).toBe(0);
    expect(cost(spread('nights'), nights, [{}, { isOutside: true }])).toBe(0);
    expect(cost(spread('nights'), nights, [{}, {}, { isOutside: true }])).toBe(1000);
  });
});

describe('a share', () => {
  const share: FairnessTerm[] = [
    {
      kind: 'share',
      measure: 'nights',
      steps: [
        { above: 1, priceCents: 100 },
        { above: 2, priceCents: 1000 },
      ],
    },
  ];
  it('costs each step for what lies above it, person by person', () => {
    // Three Nights: 2 x 100 and 1 x 1000; one Night: nothing.
    expect(cost(share, nights)).toBe(1200);
    expect(cost(share, nights, [{ isOutside: true }, {}])).toBe(0);
  });
});

describe('marks of weekends', () => {
  it('are tied from both sides when fairness prices them', () => {
    const fairness: FairnessTerm[] = [{ kind: 'spread', measure: 'weekends', priceCents: 1 }];
    const model = buildRosterModel(buildProblem({ fairness, people: [{}, { isOutside: true }] }));
    const ties = model.linear.rowNames.filter((name) => /^weekend\(p.,2027-02-06\)$/.test(name));
    expect(ties).toEqual(['weekend(p0,2027-02-06)']);
    expect(model.weekends.map((weekends) => weekends.length)).toEqual([1, 0]);
    // The mark of a free weekend would raise the least; its row forbids it.
    const values = completeValues(model, placeRoster(model, []));
    expect(values[model.weekends[0]?.[0]?.column ?? -1]).toBe(0);
  });
});
