import type { BoardCell, BoardKind } from '@/modules/roster';
import { toColumn } from '../floor-graphic/day-axis';

/** Where a brick lies in its day column, as fractions of the column's width. */
export interface BrickPlace {
  readonly left: number;
  readonly width: number;
}

/** True hours of a shift inside the column of its own day; it may reach into the next column. */
export function brickPlace(
  edges: readonly number[],
  dayIndex: number,
  { startMinute, endMinute }: Pick<BoardCell, 'startMinute' | 'endMinute'>,
): BrickPlace {
  const start = toColumn(edges, startMinute);
  return { left: start - dayIndex, width: toColumn(edges, endMinute) - start };
}

const letterWidth = 7.3;

/** The letters that fit into a brick of a width in drawing units: all of them, or the first. */
export const fittingLetter = ({ letter }: Pick<BoardKind, 'letter'>, width: number): string =>
  letter.length * letterWidth <= width ? letter : letter.slice(0, 1);
