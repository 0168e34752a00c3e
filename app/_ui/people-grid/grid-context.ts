'use client';

import { createContext, useContext } from 'react';
import type { Board } from '@/modules/roster';
import type { GridDay } from './board-rows';
import type { ColumnSizes } from './day-columns';

/** What every row of the grid shares. */
export interface GridFrame {
  readonly board: Board;
  readonly days: readonly GridDay[];
  /** Edges of the period's day columns on the time axis. */
  readonly edges: readonly number[];
  readonly sizes: ColumnSizes;
}

const Frame = createContext<GridFrame | null>(null);

/** Gives the rows their frame. */
export const GridFrameProvider = Frame.Provider;

/** The frame of the grid around a row. */
export function useGridFrame(): GridFrame {
  const frame = useContext(Frame);
  if (!frame) throw new Error('A row of the people grid stands outside the grid');
  return frame;
}
