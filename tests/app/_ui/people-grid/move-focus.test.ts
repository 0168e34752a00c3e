import { describe, expect, it } from 'vitest';
import { moveFocus } from '@/app/_ui/people-grid/move-focus';

const size = { rows: 24, columns: 31 };
const from = { row: 5, column: 10 };

describe('moving inside the grid', () => {
  it.each([
    ['ArrowLeft', false, 5, 9],
    ['ArrowRight', false, 5, 11],
    ['ArrowUp', false, 4, 10],
    ['ArrowDown', false, 6, 10],
    ['PageUp', false, 5, 3],
    ['PageDown', false, 5, 17],
    ['Home', false, 5, 0],
    ['End', false, 5, 30],
    ['Home', true, 0, 0],
    ['End', true, 23, 30],
  ])('%s (Ctrl %s) leads to row %d, column %d', (key, isCtrl, row, column) => {
    expect(moveFocus(key, isCtrl, from, size)).toEqual({ row, column });
  });

  it('stops at the edges', () => {
    expect(moveFocus('ArrowUp', false, { row: 0, column: 0 }, size)).toEqual({ row: 0, column: 0 });
    expect(moveFocus('PageDown', false, { row: 0, column: 28 }, size)).toEqual({
      row: 0,
      column: 30,
    });
  });

  it('leaves other keys to the browser', () => {
    expect(moveFocus('Tab', false, from, size)).toBeNull();
    expect(moveFocus('e', false, from, size)).toBeNull();
  });
});
