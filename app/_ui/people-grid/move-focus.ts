/** A cell of the grid: person row and day column, both from 0. */
export interface GridPlace {
  readonly row: number;
  readonly column: number;
}

export interface GridSize {
  readonly rows: number;
  readonly columns: number;
}

const daysPerWeek = 7;

/**
 * Where a key leads from a cell, or null when the key is not one of the grid's. Arrows stop at the edges,
 * Page Up and Page Down move by a week, Home and End to the row's ends, with Ctrl to the grid's.
 */
export function moveFocus(
  key: string,
  isCtrl: boolean,
  { row, column }: GridPlace,
  { rows, columns }: GridSize,
): GridPlace | null {
  const at = (nextRow: number, nextColumn: number): GridPlace => ({
    row: Math.min(rows - 1, Math.max(0, nextRow)),
    column: Math.min(columns - 1, Math.max(0, nextColumn)),
  });
  switch (key) {
    case 'ArrowLeft':
      return at(row, column - 1);
    case 'ArrowRight':
      return at(row, column + 1);
    case 'ArrowUp':
      return at(row - 1, column);
    case 'ArrowDown':
      return at(row + 1, column);
    case 'PageUp':
      return at(row, column - daysPerWeek);
    case 'PageDown':
      return at(row, column + daysPerWeek);
    case 'Home':
      return at(isCtrl ? 0 : row, 0);
    case 'End':
      return at(isCtrl ? rows - 1 : row, columns - 1);
    default:
      return null;
  }
}
