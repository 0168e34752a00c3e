import { describe, expect, it } from 'vitest';
import { columnEdges, drawnDays } from '@/app/_ui/floor-graphic';
import { brickPlace, fittingLetter } from '@/app/_ui/people-grid/brick-place';

const edges = columnEdges(drawnDays('2027-02-01', '2027-02-07', 'Europe/Berlin'), 420);

describe('the place of a brick', () => {
  it('is its true hours inside the column of its day', () => {
    const late = brickPlace(edges, 2, { startMinute: 2 * 1440 + 900, endMinute: 2 * 1440 + 1380 });
    expect(late.left).toBeCloseTo(1 / 3);
    expect(late.width).toBeCloseTo(1 / 3);
  });

  it('may reach into the next column, and holds on days before the period', () => {
    const long = brickPlace(edges, 0, { startMinute: 1200, endMinute: 1920 });
    expect(long.left + long.width).toBeGreaterThan(1);
    const before = brickPlace(edges, -1, { startMinute: -60, endMinute: 420 });
    expect(before.left).toBeCloseTo(2 / 3);
    expect(before.width).toBeCloseTo(1 / 3);
  });
});

describe('the letter of a brick', () => {
  it('shortens to the first when all do not fit', () => {
    expect(fittingLetter({ letter: 'E' }, 9)).toBe('E');
    expect(fittingLetter({ letter: 'NT' }, 9)).toBe('N');
    expect(fittingLetter({ letter: 'NT' }, 15)).toBe('NT');
  });
});
