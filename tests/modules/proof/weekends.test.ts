import { describe, expect, it } from 'vitest';
import { proveRoster } from '@/modules/proof';
import { assign, buildProblem } from '@/tests/support/problem-builder';

/** Friday 5 February 2027 is day 4 of the period. */
const weekends = (
  plan: readonly (readonly [number, string])[],
  weekendCountsFridayNight: boolean,
  sketch: Parameters<typeof buildProblem>[0] = {},
): number | undefined => {
  const problem = buildProblem({
    dayCount: 14,
    kinds: [
      { id: 'Early', startMinute: 420, endMinute: 900 },
      { id: 'Evening', startMinute: 960, endMinute: 1440 },
      { id: 'Night', startMinute: 1380, endMinute: 1860, isNight: true },
    ],
    ...sketch,
    rules: { weekendCountsFridayNight },
  });
  const roster = plan.map(([dayIndex, kindId]) => assign(problem, 'ione', dayIndex, kindId));
  return proveRoster(problem, roster).people[0]?.weekends;
};

describe('weekends worked', () => {
  it.each([
    ['nothing', [], 0, 0],
    ['a Saturday', [[5, 'Early']], 1, 1],
    ['a Sunday', [[6, 'Early']], 1, 1],
    ['a Sunday night that runs into Monday', [[6, 'Night']], 1, 1],
    [
      'both days',
      [
        [5, 'Early'],
        [6, 'Early'],
      ],
      1,
      1,
    ],
    ['a Friday shift that ends at Saturday 00:00', [[4, 'Evening']], 0, 0],
    ['a Friday night', [[4, 'Night']], 0, 1],
    [
      'a Friday night and the Sunday after it',
      [
        [4, 'Night'],
        [6, 'Early'],
      ],
      1,
      1,
    ],
    [
      'two Friday nights',
      [
        [4, 'Night'],
        [11, 'Night'],
      ],
      0,
      2,
    ],
    ['a Thursday night', [[3, 'Night']], 0, 0],
  ] as const)('%s', (_, plan, without, withFriday) => {
    expect(weekends(plan, false)).toBe(without);
    expect(weekends(plan, true)).toBe(withFriday);
  });

  it('a Friday night at the end of the period works the weekend after it', () => {
    expect(weekends([[4, 'Night']], true, { dayCount: 5 })).toBe(1);
    expect(weekends([[4, 'Evening']], true, { dayCount: 5 })).toBe(0);
  });

  it('a period that starts on a Sunday counts the weekend of that Sunday', () => {
    expect(weekends([[0, 'Early']], false, { startsOn: '2027-02-07' })).toBe(1);
  });

  it('reads Saturday 00:00 from the zone where the Friday is an hour short', () => {
    // Asia/Amman moved its clocks on from Friday 2021-03-26 00:00: that day had 23 hours.
    const sketch = { startsOn: '2021-03-22', dayCount: 5, zone: 'Asia/Amman' };
    expect(weekends([[4, 'Evening']], true, sketch)).toBe(0);
    expect(weekends([[4, 'Night']], true, sketch)).toBe(1);
  });
});
