import { describe, expect, it } from 'vitest';
import { buildRosterModel } from '@/modules/model';
import { brokenFamilies } from '@/tests/support/broken-rows';
import { assign, buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';

type Plan = readonly (readonly [dayIndex: number, kindId: string])[];

/** Families of rows that this plan of the only person breaks. */
function broken(sketch: ProblemSketch, plan: Plan): string[] {
  const problem = buildProblem(sketch);
  return brokenFamilies(
    buildRosterModel(problem),
    plan.map(([day, kind]) => assign(problem, 'ione', day, kind)),
  );
}

const days = (from: number, to: number, kind = 'Early'): Plan =>
  Array.from({ length: to - from + 1 }, (_, index) => [from + index, kind] as const);

const past = (dayIndex: number, startMinute: number, endMinute: number, isNight = false) => ({
  dayIndex,
  startMinute: dayIndex * 1440 + startMinute,
  endMinute: dayIndex * 1440 + endMinute,
  isNight,
});

describe('one shift a day', () => {
  it('lets one shift start on a day', () => {
    expect(broken({}, [[0, 'Early']])).toEqual([]);
  });
  it('refuses two, even when they leave time between them', () => {
    const plan: Plan = [
      [0, 'Early'],
      [0, 'Night'],
    ];
    expect(broken({ rules: { restMinutes: 0 } }, plan)).toEqual(['day']);
  });
});

describe('rest between shifts', () => {
  it.each<[string, number, Plan, string[]]>([
    [
      'Late, then Early: 8 h',
      660,
      [
        [0, 'Late'],
        [1, 'Early'],
      ],
      ['rest'],
    ],
    [
      'Late, then Day: 10 h',
      660,
      [
        [0, 'Late'],
        [1, 'Day'],
      ],
      ['rest'],
    ],
    [
      'Late, then Late: 16 h',
      660,
      [
        [0, 'Late'],
        [1, 'Late'],
      ],
      [],
    ],
    [
      'Night, then Late: 8 h',
      660,
      [
        [0, 'Night'],
        [1, 'Late'],
      ],
      ['rest'],
    ],
    [
      'Night, then Night: 16 h',
      660,
      [
        [0, 'Night'],
        [1, 'Night'],
      ],
      [],
    ],
    [
      'exactly the rest asked for',
      600,
      [
        [0, 'Late'],
        [1, 'Day'],
      ],
      [],
    ],
    [
      'one minute less than asked for',
      601,
      [
        [0, 'Late'],
        [1, 'Day'],
      ],
      ['rest'],
    ],
    [
      'a rest of two days reaches the day after next',
      2880,
      [
        [0, 'Night'],
        [2, 'Early'],
      ],
      ['rest'],
    ],
    [
      'and no further',
      2880,
      [
        [0, 'Night'],
        [3, 'Early'],
      ],
      [],
    ],
  ])('%s', (_, restMinutes, plan, families) => {
    expect(broken({ rules: { restMinutes } }, plan)).toEqual(families);
  });

  /** End Sat 22:00, start Sun 09:00: 10 h in spring, 11 h with a start at 08:00 in autumn (C1 of the check values). */
  it.each([
    ['2026-03-28', 540, ['rest']],
    ['2026-03-28', 600, []],
    ['2026-10-24', 480, []],
    ['2026-10-24', 420, ['rest']],
  ])(
    'counts the hours that elapse across the clock change after %s, start at minute %d',
    (startsOn, start, families) => {
      const sketch = {
        startsOn,
        zone: 'Europe/Berlin',
        dayCount: 2,
        kinds: [
          { id: 'Late', startMinute: 840, endMinute: 1320 },
          { id: 'Morning', startMinute: start, endMinute: start + 480 },
        ],
      };
      expect(
        broken(sketch, [
          [0, 'Late'],
          [1, 'Morning'],
        ]),
      ).toEqual(families);
    },
  );

  it('leaves out shifts that start too soon after the last shift before the period', () => {
    const history = [past(-1, 1380, 1860, true)];
    const sketch = { people: [{ history, minimumMinutes: 480 }] };
    expect(broken(sketch, [[0, 'Late']])).toEqual(['hours']);
    expect(broken(sketch, [[0, 'Night']])).toEqual([]);
  });
});

describe('runs of days and Nights', () => {
  const rules = { longestRunDays: 5, longestRunNights: 2 };
  it('allows the longest run and refuses one day more', () => {
    expect(broken({ rules }, days(0, 4))).toEqual([]);
    expect(broken({ rules }, days(0, 5))).toEqual(['run']);
  });
  it('counts the days worked before the period', () => {
    const sketch = { rules, people: [{ history: [past(-2, 420, 900), past(-1, 420, 900)] }] };
    expect(broken(sketch, days(0, 2))).toEqual([]);
    expect(broken(sketch, days(0, 3))).toEqual(['run']);
  });
  it('starts afresh after a free day before the period', () => {
    const sketch = { rules, people: [{ history: [past(-3, 420, 900), past(-2, 420, 900)] }] };
    expect(broken(sketch, days(0, 4))).toEqual([]);
  });
  it('counts Nights by themselves, with those before the period', () => {
    expect(broken({ rules }, days(0, 1, 'Night'))).toEqual([]);
    expect(broken({ rules }, days(0, 2, 'Night'))).toEqual(['nightrun']);
    const sketch = { rules, people: [{ history: [past(-1, 1380, 1860, true)] }] };
    expect(broken(sketch, days(0, 1, 'Night'))).toEqual(['nightrun']);
  });
  it('holds in a period shorter than the run', () => {
    const history = [-4, -3, -2, -1].map((day) => past(day, 420, 900));
    const sketch = { rules, dayCount: 2, people: [{ history }] };
    expect(broken(sketch, days(0, 0))).toEqual([]);
    expect(broken(sketch, days(0, 1))).toEqual(['run']);
  });
});

describe('Nights in a period', () => {
  it('counts them wherever they stand', () => {
    const rules = { nightsPerPeriod: 2 };
    const two: Plan = [
      [0, 'Night'],
      [3, 'Night'],
    ];
    expect(broken({ rules }, two)).toEqual([]);
    expect(broken({ rules }, [...two, [6, 'Night']])).toEqual(['nights']);
  });
});

describe('weekends in a period', () => {
  /** Mon 1 Feb 2027; the weekends are days 5 and 6, 12 and 13. */
  const rules = { weekendsPerPeriod: 1 };
  it.each<[string, Plan, string[]]>([
    [
      'Saturday and Sunday are one weekend',
      [
        [5, 'Early'],
        [6, 'Early'],
      ],
      [],
    ],
    [
      'a Saturday and the Sunday after are two',
      [
        [5, 'Early'],
        [13, 'Early'],
      ],
      ['weekends'],
    ],
    [
      'a Friday Night is no weekend by itself',
      [
        [4, 'Night'],
        [12, 'Early'],
      ],
      [],
    ],
  ])('%s', (_, plan, families) => {
    expect(broken({ dayCount: 14, rules }, plan)).toEqual(families);
  });

  it('counts a Friday shift past midnight when the rule says so, and no other Friday shift', () => {
    const friday = { dayCount: 14, rules: { ...rules, weekendCountsFridayNight: true } };
    expect(
      broken(friday, [
        [4, 'Night'],
        [12, 'Early'],
      ]),
    ).toEqual(['weekends']);
    expect(
      broken(friday, [
        [4, 'Late'],
        [12, 'Early'],
      ]),
    ).toEqual([]);
    expect(
      broken(friday, [
        [4, 'Night'],
        [6, 'Night'],
      ]),
    ).toEqual([]);
  });

  it('counts the Friday Night of a period that ends on Friday', () => {
    const rule = { weekendsPerPeriod: 0, weekendCountsFridayNight: true };
    expect(broken({ dayCount: 5, rules: rule }, [[4, 'Night']])).toEqual(['weekends']);
    expect(broken({ dayCount: 5, rules: rule }, [[4, 'Late']])).toEqual([]);
  });

  it('counts the Sunday of a period that begins on Sunday', () => {
    const sketch = { startsOn: '2027-02-07', rules: { weekendsPerPeriod: 0 } };
    expect(broken(sketch, [[0, 'Early']])).toEqual(['weekends']);
  });
});

describe('contract hours', () => {
  const person = { minimumMinutes: 1440, maximumMinutes: 1920, creditMinutes: 480 };
  it.each<[number, string[]]>([
    [1, ['hours']],
    [2, []],
    [3, []],
    [4, ['hours']],
  ])('%d shifts of 8 h with 8 h of leave, where 24 to 32 h are asked for', (shifts, families) => {
    expect(broken({ people: [person] }, days(0, shifts - 1))).toEqual(families);
  });
  it('counts paid minutes only', () => {
    const kinds = [{ id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 30 }];
    const exact = { minimumMinutes: 900, maximumMinutes: 900 };
    expect(broken({ kinds, people: [exact] }, days(0, 1))).toEqual([]);
    expect(broken({ kinds, people: [exact] }, days(0, 0))).toEqual(['hours']);
  });
});

describe('pins', () => {
  it('keeps a shift, in any post or in the one that is pinned', () => {
    const pins = [{ dayIndex: 0, shiftIndex: 0, postSkillId: null }];
    expect(broken({ people: [{ pins }] }, [[0, 'Early']])).toEqual([]);
    expect(broken({ people: [{ pins }] }, [[0, 'Late']])).toEqual(['pin']);
    const posted = [{ dayIndex: 0, shiftIndex: 0, postSkillId: 'vet' }];
    const person = { skillIds: ['nurse', 'vet'], pins: posted };
    const problem = buildProblem({ people: [person] });
    expect(
      brokenFamilies(buildRosterModel(problem), [assign(problem, 'ione', 0, 'Early', 'vet')]),
    ).toEqual([]);
  });
  it('keeps a day free', () => {
    const pins = [{ dayIndex: 1, shiftIndex: null, postSkillId: null }];
    expect(broken({ people: [{ pins }] }, [[0, 'Early']])).toEqual([]);
    expect(broken({ people: [{ pins }] }, [[1, 'Early']])).toEqual(['pin']);
  });
  it('cannot be met when nothing lets the person work the shift', () => {
    const pins = [{ dayIndex: 0, shiftIndex: 3, postSkillId: null }];
    expect(broken({ people: [{ pins, mayWorkNights: false }] }, [[0, 'Night']])).toEqual(['pin']);
  });
});
