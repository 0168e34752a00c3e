import { describe, expect, it } from 'vitest';
import { postWords } from '@/app/(staff)/post-words';
import { findNextShift, nextShiftTitle } from '@/app/(staff)/shifts/next-shift';
import { ownShift } from '../_ui/calendar/calendar-entries';

const today = '2027-01-15';

/** The title of the sheet at a minute of the day. */
function titleAt(minute: number, shifts: Parameters<typeof findNextShift>[0]): string | null {
  const next = findNextShift(shifts, today, minute);
  return next && nextShiftTitle(next, today);
}

describe('what comes next', () => {
  it.each([
    ['a night of today', [ownShift(today, 'Night')], 600, 'Tonight, Night'],
    ['a day shift of today', [ownShift(today, 'Late')], 600, 'Today, Late'],
    ['a shift that goes on', [ownShift(today, 'Early')], 600, 'On now: Early'],
    ['a night that began yesterday', [ownShift('2027-01-14', 'Night')], 180, 'On now: Night'],
    ['tomorrow', [ownShift('2027-01-16', 'Late')], 600, 'Next: Late tomorrow'],
    ['a later day', [ownShift('2027-02-02', 'Late')], 600, 'Next: Late on Tue 2 Feb'],
  ])('names %s', (_, shifts, minute, title) => {
    expect(titleAt(minute, shifts)).toBe(title);
  });

  it('takes the first that has not ended, in whatever order they come', () => {
    const shifts = [
      ownShift('2027-02-02', 'Late'),
      ownShift('2027-01-18', 'Day'),
      ownShift(today, 'Early'),
    ];
    expect(titleAt(899, shifts)).toBe('On now: Early');
    expect(titleAt(900, shifts)).toBe('Next: Day on Mon 18 Jan');
  });

  it('is nothing when every shift is over', () => {
    expect(titleAt(420, [ownShift('2027-01-14', 'Night')])).toBeNull();
  });
});

describe('who shares a shift', () => {
  it.each([
    [[], 'Nurse, only you on this shift'],
    [['Kwabena Tull'], 'Nurse, with Kwabena Tull'],
    [
      ['Kwabena Tull', 'Hana Quill', 'Ravi Thornby'],
      'Nurse, with Kwabena Tull, Hana Quill and Ravi Thornby',
    ],
  ])('%j', (withNames, words) => {
    expect(postWords(ownShift(today, 'Late', { withNames }))).toBe(words);
  });
});
