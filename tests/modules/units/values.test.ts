import { describe, expect, it } from 'vitest';
import {
  addDays,
  datesOf,
  daysBetween,
  formatClock,
  formatHours,
  formatMoney,
  isLocalDate,
  mondayOf,
  parseClock,
  payFor,
  weekdayOf,
} from '@/modules/units';
import { newId } from '@/modules/units/server';

describe('dates', () => {
  it.each([
    ['2027-02-28', true],
    ['2027-02-29', false],
    ['2028-02-29', true],
    ['2027-2-1', false],
    ['', false],
  ])('%s exists: %s', (text, exists) => expect(isLocalDate(text)).toBe(exists));

  it('count across months, years and backwards', () => {
    expect(addDays('2027-12-31', 1)).toBe('2028-01-01');
    expect(addDays('2027-03-01', -1)).toBe('2027-02-28');
    expect(daysBetween('2027-02-01', '2027-02-28')).toBe(27);
    expect(daysBetween('2027-02-28', '2027-02-01')).toBe(-27);
    expect(datesOf('2027-02-27', '2027-03-01')).toEqual(['2027-02-27', '2027-02-28', '2027-03-01']);
    expect(datesOf('2027-02-02', '2027-02-01')).toEqual([]);
  });

  it('begin the week on Monday, as ISO 8601 does', () => {
    expect(weekdayOf('2027-02-01')).toBe(0);
    expect(weekdayOf('2027-02-28')).toBe(6);
    expect(mondayOf('2027-01-03')).toBe('2026-12-28');
  });
});

describe('pay', () => {
  it.each([
    ['25 % of 8 h at 25.00', 2500, 480, 25, 5000],
    ['half a cent rounds up', 1, 30, 100, 1],
    ['a third of a cent rounds down', 1, 20, 100, 0],
    ['one and a half times 8 h at 38.00', 3800, 480, 150, 45_600],
    ['no minutes', 3800, 0, 150, 0],
  ])('%s', (_, rate, minutes, percent, cents) =>
    expect(payFor(rate, minutes, percent)).toBe(cents),
  );

  it('is written with its currency', () => {
    expect(formatMoney(10_342_050, 'EUR')).toBe('€103,421');
    expect(formatMoney(10_342_050, 'EUR', 'en-GB', 2)).toBe('€103,420.50');
  });
});

describe('clock times', () => {
  it.each([
    ['7', 420],
    ['07:30', 450],
    ['0730', 450],
    ['24:00', 1440],
    ['24:01', null],
    ['7:60', null],
    ['noon', null],
  ])('reads %s', (text, minute) => expect(parseClock(text)).toBe(minute));

  it('writes minutes past midnight as the next morning', () => {
    expect(formatClock(1860)).toBe('07:00');
    expect(formatHours(450)).toBe('7.5');
    expect(formatHours(203_520)).toBe('3,392');
  });
});

describe('ids', () => {
  it('say what they name and do not repeat', () => {
    const ids = new Set(Array.from({ length: 1000 }, () => newId('flr')));
    expect(ids.size).toBe(1000);
    expect([...ids].every((id) => /^flr_[0-9a-f]{32}$/.test(id))).toBe(true);
  });
});
