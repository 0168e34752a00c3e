import { describe, expect, it } from 'vitest';
import { atLocalMinute, columnEdges, drawnDays, toColumn } from '@/app/_ui/floor-graphic/day-axis';

const startsAt7 = 420;

describe('the day axis', () => {
  const week = drawnDays('2027-02-01', '2027-02-07', 'Europe/Berlin');

  it('has one edge more than days, each at the start of the earliest shift', () => {
    const edges = columnEdges(week, startsAt7);
    expect(edges).toHaveLength(8);
    expect(edges[0]).toBe(420);
    expect(edges[7]).toBe(7 * 1440 + 420);
  });

  it('puts a night into the column of the day on which it starts', () => {
    const edges = columnEdges(week, startsAt7);
    expect(toColumn(edges, 23 * 60)).toBeCloseTo(2 / 3);
    expect(toColumn(edges, 31 * 60)).toBe(1);
  });

  it('counts on in days of 24 hours before and after the period', () => {
    const edges = columnEdges(week, startsAt7);
    expect(toColumn(edges, 420 - 1440)).toBe(-1);
    expect(toColumn(edges, 7 * 1440 + 420 + 720)).toBe(7.5);
  });

  it('marks weekends', () => {
    expect(week.map(({ isWeekend }) => isWeekend)).toEqual([
      false,
      false,
      false,
      false,
      false,
      true,
      true,
    ]);
  });

  it('has no edges without days', () => {
    expect(columnEdges([], startsAt7)).toEqual([]);
  });
});

describe('across a clock change', () => {
  // Berlin, 28 March 2027: 02:00 becomes 03:00, the day has 23 hours.
  const spring = drawnDays('2027-03-27', '2027-03-29', 'Europe/Berlin');

  it('gives the day of the spring change 23 hours', () => {
    expect(spring[1]).toMatchObject({ startMinute: 1440, endMinute: 1440 + 1380 });
  });

  it('finds 07:00 and 23:00 where the clock shows them', () => {
    expect(atLocalMinute(spring, 1, 7 * 60)).toBe(1440 + 6 * 60);
    expect(atLocalMinute(spring, 1, 23 * 60)).toBe(1440 + 22 * 60);
    expect(atLocalMinute(spring, 0, 31 * 60)).toBe(1440 + 6 * 60);
  });

  it('finds 01:00 before the change', () => {
    expect(atLocalMinute(spring, 1, 60)).toBe(1440 + 60);
  });

  it('lets the column of the night before be an hour shorter', () => {
    const edges = columnEdges(spring, startsAt7);
    expect((edges[1] ?? 0) - (edges[0] ?? 0)).toBe(1380);
    expect(toColumn(edges, edges[1] ?? 0)).toBe(1);
  });
});
