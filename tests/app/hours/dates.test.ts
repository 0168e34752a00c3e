import { describe, expect, it } from 'vitest';
import { addressOf, hoursPath, queryOf, readAddress } from '@/app/(hr)/hours/hours-address';
import { rangeFormSchema } from '@/app/(hr)/hours/range-form';
import { unpublishedDays } from '@/app/(hr)/hours/unpublished-days';

const choice = { teamId: 'tea_1', range: { from: '2027-02-01', to: '2027-02-28' } };

describe('the address of the hours', () => {
  it('shows the same choice again', () => {
    const query = new URLSearchParams(addressOf(choice).split('?')[1]);
    expect(readAddress(query)).toEqual({ ...choice, typed: choice.range });
  });

  it('asks the API for the dates only', () => {
    expect(hoursPath(choice, '.csv')).toBe('teams/tea_1/hours.csv?from=2027-02-01&to=2027-02-28');
  });

  it('has no range when its dates are wrong, but keeps those that exist', () => {
    const query = queryOf({ from: '2027-03-01', to: '2027-02-30' });
    expect(readAddress(query)).toEqual({
      teamId: null,
      range: null,
      typed: { from: '2027-03-01', to: '' },
    });
  });

  it('has nothing typed when it says nothing', () => {
    expect(readAddress(queryOf({}))).toEqual({ teamId: null, range: null, typed: null });
  });

  it('leaves out what stands there twice', () => {
    expect(readAddress(queryOf({ team: ['tea_1', 'tea_2'] })).teamId).toBeNull();
  });
});

describe('the dates as they are typed', () => {
  const wrongFields = (from: string, to: string) => {
    const outcome = rangeFormSchema.safeParse({ teamId: 'tea_1', from, to });
    return outcome.success ? [] : outcome.error.issues.map(({ path }) => path.join('.'));
  };

  it('come back with their team', () => {
    const typed = { teamId: 'tea_1', ...choice.range };
    expect(rangeFormSchema.parse(typed)).toEqual(typed);
  });

  it.each([
    ['a missing first day', '', '2027-02-28', ['from']],
    ['two missing days', '', '', ['from', 'to']],
    ['a day that does not exist', '2027-02-01', '2027-02-30', ['to']],
    ['a last day before the first', '2027-02-02', '2027-02-01', ['to']],
    ['more than a year', '2027-01-01', '2028-01-02', ['to']],
    ['one day', '2027-02-01', '2027-02-01', []],
  ])('name the field of %s', (_, from, to, fields) => {
    expect(wrongFields(from, to)).toEqual(fields);
  });
});

describe('days without a published roster', () => {
  const january = { startsOn: '2027-01-04', endsOn: '2027-01-31' };
  const february = { startsOn: '2027-02-01', endsOn: '2027-02-28' };

  it.each([
    ['none inside a period', '2027-01-10', '2027-02-10', []],
    ['before the first', '2027-01-01', '2027-01-31', [['2027-01-01', '2027-01-03']]],
    ['after the last', '2027-02-20', '2027-03-05', [['2027-03-01', '2027-03-05']]],
    ['all of them', '2027-03-01', '2027-03-05', [['2027-03-01', '2027-03-05']]],
  ])('are %s', (_, from, to, expected) => {
    const periods = [january, february].filter(
      (period) => period.startsOn <= to && from <= period.endsOn,
    );
    const gaps = unpublishedDays({ from, to }, periods).map((gap) => [gap.from, gap.to]);
    expect(gaps).toEqual(expected);
  });

  it('lie between periods', () => {
    const april = { startsOn: '2027-03-29', endsOn: '2027-04-25' };
    expect(unpublishedDays({ from: '2027-02-15', to: '2027-04-01' }, [february, april])).toEqual([
      { from: '2027-03-01', to: '2027-03-28' },
    ]);
  });
});
