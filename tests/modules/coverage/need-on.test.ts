import { describe, expect, it } from 'vitest';
import { isInForce, needOn } from '@/modules/coverage';

/** Monday 1 to Sunday 7, holidays 9; Wed 17 Feb 2027 differs. */
const floor = {
  needs: [1, 2, 3, 4, 5, 6, 7, 9],
  dates: [
    { date: '2027-02-17', people: 0, reason: 'closed' },
    { date: '2027-03-05', people: 50, reason: 'after the last day' },
  ],
  effectiveFrom: '2027-02-01',
  effectiveTo: '2027-02-28',
};

describe('the people a floor asks for on a date', () => {
  it.each([
    ['Monday, the first day', '2027-02-01', false, 1],
    ['a Tuesday', '2027-02-02', false, 2],
    ['a Saturday', '2027-02-06', false, 6],
    ['Sunday, the last day', '2027-02-28', false, 7],
    ['a holiday on a Thursday', '2027-02-18', true, 9],
    ['the same Thursday without the holiday', '2027-02-18', false, 4],
    ['a date that differs, even down to nobody', '2027-02-17', false, 0],
    ['a date that differs and is a holiday: its own number wins', '2027-02-17', true, 0],
    ['the day before the first day', '2027-01-31', false, 0],
    ['the day after the last day', '2027-03-01', false, 0],
    ['a date that differs but lies after the last day', '2027-03-05', false, 0],
  ])('%s', (_, date, isHoliday, people) => {
    expect(needOn(floor, date, isHoliday)).toBe(people);
  });

  it('goes on without end when there is no last day', () => {
    const open = { ...floor, effectiveTo: null };
    expect(needOn(open, '2030-12-30', false)).toBe(1);
    expect(isInForce(open, '2027-01-31')).toBe(false);
  });
});
