'use client';

import type { BoardCell } from '@/modules/roster';
import { longDay } from '../clock';
import { inRem } from '../floor-graphic/use-width';
import { visitorNames } from './board-rows';
import { shiftLabel } from './cell-label';
import { ground } from './day-cell';
import { useGridFrame } from './grid-context';
import { ShiftBrick } from './shift-brick';

/** Who works in this skill but stands in another group, as pale bricks, so that rows add up to the lane. */
export function VisitRow({ visits }: { readonly visits: readonly BoardCell[] }) {
  const { board, days, sizes } = useGridFrame();
  const names = visitorNames(board, visits).join(', ');
  const nameOf = (cell: BoardCell) => board.people.find(({ id }) => id === cell.personId)?.name;
  return (
    <tr style={{ height: inRem(sizes.rowHeight) }}>
      <th
        scope="row"
        title={names}
        className="sticky left-0 z-2 max-w-0 border-b border-rule bg-paper pr-2 text-left text-note font-normal text-ink2 desk:pl-2.5"
      >
        <span className="block truncate">also here: {names}</span>
      </th>
      {days.map((day) => {
        const own = visits.filter(({ date }) => date === day.date);
        return (
          <td key={day.date} className={`relative border-b border-rule ${ground(day)}`}>
            {own.map((cell) => (
              <span key={cell.personId}>
                <span className="sr-only">
                  {longDay(cell.date)}, {nameOf(cell)}, {shiftLabel(board, cell)}.
                </span>
                <ShiftBrick cell={cell} day={day} homeSkillId={cell.postSkillId} isVisit />
              </span>
            ))}
          </td>
        );
      })}
    </tr>
  );
}
