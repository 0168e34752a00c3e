import { describe, expect, it } from 'vitest';
import { choosePeriod, listPeriods, nextPeriod } from '@/app/(supervisor)/floors/period';

const january = { startsOn: '2027-01-04', endsOn: '2027-01-31', state: 'published' as const };
const february = { startsOn: '2027-02-01', endsOn: '2027-02-28', state: 'draft' as const };
const rosters = [january, february];
const periods = listPeriods(rosters, '2027-03-01', 28);

describe('the periods of the floors sheet', () => {
  it('are the opened ones and the one that follows', () => {
    expect(periods.map(({ startsOn, isOpen }) => [startsOn, isOpen])).toEqual([
      ['2027-01-04', true],
      ['2027-02-01', true],
      ['2027-03-01', false],
    ]);
    expect(periods.at(-1)?.endsOn).toBe('2027-03-28');
  });

  it.each([
    ['the one asked for', rosters, '2027-03-01', '2027-03-01'],
    ['the earliest draft when nothing is asked', rosters, undefined, '2027-02-01'],
    ['the earliest draft for a date that starts no period', rosters, '2027-02-02', '2027-02-01'],
    ['the last one when all are published', [january], undefined, '2027-03-01'],
  ])('show at first %s', (_, known, asked, startsOn) => {
    const listed = listPeriods(known, '2027-03-01', 28);
    expect(choosePeriod(listed, known, asked)?.startsOn).toBe(startsOn);
  });

  it('follow each other without a gap', () => {
    expect(nextPeriod({ ...february, isOpen: true }, 28)).toEqual({
      startsOn: '2027-03-01',
      endsOn: '2027-03-28',
    });
  });
});
