import { describe, expect, it } from 'vitest';
import { readWindow, windowHint, writeWindow } from '@/app/(supervisor)/_window';

describe('a window typed as two times of day', () => {
  it.each([
    ['inside the day', '07:00', '15:00', 420, 900],
    ['written shortly', '7', '1530', 420, 930],
    ['past midnight', '23:00', '07:00', 1380, 1860],
    ['to midnight', '15:00', '24:00', 900, 1440],
    ['to midnight, as the first minute of the next day', '15:00', '00:00', 900, 1440],
    ['around the clock', '07:00', '07:00', 420, 1860],
  ])('is read %s', (_, start, end, startMinute, endMinute) => {
    expect(readWindow(start, end)).toEqual({ startMinute, endMinute });
  });

  it.each([
    ['', '15:00'],
    ['07:00', 'late'],
    ['25:00', '26:00'],
  ])('is no number when a time cannot be read: %j to %j', (start, end) => {
    const { startMinute, endMinute } = readWindow(start, end);
    expect(startMinute + endMinute).toBeNaN();
  });

  it('comes back as it was written', () => {
    expect(writeWindow({ startMinute: 1380, endMinute: 1860 })).toEqual({
      startMinute: '23:00',
      endMinute: '07:00',
    });
    const { startMinute, endMinute } = writeWindow({ startMinute: 900, endMinute: 1440 });
    expect(readWindow(startMinute, endMinute)).toEqual({ startMinute: 900, endMinute: 1440 });
  });
});

describe('the hint beside it', () => {
  it.each([
    ['07:00', '15:00', '8 h'],
    ['07:00', '15:20', '8.33 h'],
    ['23:00', '07:00', '8 h, ends the next day'],
    ['15:00', '24:00', '9 h'],
    ['07:00', '', 'An end that is not after the start is on the next day.'],
  ])('of %j to %j', (start, end, hint) => {
    expect(windowHint(start, end)).toBe(hint);
  });
});
