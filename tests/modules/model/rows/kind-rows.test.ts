import { describe, expect, it } from 'vitest';
import { buildRules } from '@/tests/support/problem-builder';
import { broken, days, type Plan } from './broken-plan';

describe('most shifts of a kind', () => {
  const people = [{ kindLimits: [{ kindId: 'Late', most: 2 }] }];
  it('allows as many as the limit and refuses one more', () => {
    expect(broken({ people }, days(0, 1, 'Late'))).toEqual([]);
    expect(broken({ people }, days(0, 2, 'Late'))).toEqual(['kind']);
    expect(broken({ people }, days(0, 5, 'Early'))).toEqual([]);
  });
});

describe('kinds that may not follow each other', () => {
  const pair = (kindId: string, nextKindId: string) => ({ kindId, nextKindId });
  const rules = {
    restMinutes: 0,
    kindsThatMayNotFollow: [pair('Late', 'Early'), pair('Late', 'Day'), pair('Day', 'Early')],
  };
  it.each<[string, Plan, string[]]>([
    [
      'Late, then Early',
      [
        [0, 'Late'],
        [1, 'Early'],
      ],
      ['follow'],
    ],
    [
      'Late, then Day',
      [
        [0, 'Late'],
        [1, 'Day'],
      ],
      ['follow'],
    ],
    [
      'Day, then Early',
      [
        [0, 'Day'],
        [1, 'Early'],
      ],
      ['follow'],
    ],
    [
      'Day, then Day',
      [
        [0, 'Day'],
        [1, 'Day'],
      ],
      [],
    ],
    [
      'Early, then Late: the other way round',
      [
        [0, 'Early'],
        [1, 'Late'],
      ],
      [],
    ],
    [
      'a day between',
      [
        [0, 'Late'],
        [2, 'Early'],
      ],
      [],
    ],
  ])('%s', (_, plan, families) => {
    expect(broken({ rules }, plan)).toEqual(families);
  });

  it('are those of the person where they have their own', () => {
    const own = { restMinutes: 0, kindsThatMayNotFollow: [] };
    const sketch = { rules, people: [{ rules: buildRules(own) }] };
    expect(
      broken(sketch, [
        [0, 'Late'],
        [1, 'Early'],
      ]),
    ).toEqual([]);
  });
});
