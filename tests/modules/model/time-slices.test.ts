import { describe, expect, it } from 'vitest';
import { coverSlices, holds, overlaps, sliceWindows } from '@/modules/model/time-slices';

const stretch = (startMinute: number, endMinute: number) => ({ startMinute, endMinute });

describe('stretches of time', () => {
  it('overlap when they share time, not when they touch', () => {
    expect(overlaps(stretch(0, 10), stretch(9, 20))).toBe(true);
    expect(overlaps(stretch(0, 10), stretch(10, 20))).toBe(false);
  });
  it('hold another when they are on all through it', () => {
    expect(holds(stretch(0, 10), stretch(0, 10))).toBe(true);
    expect(holds(stretch(0, 10), stretch(5, 11))).toBe(false);
  });
});

describe('slices', () => {
  const wide = stretch(0, 100);
  const narrow = stretch(40, 60);
  it('begin and end where a window or a shift does, and leave gaps out', () => {
    const far = stretch(200, 210);
    expect(sliceWindows([wide, narrow, far], [50, 150])).toEqual([
      { ...stretch(0, 40), windows: [wide] },
      { ...stretch(40, 50), windows: [wide, narrow] },
      { ...stretch(50, 60), windows: [wide, narrow] },
      { ...stretch(60, 100), windows: [wide] },
      { ...stretch(200, 210), windows: [far] },
    ]);
    expect(sliceWindows([], [50, 150])).toEqual([]);
  });
  it('are joined when they touch and nothing differs, with the minutes of both', () => {
    const slices = sliceWindows([wide], [30, 70]);
    expect(coverSlices(slices, () => ['a'])).toEqual([
      { ...stretch(0, 100), windows: [wide], covering: ['a'] },
    ]);
    const late = coverSlices(slices, ({ startMinute }) => (startMinute < 70 ? ['a'] : ['b']));
    expect(late.map(({ endMinute, covering }) => [endMinute, covering])).toEqual([
      [70, ['a']],
      [100, ['b']],
    ]);
  });
  it('are kept apart across a gap', () => {
    const apart = [
      { ...stretch(0, 10), windows: [wide] },
      { ...stretch(20, 30), windows: [wide] },
    ];
    expect(coverSlices(apart, () => [])).toHaveLength(2);
  });
});
