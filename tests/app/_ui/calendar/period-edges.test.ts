import { describe, expect, it } from 'vitest';
import { groundClass } from '@/app/_ui/calendar/ground-class';
import { edgesOf } from '@/app/_ui/calendar/period-edges';
import { periodWords } from '@/app/_ui/calendar/period-words';

const periods = [
  { startsOn: '2027-01-04', endsOn: '2027-01-31', isPublished: true },
  { startsOn: '2027-02-01', endsOn: '2027-02-28', isPublished: false },
];
const midweek = [{ startsOn: '2027-02-03', endsOn: '2027-03-02', isPublished: true }];

describe('the edge of a period', () => {
  it('runs above the first week of a period that starts on a Monday', () => {
    expect(edgesOf(periods, '2027-02-01')).toEqual({ above: true, left: false });
    expect(edgesOf(periods, '2027-02-07')).toEqual({ above: true, left: false });
    expect(edgesOf(periods, '2027-02-08')).toEqual({ above: false, left: false });
  });

  it('steps at a day inside a week', () => {
    expect(edgesOf(midweek, '2027-02-03')).toEqual({ above: true, left: true });
    expect(edgesOf(midweek, '2027-02-09')).toEqual({ above: true, left: false });
    expect(edgesOf(midweek, '2027-02-10')).toEqual({ above: false, left: false });
    expect(edgesOf(midweek, '2027-03-03')).toEqual({ above: true, left: true });
  });

  it('is part of the ground of a day, with weekend and choice', () => {
    const frame = { periods: midweek };
    expect(groundClass(frame, '2027-02-06', '2027-02-06')).toBe(
      'is-weekend is-selected has-edge-above',
    );
    expect(groundClass(frame, '2027-02-11', null)).toBe('');
  });

  it('is said in words, with what is published', () => {
    expect(periodWords(periods, { from: '2027-01-25', to: '2027-02-28' })).toBe(
      'Periods 4–31 January published, 1–28 February draft.',
    );
    expect(periodWords(periods, { from: '2027-02-08', to: '2027-02-14' })).toBe(
      'Period 1–28 February draft.',
    );
    expect(periodWords(periods, { from: '2027-03-01', to: '2027-03-07' })).toBe(
      'No roster for these days yet.',
    );
  });
});
