import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  edgesOf,
  extendTo,
  isInside,
  isRange,
  keepInside,
  moveBy,
  selectOne,
} from '@/app/(supervisor)/floors/grid-selection';

const far = Number.POSITIVE_INFINITY;
const at = (row: number, column: number) => selectOne({ row, column });

describe('moving in the grid', () => {
  it.each([
    ['stops at the upper left corner', at(0, 0), -1, -1, 0, 0],
    ['reaches the button behind the numbers', at(0, 7), 0, 1, 0, 8],
    ['stops behind the button', at(0, 8), 0, 1, 0, 8],
    ['stops at the last row', at(3, 2), 1, 0, 3, 2],
    ['goes to the edge', at(2, 3), 0, far, 2, 8],
    ['goes to the last corner', at(0, 0), far, far, 3, 8],
  ])('%s', (_, from, rows, columns, row, column) => {
    expect(moveBy(from, { rows, columns }, 4, false)).toEqual(at(row, column));
  });

  it('never leaves the table', () => {
    const steps = fc.array(
      fc.record({
        rows: fc.constantFrom(-far, -1, 0, 1, far),
        columns: fc.constantFrom(-far, -1, 0, 1, far),
        isExtending: fc.boolean(),
      }),
    );
    fc.assert(
      fc.property(steps, fc.integer({ min: 1, max: 9 }), (moves, rowCount) => {
        let selection = at(0, 0);
        for (const { isExtending, ...step } of moves) {
          selection = moveBy(selection, step, rowCount, isExtending);
          const { top, bottom, left, right } = edgesOf(selection);
          expect(top >= 0 && bottom < rowCount && left >= 0 && right <= 8).toBe(true);
          expect(!isRange(selection) || right < 8).toBe(true);
        }
      }),
    );
  });
});

describe('a range', () => {
  it('is drawn from its anchor in any direction', () => {
    const range = extendTo(at(2, 5), { row: 0, column: 3 });
    expect(edgesOf(range)).toEqual({ top: 0, bottom: 2, left: 3, right: 5 });
    expect(isInside(range, { row: 1, column: 4 })).toBe(true);
    expect(isInside(range, { row: 1, column: 6 })).toBe(false);
  });

  it('holds numbers only, also when it begins at a button', () => {
    expect(edgesOf(moveBy(at(1, 8), { rows: 1, columns: 0 }, 4, true))).toEqual({
      top: 1,
      bottom: 2,
      left: 7,
      right: 7,
    });
  });

  it('ends with the next plain move', () => {
    const range = moveBy(at(0, 0), { rows: 1, columns: 1 }, 4, true);
    expect(isRange(range)).toBe(true);
    expect(isRange(moveBy(range, { rows: 0, columns: 1 }, 4, false))).toBe(false);
  });
});

it('stays inside a table that lost rows', () => {
  expect(keepInside(at(5, 2), 3)).toEqual(at(2, 2));
  expect(keepInside(at(5, 2), 0)).toEqual(at(0, 2));
});
