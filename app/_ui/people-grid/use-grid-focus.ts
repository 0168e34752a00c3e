'use client';

import { type FocusEvent, type KeyboardEvent, type RefObject, useState } from 'react';
import { type GridPlace, type GridSize, moveFocus } from './move-focus';

/** Roving focus of a grid whose cells carry `data-place="row:column"`. */
export interface GridFocus {
  /** The one cell that takes the Tab key. */
  readonly tabStop: GridPlace;
  /** The cell that was focused last; null until the grid was entered. */
  readonly selected: GridPlace | null;
  readonly onKeyDown: (event: KeyboardEvent) => void;
  readonly onFocus: (event: FocusEvent) => void;
}

/** Keeps which cell has the focus; the selection follows it and stays when the focus leaves the grid. */
export function useGridFocus(
  grid: RefObject<HTMLElement | null>,
  size: GridSize,
  start: GridPlace,
): GridFocus {
  const [selected, setSelected] = useState<GridPlace | null>(null);
  const tabStop = selected ?? start;

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.metaKey || !placeOf(event.target)) return;
    const next = moveFocus(event.key, event.ctrlKey, tabStop, size);
    if (!next) return;
    event.preventDefault();
    grid.current?.querySelector<HTMLElement>(`[data-place="${next.row}:${next.column}"]`)?.focus();
  };

  const onFocus = (event: FocusEvent) => {
    const place = placeOf(event.target);
    if (place) setSelected(place);
  };

  return { tabStop, selected, onKeyDown, onFocus };
}

function placeOf(target: EventTarget): GridPlace | null {
  const text = target instanceof HTMLElement ? target.dataset.place : undefined;
  const [row, column] = text?.split(':').map(Number) ?? [];
  return row === undefined || column === undefined ? null : { row, column };
}
