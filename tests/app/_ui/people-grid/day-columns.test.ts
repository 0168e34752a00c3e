import { describe, expect, it } from 'vitest';
import { columnSizes } from '@/app/_ui/people-grid/day-columns';

describe('column sizes', () => {
  it('fit four weeks and the days before them into a wide strip', () => {
    expect(columnSizes(1300, 31, null)).toMatchObject({ zoom: 4, dayWidth: 35, nameWidth: 208 });
  });

  it('never let a day fall under 28 units: the strip scrolls instead', () => {
    expect(columnSizes(900, 31, null).dayWidth).toBe(28);
    expect(columnSizes(320, 31, 4).dayWidth).toBe(28);
  });

  it('show one week on narrow strips, with taller rows and no hours', () => {
    expect(columnSizes(358, 31, null)).toEqual({
      zoom: 1,
      dayWidth: 36,
      nameWidth: 104,
      hasHours: false,
      rowHeight: 44,
    });
  });

  it('keep the zoom that was asked for', () => {
    expect(columnSizes(358, 31, 2).zoom).toBe(2);
    expect(columnSizes(1104, 31, 1)).toMatchObject({ zoom: 1, dayWidth: 128 });
  });
});
