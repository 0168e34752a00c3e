import { describe, expect, it } from 'vitest';
import { floorDateInputSchema, floorInputSchema, shiftKindInputSchema } from '@/modules/coverage';
import { floorInput, kindInput } from './team-with-floors';

const paths = (outcome: { error?: { issues: { path: PropertyKey[] }[] } | undefined }) =>
  outcome.error?.issues.map(({ path }) => path.join('.')) ?? [];

describe('what a floor may be', () => {
  it.each<[string, object, string[]]>([
    ['a window of the day', {}, []],
    ['a window past midnight', { startMinute: 1380, endMinute: 1860 }, []],
    ['a whole day', { startMinute: 600, endMinute: 2040 }, []],
    ['one day only', { effectiveTo: '2027-02-01' }, []],
    ['an end at the start', { endMinute: 420 }, ['endMinute']],
    ['more than a day', { endMinute: 420 + 1441 }, ['endMinute']],
    ['a start on the next day', { startMinute: 1440, endMinute: 1500 }, ['startMinute']],
    ['seven numbers', { needs: [1, 1, 1, 1, 1, 1, 1] }, ['needs']],
    ['a negative number', { needs: [1, 1, 1, -1, 1, 1, 1, 1] }, ['needs.3']],
    ['half a person', { needs: [1, 1, 1, 1, 1, 1, 1, 0.5] }, ['needs.7']],
    ['a negative price', { priceCentsPerHour: -1 }, ['priceCentsPerHour']],
    ['a date that does not exist', { effectiveFrom: '2027-01-32' }, ['effectiveFrom']],
    ['a last day before the first', { effectiveTo: '2027-01-31' }, ['effectiveTo']],
  ])('%s', (_, changes, expected) => {
    expect(paths(floorInputSchema.safeParse({ ...floorInput(), ...changes }))).toEqual(expected);
  });

  it('refuses fields it does not know', () => {
    expect(floorInputSchema.safeParse({ ...floorInput(), id: 'flr_1' }).success).toBe(false);
  });

  it('trims the reason of a date that differs and keeps it short', () => {
    const parse = (reason: string) => floorDateInputSchema.safeParse({ people: 1, reason });
    expect(parse('  fair ').data).toEqual({ people: 1, reason: 'fair' });
    expect(paths(parse('x'.repeat(201)))).toEqual(['reason']);
  });
});

describe('what a shift kind may be', () => {
  it.each<[string, object, string[]]>([
    ['a shift past midnight', { startMinute: 1380, endMinute: 1860 }, []],
    ['no name', { name: '  ' }, ['name']],
    ['four letters', { letter: 'EARL' }, ['letter']],
    [
      'an end before the start',
      { endMinute: 60, unpaidBreakMinutes: 0 },
      ['endMinute', 'unpaidBreakMinutes'],
    ],
    [
      'a break as long as the shift',
      { endMinute: 480, unpaidBreakMinutes: 60 },
      ['unpaidBreakMinutes'],
    ],
    ['no skills at all', { skillIds: [] }, ['skillIds']],
  ])('%s', (_, changes, expected) => {
    expect(paths(shiftKindInputSchema.safeParse({ ...kindInput(), ...changes }))).toEqual(expected);
  });
});
