/** Weeks that fit into the strip at once. */
export const zooms = [1, 2, 4] as const;
export type Zoom = (typeof zooms)[number];

/** Sizes of the grid in drawing units (sixteenths of a rem). */
export interface ColumnSizes {
  readonly zoom: Zoom;
  readonly nameWidth: number;
  readonly dayWidth: number;
  /** Whether hours stand beside the names. */
  readonly hasHours: boolean;
  /** Narrow strips get taller rows, to be hit by a finger. */
  readonly rowHeight: number;
}

const narrowStrip = 600;
const narrowestDay = 28;
const mostColumnsAtOnce = 31;
const rowHeights: Record<Zoom, number> = { 1: 40, 2: 28, 4: 24 };

/**
 * Column widths for a strip: as many weeks as asked for, but never a day under 28 units; beyond that the
 * strip scrolls. Narrow strips show one week unless another zoom is asked for.
 */
export function columnSizes(stripWidth: number, columns: number, asked: Zoom | null): ColumnSizes {
  const isNarrow = stripWidth < narrowStrip;
  const zoom = asked ?? (isNarrow ? 1 : 4);
  const nameWidth = isNarrow ? 104 : 208;
  const shown = zoom === 4 ? Math.min(columns, mostColumnsAtOnce) : 7 * zoom;
  return {
    zoom,
    nameWidth,
    dayWidth: Math.max(narrowestDay, Math.floor((stripWidth - nameWidth) / shown)),
    hasHours: !isNarrow,
    rowHeight: isNarrow ? 44 : rowHeights[zoom],
  };
}

/** Width of names and all days together, in drawing units. */
export const gridWidth = (
  { nameWidth, dayWidth }: Pick<ColumnSizes, 'nameWidth' | 'dayWidth'>,
  columns: number,
): number => nameWidth + columns * dayWidth;
