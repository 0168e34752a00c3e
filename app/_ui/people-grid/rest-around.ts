import type { BoardCell } from '@/modules/roster';

/** Minutes without a shift on either side of one; null when no other shift is known on that side. */
export interface Rest {
  readonly beforeMinutes: number | null;
  readonly afterMinutes: number | null;
}

type Span = Pick<BoardCell, 'startMinute' | 'endMinute'>;

/** Rest before and after a shift among all known shifts of the same person, in any order. */
export function restAround(cells: Iterable<Span>, shift: Span): Rest {
  let earlier = Number.NEGATIVE_INFINITY;
  let later = Number.POSITIVE_INFINITY;
  for (const cell of cells) {
    if (cell.startMinute < shift.startMinute) earlier = Math.max(earlier, cell.endMinute);
    if (cell.startMinute > shift.startMinute) later = Math.min(later, cell.startMinute);
  }
  return {
    beforeMinutes: Number.isFinite(earlier) ? shift.startMinute - earlier : null,
    afterMinutes: Number.isFinite(later) ? later - shift.endMinute : null,
  };
}
