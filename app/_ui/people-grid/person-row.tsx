'use client';

import { memo } from 'react';
import { formatHours } from '@/modules/units';
import { inRem } from '../floor-graphic/use-width';
import type { PersonRow } from './board-rows';
import { DayCell } from './day-cell';
import { useGridFrame } from './grid-context';

interface Props {
  readonly row: PersonRow;
  /** Column that takes the Tab key, when it is in this row. */
  readonly tabColumn: number | null;
  /** Column of the selected cell, when it is in this row. */
  readonly selectedColumn: number | null;
}

/** One person: name and hours, then a cell for each day. */
export const PersonRowView = memo(function PersonRowView(props: Props) {
  const { row, tabColumn, selectedColumn } = props;
  const { days, sizes } = useGridFrame();
  return (
    <tr style={{ height: inRem(sizes.rowHeight) }}>
      <th
        scope="row"
        className={`sticky left-0 z-2 border-b border-rule pr-2 text-left text-second leading-tight font-normal desk:pl-2.5 ${
          selectedColumn === null ? 'bg-paper' : 'bg-act-wash'
        }`}
      >
        <span className="flex items-center justify-between gap-2">
          <span className={sizes.hasHours ? 'truncate' : ''}>{row.person.name}</span>
          {sizes.hasHours ? <PlannedHours row={row} /> : null}
        </span>
      </th>
      {days.map((day, column) => (
        <DayCell
          key={day.date}
          row={row}
          day={day}
          column={column}
          isTabStop={tabColumn === column}
          isSelected={selectedColumn === column}
        />
      ))}
    </tr>
  );
});

/** Hours planned in the period and, after a plus, how many of them are overtime. */
function PlannedHours({ row }: { readonly row: PersonRow }) {
  const { plannedMinutes, overtimeMinutes } = row.person;
  return (
    <span className="shrink-0 tabular-nums print:hidden">
      {formatHours(plannedMinutes)}
      <span className="sr-only"> hours planned</span>
      {overtimeMinutes > 0 ? (
        <>
          {' '}
          <strong className="font-[700]">+{formatHours(overtimeMinutes)}</strong>
          <span className="sr-only"> of them overtime</span>
        </>
      ) : null}
    </span>
  );
}
