'use client';

import { useLayoutEffect, useRef, useState } from 'react';
import { assertNever } from '@/modules/units';
import type { FloorRow } from './floor-rows';
import type { GridCommand } from './grid-keys';
import {
  extendTo,
  type GridPlace,
  type GridStep,
  isRange,
  keepInside,
  moveBy,
  numberColumns,
  selectOne,
} from './grid-selection';
import { fill, setPeople } from './need-changes';
import type { FloorNeedsState } from './use-floor-needs';
import { useNeedEdits } from './use-need-edits';
import { useTyping } from './use-typing';

/** Drawing a range without keys: off, the next press is its first corner, or its other one. */
export type RangeDrawing = 'off' | 'begins' | 'grows';

/** Selection, typing, filling and undo of the floors table. */
export function useFloorGrid(rows: readonly FloorRow[], save: FloorNeedsState['save']) {
  const [chosen, setSelection] = useState(selectOne({ row: 0, column: 0 }));
  const [drawing, setDrawing] = useState<RangeDrawing>('off');
  const selection = keepInside(chosen, rows.length);
  const { active } = selection;
  const floors = rows.map(({ floor }) => floor);
  const edits = useNeedEdits(rows, save);
  const typing = useTyping((people) => edits.make(setPeople(floors, selectOne(active), people)));
  const { table, takeFocus } = useGridFocus(active, rows.length);
  const move = (step: GridStep, isExtending: boolean) => {
    setSelection(moveBy(selection, step, rows.length, isExtending));
    takeFocus();
  };
  const actions = {
    /** Goes to another cell; what is typed is finished first, and a wrong number is not left. */
    select: (place: GridPlace, isExtending: boolean) => {
      if (typing.typed && !typing.finish()) return;
      const isCorner = isExtending || drawing === 'grows';
      setSelection(isCorner ? extendTo(selection, place) : selectOne(place));
      if (drawing === 'begins') setDrawing('grows');
    },
    /** Opens a cell: what stands there, or a text that replaces it. */
    open: (place: GridPlace, text: string | null) => {
      if (place.column >= numberColumns) return;
      const standing = floors[place.row]?.needs[place.column] ?? 0;
      typing.open(text ?? String(standing), text === null);
    },
    fill: (towards: 'right' | 'down') =>
      edits.make(fill(floors, selection, towards), `Filled ${towards}`),
    clear: () => edits.make(setPeople(floors, selection, 0)),
    finish: (step: GridStep | null) => {
      if (typing.finish() && step) move(step, false);
    },
    cancel: () => {
      typing.cancel();
      takeFocus();
    },
    move,
    collapse: () => setSelection(selectOne(active)),
  };
  return { table, takeFocus, selection, drawing, setDrawing, edits, typing, ...actions };
}

export type FloorGrid = ReturnType<typeof useFloorGrid>;

/** Carries out what a key asks of the grid. */
export function runCommand(grid: FloorGrid, command: GridCommand): void {
  switch (command.do) {
    case 'move':
      grid.move(command.step, command.isExtending);
      break;
    case 'edit':
      grid.open(grid.selection.active, command.text);
      break;
    case 'fill':
      grid.fill(command.towards);
      break;
    case 'undo':
    case 'redo':
      grid.edits[command.do]();
      break;
    case 'clear':
    case 'collapse':
      grid[command.do]();
      break;
    default:
      assertNever(command);
  }
}

/** Whether more than one cell of the grid is selected. */
export const hasRange = ({ selection }: FloorGrid): boolean => isRange(selection);

/**
 * Puts the keyboard on the active place after the next drawing: when asked to, and when the row that had
 * it is gone.
 */
function useGridFocus({ row, column }: GridPlace, rowCount: number) {
  const table = useRef<HTMLTableElement>(null);
  const isWanted = useRef(false);
  const rowsBefore = useRef(rowCount);
  useLayoutEffect(() => {
    const isLost = rowCount < rowsBefore.current && document.activeElement === document.body;
    isWanted.current ||= isLost;
    rowsBefore.current = rowCount;
    if (!isWanted.current) return;
    isWanted.current = false;
    table.current?.querySelector<HTMLElement>(`[data-place="${row} ${column}"]`)?.focus();
  });
  const takeFocus = () => {
    isWanted.current = true;
  };
  return { table, takeFocus };
}
