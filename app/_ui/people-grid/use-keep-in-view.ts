'use client';

import { type RefObject, useEffect, useRef } from 'react';
import { daysBefore, type GridDay } from './board-rows';
import { type ColumnSizes, gridWidth } from './day-columns';

/**
 * After a change of zoom or width the selected day stands beside the names; without one, today, else the first day
 * of the period. The whole period in view stays where it is.
 */
export function useKeepInView(
  strip: RefObject<HTMLElement | null>,
  days: readonly GridDay[],
  sizes: ColumnSizes,
  selectedColumn: number | null,
): void {
  const today = days.findIndex(({ isToday, dayIndex }) => isToday && dayIndex >= 0);
  const column = selectedColumn ?? (today >= 0 ? today : daysBefore);
  const latest = useRef(column);
  useEffect(() => {
    latest.current = column;
  }, [column]);
  const { zoom, nameWidth, dayWidth } = sizes;
  const width = gridWidth({ nameWidth, dayWidth }, days.length);
  useEffect(() => {
    const node = strip.current;
    if (!node) return;
    const left = (latest.current * dayWidth) / width;
    node.scrollLeft = zoom === 4 ? 0 : node.scrollWidth * left;
  }, [strip, zoom, dayWidth, width]);
}
