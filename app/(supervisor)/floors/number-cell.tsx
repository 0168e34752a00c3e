'use client';

import { type KeyboardEvent, type PointerEvent, useRef } from 'react';
import { cellName, type FloorRow } from './floor-rows';
import { readKey } from './grid-keys';
import { type GridPlace, isInside } from './grid-selection';
import { NumberEditor } from './number-editor';
import { topLine } from './top-line';
import { type FloorGrid, hasRange, runCommand } from './use-floor-grid';
import type { CellState } from './use-floor-needs';

interface Props {
  readonly grid: FloorGrid;
  readonly row: FloorRow;
  readonly place: GridPlace;
  readonly state: CellState;
}

/** One number of the floors table: to move to, select, open and type over. */
export function NumberCell({ grid, row, place, state }: Props) {
  const { selection } = grid;
  const people = row.floor.needs[place.column] ?? 0;
  const isActive = isSamePlace(selection.active, place);
  const isSelected = hasRange(grid) && isInside(selection, place);
  const typed = isActive ? grid.typing.typed : null;
  const name = cellName(row, place.column, people);
  const pointing = usePointing(grid, place, isActive);
  const onKeyDown = (event: KeyboardEvent) => {
    const command = readKey(event, hasRange(grid));
    if (!command) return;
    event.preventDefault();
    runCommand(grid, command);
  };
  const handlers = {
    onKeyDown,
    onFocus: () => isActive || grid.select(place, false),
    ...pointing,
  };
  return (
    <td
      // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: the cell of a grid (ARIA 1.2)
      role="gridcell"
      aria-label={typed ? undefined : state === 'unsaved' ? `${name}, not saved` : name}
      aria-selected={isSelected}
      data-place={typed ? undefined : `${place.row} ${place.column}`}
      tabIndex={isActive && !typed ? 0 : -1}
      className={`${topLine(row)} ${cellClass(place.column, people, isActive, isSelected, state)}`}
      // While a number is typed its field has the keys and the pointer.
      {...(typed ? {} : handlers)}
    >
      {typed ? <NumberEditor grid={grid} typed={typed} name={name} /> : people}
      {state === 'unsaved' ? <span className="absolute top-0 right-1 text-note">!</span> : null}
    </td>
  );
}

/** Mouse: press, draw a range, press twice to open. Touch and pen: a tap opens, or draws a range. */
function usePointing(grid: FloorGrid, place: GridPlace, isActive: boolean) {
  const isTouch = useRef(false);
  return {
    onPointerDown: (event: PointerEvent) => {
      isTouch.current = event.pointerType !== 'mouse';
      if (isTouch.current || event.button !== 0) return;
      grid.select(place, event.shiftKey);
    },
    onPointerEnter: ({ pointerType, buttons }: PointerEvent) => {
      if (pointerType !== 'mouse' || buttons !== 1 || isActive) return;
      grid.move(stepTo(grid.selection.active, place), true);
    },
    // A finger that scrolls never gets here: its pointer is cancelled first.
    onPointerUp: () => {
      if (isTouch.current) grid.select(place, false);
    },
    onClick: () => {
      if (isTouch.current && grid.drawing === 'off') grid.open(place, null);
    },
    onDoubleClick: () => grid.open(place, null),
  };
}

const isSamePlace = (one: GridPlace, other: GridPlace): boolean =>
  one.row === other.row && one.column === other.column;

const stepTo = (from: GridPlace, to: GridPlace) => ({
  rows: to.row - from.row,
  columns: to.column - from.column,
});

function cellClass(
  column: number,
  people: number,
  isActive: boolean,
  isSelected: boolean,
  state: CellState,
): string {
  const ground = isSelected ? 'bg-act-wash' : column === 5 || column === 6 ? 'bg-recess' : '';
  const lines = {
    saved: '',
    saving: 'outline-2 outline-dotted outline-edge -outline-offset-2',
    unsaved: 'outline-2 outline-dashed outline-short -outline-offset-2 text-short',
  }[state];
  return [
    'relative cursor-cell p-0 text-center select-none touch-manipulation',
    column === 7 ? 'border-l border-l-ink' : '',
    isActive ? 'z-1 bg-lift outline-[2.5px] outline-act -outline-offset-2' : ground,
    isActive && state === 'saved' ? '' : lines,
    people === 0 ? 'text-ink3' : 'font-[660]',
  ].join(' ');
}
