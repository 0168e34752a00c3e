'use client';

import { weekdayOf } from '@/modules/units';
import type { GridDay, PersonRow } from './board-rows';
import { cellLabel } from './cell-label';
import { useGridFrame } from './grid-context';
import { LeaveLine } from './leave-line';
import { ShiftBrick } from './shift-brick';

interface Props {
  readonly row: PersonRow;
  readonly day: GridDay;
  readonly column: number;
  readonly isTabStop: boolean;
  readonly isSelected: boolean;
}

/** One day of one person. */
export function DayCell({ row, day, column, isTabStop, isSelected }: Props) {
  const { board } = useGridFrame();
  const cell = row.cells.get(day.date);
  return (
    <td
      // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: a cell of a grid, said aloud for aria-selected
      role="gridcell"
      tabIndex={isTabStop ? 0 : -1}
      aria-label={cellLabel(board, row, day)}
      aria-selected={isSelected}
      data-place={`${row.index}:${column}`}
      className={`relative scroll-mt-36 cursor-default border-b border-rule hover:bg-recess ${ground(day)} ${
        isSelected
          ? 'bg-act-wash! outline-[2.5px] -outline-offset-1 outline-act print:outline-none'
          : ''
      }`}
    >
      {cell ? <ShiftBrick cell={cell} day={day} homeSkillId={row.person.skillIds[0]} /> : null}
      {row.breaches.has(day.date) ? (
        <span aria-hidden="true" className="absolute top-0 right-0.5 font-[760] text-short">
          !
        </span>
      ) : null}
      <LeaveLine leave={row.person.leave} column={column} />
    </td>
  );
}

/** Weekends stand on the recess; each week begins with an edge. */
export function ground(day: GridDay): string {
  const edge = weekdayOf(day.date) === 0 ? 'border-l border-l-edge' : '';
  return `${day.isWeekend ? 'bg-recess' : ''} ${edge}`;
}
