import { describe, expect, it } from 'vitest';
import { rangeOf, readRangeOf, stepFrom, titleOf, type View } from '@/app/_ui/calendar/view-range';

const cases: [View, string, string, string, string][] = [
  ['month', '2027-02-11', '2027-02-01', '2027-02-28', 'February 2027'],
  ['month', '2027-01-14', '2026-12-28', '2027-01-31', 'January 2027'],
  ['month', '2027-08-31', '2027-07-26', '2027-09-05', 'August 2027'],
  ['week', '2027-02-14', '2027-02-08', '2027-02-14', '8–14 February 2027'],
  ['week', '2027-03-01', '2027-03-01', '2027-03-07', '1–7 March 2027'],
  ['day', '2027-02-11', '2027-02-11', '2027-02-11', 'Thursday 11 February 2027'],
  ['agenda', '2027-02-22', '2027-02-22', '2027-03-07', '22 February–7 March 2027'],
];

describe('what a view shows', () => {
  it.each(cases)('%s around %s', (view, date, from, to, title) => {
    expect(rangeOf(view, date)).toEqual({ from, to });
    expect(titleOf(view, date)).toBe(title);
  });

  it.each([
    ['month', '2027-01-31', '2027-02-01', '2026-12-01'],
    ['month', '2028-02-29', '2028-03-01', '2028-01-01'],
    ['week', '2027-02-11', '2027-02-18', '2027-02-04'],
    ['day', '2027-02-28', '2027-03-01', '2027-02-27'],
    ['agenda', '2027-02-11', '2027-02-25', '2027-01-28'],
  ] as const)('%s steps from %s on to %s and back to %s', (view, date, on, back) => {
    expect(stepFrom(view, date, 1)).toBe(on);
    expect(stepFrom(view, date, -1)).toBe(back);
  });

  it('reads the same dates for a month and for the weeks and days inside it', () => {
    const month = readRangeOf('month', '2027-02-11');
    expect(readRangeOf('week', '2027-02-11')).toEqual(month);
    expect(readRangeOf('day', '2027-02-28')).toEqual(month);
    expect(readRangeOf('agenda', '2027-02-22').to).toBe('2027-04-04');
  });
});
