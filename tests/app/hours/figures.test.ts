import { describe, expect, it } from 'vitest';
import { columnFormat, columnFormats, signed } from '@/app/(hr)/hours/format-hours';
import { rowAfterKey } from '@/app/(hr)/hours/row-keys';
import { countDays, hasDifference, isRecorded, sumPeople } from '@/app/(hr)/hours/sum-hours';
import { day, person } from './people';

describe('hours of a column', () => {
  it('are whole when all of them are', () => {
    expect([203_520, 0].map(columnFormat([203_520, 0]))).toEqual(['3,392', '0']);
  });

  it('all have two decimals when one is not whole', () => {
    expect([480, 450, 455].map(columnFormat([480, 450, 455]))).toEqual(['8.00', '7.50', '7.58']);
  });

  it('are judged column by column, and what is not recorded counts as nothing', () => {
    const rows = [
      { planned: 480, worked: null },
      { planned: 480, worked: 455 },
    ];
    const formats = columnFormats(['planned', 'worked'], rows);
    expect([formats.planned(960), formats.worked(455)]).toEqual(['16', '7.58']);
  });

  it('carry a sign where they are a difference', () => {
    const format = columnFormat([90]);
    expect([90, -15, 0].map((minutes) => signed(minutes, format))).toEqual(['+1.50', '−0.25', '0']);
  });
});

describe('sums of people', () => {
  const late = day({ workedMinutes: 510 });
  const early = day({ date: '2027-02-02', workedMinutes: 450 });

  it('add up every column', () => {
    const one = person({ plannedMinutes: 960, nightMinutes: 60, leaveMinutes: 480 });
    const other = person({ plannedMinutes: 480, workedMinutes: 500, differenceMinutes: 20 });
    expect(sumPeople([one, other])).toEqual({
      contractMinutes: 19_200,
      plannedMinutes: 1440,
      workedMinutes: 500,
      differenceMinutes: 20,
      nightMinutes: 60,
      weekendMinutes: 0,
      holidayMinutes: 0,
      leaveMinutes: 480,
    });
  });

  it('find a difference also where the days cancel out', () => {
    expect(hasDifference(person({ days: [late, early], differenceMinutes: 0 }))).toBe(true);
  });

  it('find none where work is as planned or not recorded', () => {
    expect(hasDifference(person({ days: [day(), day({ workedMinutes: 480 })] }))).toBe(false);
  });

  it('count the days and those with a record', () => {
    expect(countDays([person({ days: [late, day()] }), person()])).toEqual({
      days: 2,
      recorded: 1,
    });
    expect(isRecorded(person({ days: [day()] }))).toBe(false);
    expect(isRecorded(person({ days: [day({ workedMinutes: 0 })] }))).toBe(true);
  });
});

describe('keys among the names', () => {
  it.each([
    ['ArrowDown', 1, 2],
    ['ArrowDown', 2, 2],
    ['ArrowUp', 1, 0],
    ['ArrowUp', 0, 0],
    ['Home', 2, 0],
    ['End', 0, 2],
  ])('%s leads from row %i of three to row %i', (key, from, to) => {
    expect(rowAfterKey(key, from, 3)).toBe(to);
  });

  it('leave other keys alone', () => {
    expect(rowAfterKey('Enter', 1, 3)).toBeNull();
    expect(rowAfterKey('Tab', 1, 3)).toBeNull();
  });
});
