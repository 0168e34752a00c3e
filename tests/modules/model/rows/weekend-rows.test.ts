import { describe, expect, it } from 'vitest';
import { broken, type Plan } from './broken-plan';

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
