'use client';

import type { BoardPerson } from '@/modules/roster';
import { daysBetween } from '@/modules/units';
import { DimensionLine } from '../dimension-line';
import { inRem } from '../floor-graphic/use-width';
import { useGridFrame } from './grid-context';

interface Props {
  readonly leave: BoardPerson['leave'];
  readonly column: number;
}

const widthForWords = 72;

/**
 * Leave as a dimension line over the columns it takes, drawn from the cell of its first day in view. The
 * cells below say it too.
 */
export function LeaveLine({ leave, column }: Props) {
  const { days, sizes } = useGridFrame();
  const first = days[0]?.date ?? '';
  const begun = leave.find(
    ({ startsOn, endsOn }) =>
      Math.max(0, daysBetween(first, startsOn)) === column && daysBetween(first, endsOn) >= column,
  );
  if (!begun) return null;
  const last = Math.min(days.length - 1, daysBetween(first, begun.endsOn));
  const width = (last - column + 1) * sizes.dayWidth;
  const words = `leave ${daysBetween(begun.startsOn, begun.endsOn) + 1} d`;
  return (
    <span
      aria-hidden="true"
      className="pointer-events-none absolute inset-y-0 left-0 z-1 flex items-center px-0.5"
      style={{ width: inRem(width) }}
    >
      <DimensionLine>{width >= widthForWords ? words : null}</DimensionLine>
    </span>
  );
}
