import { describe, expect, it } from 'vitest';
import { startingRange } from '@/modules/hours/starting-range';

const january = { startsOn: '2027-01-04', endsOn: '2027-01-31' };
const february = { startsOn: '2027-02-01', endsOn: '2027-02-28' };
const april = { startsOn: '2027-04-05', endsOn: '2027-05-02' };

describe('the dates hours are shown with at first', () => {
  it.each([
    ['the period of today', '2027-01-14', january],
    ['its first day', '2027-02-01', february],
    ['its last day', '2027-01-31', january],
    ['the last period before a gap', '2027-03-20', february],
    ['the first period when none has begun', '2026-12-24', january],
  ])('are those of %s', (_, today, expected) => {
    const range = startingRange([january, february, april], today);
    expect(range).toEqual({ from: expected.startsOn, to: expected.endsOn });
  });

  it.each([
    ['2027-02-14', { from: '2027-02-01', to: '2027-02-28' }],
    ['2028-02-29', { from: '2028-02-01', to: '2028-02-29' }],
    ['2026-12-31', { from: '2026-12-01', to: '2026-12-31' }],
  ])('are the month of %s when nothing is published', (today, expected) => {
    expect(startingRange([], today)).toEqual(expected);
  });
});
