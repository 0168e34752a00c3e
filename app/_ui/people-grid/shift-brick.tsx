'use client';

import type { BoardCell } from '@/modules/roster';
import { formatClock, type SkillId } from '@/modules/units';
import type { GridDay } from './board-rows';
import { Brick } from './brick';
import { brickPlace, fittingLetter } from './brick-place';
import { useGridFrame } from './grid-context';

interface Props {
  readonly cell: BoardCell;
  readonly day: Pick<GridDay, 'dayIndex'>;
  readonly homeSkillId: SkillId | undefined;
  /** Somebody from another group, drawn pale. */
  readonly isVisit?: boolean;
}

const widthForTimes = 40;

/** The brick of a cell at its true hours inside the day column. */
export function ShiftBrick({ cell, day, homeSkillId, isVisit = false }: Props) {
  const { board, edges, sizes } = useGridFrame();
  const kind = board.kinds.find(({ id }) => id === cell.kindId);
  if (!kind) return null;
  const { left, width } = brickPlace(edges, day.dayIndex, cell);
  const units = width * sizes.dayWidth;
  const isWide = sizes.zoom === 1 && units >= widthForTimes;
  return (
    <Brick
      kind={kind}
      letter={fittingLetter(kind, units)}
      times={isWide ? shortHours(kind.startMinute, kind.endMinute) : undefined}
      isSecondSkill={cell.postSkillId !== homeSkillId}
      isPale={isVisit || day.dayIndex < 0}
      isPinned={cell.isPinned}
      className={`pointer-events-none absolute inset-y-0.5 ${isWide ? 'text-[0.875rem]' : ''}`}
      style={{ left: `${left * 100}%`, width: `${width * 100}%` }}
    />
  );
}

/** `07–15`, or `07:30–15` when minutes count. */
function shortHours(startMinute: number, endMinute: number): string {
  return [startMinute, endMinute]
    .map((minute) => formatClock(minute).replace(/:00$/, ''))
    .join('–');
}
