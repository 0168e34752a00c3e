import { describe, expect, it } from 'vitest';
import {
  clockRange,
  dateRange,
  dateRangeWithYear,
  formatInstant,
  hours,
  longDay,
  spokenClockRange,
} from '@/app/_ui/clock';

describe('dates and times for people', () => {
  it('write days and ranges without repeating a month', () => {
    expect(longDay('2027-02-12')).toBe('Friday 12 February');
    expect(dateRange('2027-02-01', '2027-02-28')).toBe('1–28 February');
    expect(dateRange('2027-02-22', '2027-03-21')).toBe('22 February–21 March');
    expect(dateRange('2027-02-01', '2027-02-28', ' to ')).toBe('1 to 28 February');
    expect(dateRange('2027-02-01', '2027-02-01')).toBe('1 February');
    expect(dateRangeWithYear('2027-02-01', '2027-02-28')).toBe('1–28 February 2027');
  });

  it('write times in full and say them briefly', () => {
    expect(clockRange(1380, 1860)).toBe('23:00–07:00');
    expect(spokenClockRange(420, 900)).toBe('7 to 15');
    expect(spokenClockRange(450, 1860)).toBe('7:30 to 7');
  });

  it('write hours and instants on the wall clock of the team', () => {
    expect(hours(450)).toBe('7.5 h');
    expect(formatInstant(Date.parse('2027-01-15T09:05:00Z'), 'Europe/Berlin')).toBe(
      'Fri 15 Jan, 10:05',
    );
  });
});
