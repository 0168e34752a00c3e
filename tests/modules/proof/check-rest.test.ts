import { describe, expect, it } from 'vitest';
import { proveRoster } from '@/modules/proof';
import { assign, buildProblem, type KindSketch } from '@/tests/support/problem-builder';

const restBreaches = (
  kinds: readonly KindSketch[],
  plan: readonly (readonly [number, string])[],
  sketch: Parameters<typeof buildProblem>[0] = {},
): string[] => {
  const problem = buildProblem({ kinds, ...sketch });
  const roster = plan.map(([dayIndex, kindId]) => assign(problem, 'ione', dayIndex, kindId));
  return proveRoster(problem, roster)
    .breaches.filter(({ rule }) => rule === 'restMinutes')
    .map(({ sentence }) => sentence);
};

/** Eleven hours of rest: Directive 2003/88/EC, Art. 3. */
describe('eleven hours between shifts', () => {
  const late = { id: 'Late', startMinute: 840, endMinute: 1320 };

  it.each([
    [
      '08:59',
      539,
      [
        'Ione Baptisto: Late on Mon 1 Feb ends 22:00 and Morning on Tue 2 Feb starts 08:59, 10 h 59 min apart; the least is 11 h.',
      ],
    ],
    ['09:00', 540, []],
  ])('end 22:00, next start %s', (_, startMinute, expected) => {
    const morning = { id: 'Morning', startMinute, endMinute: startMinute + 480 };
    expect(
      restBreaches(
        [late, morning],
        [
          [0, 'Late'],
          [1, 'Morning'],
        ],
      ),
    ).toEqual(expected);
  });

  /** The same clock times on the nights of a clock change; instants by the IANA zone database. */
  it.each([
    [
      '2026-03-28',
      540,
      [
        'Ione Baptisto: Late on Sat 28 Mar ends 22:00 and Morning on Sun 29 Mar starts 09:00, 10 h apart; the least is 11 h.',
      ],
    ],
    ['2026-10-24', 480, []],
  ])('Europe/Berlin, end %s 22:00, next start at minute %i', (startsOn, startMinute, expected) => {
    const morning = { id: 'Morning', startMinute, endMinute: startMinute + 480 };
    expect(
      restBreaches(
        [late, morning],
        [
          [0, 'Late'],
          [1, 'Morning'],
        ],
        {
          startsOn,
          zone: 'Europe/Berlin',
        },
      ),
    ).toEqual(expected);
  });

  it('names both shifts, their times and the figures', () => {
    expect(
      restBreaches(
        [
          { id: 'Late', startMinute: 900, endMinute: 1380 },
          { id: 'Early', startMinute: 420, endMinute: 900 },
        ],
        [
          [10, 'Late'],
          [11, 'Early'],
        ],
        { dayCount: 14 },
      ),
    ).toEqual([
      'Ione Baptisto: Late on Thu 11 Feb ends 23:00 and Early on Fri 12 Feb starts 07:00, 8 h apart; the least is 11 h.',
    ]);
  });
});

describe('rest across the start of the period', () => {
  const early = { id: 'Early', startMinute: 420, endMinute: 900 };
  const lateBefore = { dayIndex: -1, startMinute: -540, endMinute: -60, isNight: false };

  it('holds against the last shift before it', () => {
    expect(restBreaches([early], [[0, 'Early']], { people: [{ history: [lateBefore] }] })).toEqual([
      'Ione Baptisto: the shift on Sun 31 Jan ends 23:00 and Early on Mon 1 Feb starts 07:00, 8 h apart; the least is 11 h.',
    ]);
    expect(restBreaches([early], [[1, 'Early']], { people: [{ history: [lateBefore] }] })).toEqual(
      [],
    );
  });

  it('is not asked between two shifts that are both past', () => {
    const history = [
      { dayIndex: -1, startMinute: -1100, endMinute: -900, isNight: false },
      lateBefore,
    ];
    expect(restBreaches([early], [[2, 'Early']], { people: [{ history }] })).toEqual([]);
  });
});

describe('shifts that touch or overlap', () => {
  const kinds = [
    { id: 'Long', startMinute: 0, endMinute: 2160 },
    { id: 'Early', startMinute: 420, endMinute: 900 },
    { id: 'Noon', startMinute: 720, endMinute: 900 },
  ];

  it('may touch where no rest is asked', () => {
    const plan = [
      [0, 'Long'],
      [1, 'Noon'],
    ] as const;
    expect(restBreaches(kinds, plan, { rules: { restMinutes: 0 } })).toEqual([]);
  });

  it('may never overlap', () => {
    const plan = [
      [0, 'Long'],
      [1, 'Early'],
    ] as const;
    expect(restBreaches(kinds, plan, { rules: { restMinutes: 0 } })).toEqual([
      'Ione Baptisto: Long on Mon 1 Feb ends 12:00 and Early on Tue 2 Feb starts 07:00, an overlap of 5 h; the least is 0 min.',
    ]);
  });

  it('rest counts from the shift that ends last, not from the one that starts last', () => {
    const plan = [
      [0, 'Long'],
      [0, 'Early'],
      [1, 'Noon'],
    ] as const;
    expect(restBreaches(kinds, plan).at(-1)).toContain('Long on Mon 1 Feb ends 12:00 and Noon');
  });
});
