/** A place in the grid. Columns 0 to 7 hold numbers; the last one holds the button of its row. */
export interface GridPlace {
  readonly row: number;
  readonly column: number;
}

/** The cell with the keyboard, and the corner from which a range was drawn. */
export interface GridSelection {
  readonly anchor: GridPlace;
  readonly active: GridPlace;
}

/** A step; infinite ones go to the edge. */
export interface GridStep {
  readonly rows: number;
  readonly columns: number;
}

/** Columns that hold numbers. */
export const numberColumns = 8;
/** The column with the button of each row. */
export const buttonColumn = numberColumns;

/** A selection of one place. */
export const selectOne = (place: GridPlace): GridSelection => ({ anchor: place, active: place });

/** Draws the range from the anchor to a place; numbers only. */
export const extendTo = ({ anchor }: GridSelection, { row, column }: GridPlace): GridSelection => ({
  anchor: { ...anchor, column: Math.min(anchor.column, numberColumns - 1) },
  active: { row, column: Math.min(column, numberColumns - 1) },
});

/** Moves the active cell and stops at the edges; `isExtending` keeps the anchor. */
export function moveBy(
  selection: GridSelection,
  { rows, columns }: GridStep,
  rowCount: number,
  isExtending: boolean,
): GridSelection {
  const { active } = selection;
  const place = {
    row: clamp(active.row + rows, rowCount - 1),
    column: clamp(active.column + columns, buttonColumn),
  };
  return isExtending ? extendTo(selection, place) : selectOne(place);
}

/** Whether more than one cell is selected. */
export const isRange = ({ anchor, active }: GridSelection): boolean =>
  anchor.row !== active.row || anchor.column !== active.column;

/** First and last row and column of a selection, both included. */
export function edgesOf({ anchor, active }: GridSelection) {
  return {
    top: Math.min(anchor.row, active.row),
    bottom: Math.max(anchor.row, active.row),
    left: Math.min(anchor.column, active.column),
    right: Math.max(anchor.column, active.column),
  };
}

/** Whether a place lies in a selection. */
export function isInside(selection: GridSelection, { row, column }: GridPlace): boolean {
  const { top, bottom, left, right } = edgesOf(selection);
  return top <= row && row <= bottom && left <= column && column <= right;
}

/** Keeps a selection inside a table that lost rows. */
export function keepInside(selection: GridSelection, rowCount: number): GridSelection {
  const inside = (place: GridPlace) => ({ ...place, row: clamp(place.row, rowCount - 1) });
  return { anchor: inside(selection.anchor), active: inside(selection.active) };
}

const clamp = (value: number, most: number): number => Math.max(0, Math.min(most, value));
