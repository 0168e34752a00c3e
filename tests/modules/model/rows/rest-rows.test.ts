import { describe, expect, it } from 'vitest';
import { broken, type Plan, past } from './broken-plan';

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
