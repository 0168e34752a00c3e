'use client';

import { useId, useMemo, useRef, useState } from 'react';
import type { Board } from '@/modules/roster';
import { ChoiceBar } from '../choice-bar';
import { columnEdges } from '../floor-graphic';
import { inRem, useWidth } from '../floor-graphic/use-width';
import { Legend } from '../legend';
import { daysBefore, gridDays, groupBoard } from './board-rows';
import { columnSizes, type Zoom, zooms } from './day-columns';
import { type GridFrame, GridFrameProvider } from './grid-context';
import { GridTable } from './grid-table';
import { Inspector } from './inspector';
import { useGridFocus } from './use-grid-focus';
import { useKeepInView } from './use-keep-in-view';

const widthBeforeMeasuring = 1096;
const zoomChoices = zooms.map((weeks) => ({
  value: weeks,
  label: weeks === 1 ? '1 week' : `${weeks} weeks`,
}));
const noRow = { row: 0, column: daysBefore };

/**
 * The roster board: cover above, people below on the same day columns, the inspector beside it. One tab
 * stop; arrows, Home, End, Page Up and Page Down move inside.
 */
export function PeopleGrid({ board }: { readonly board: Board }) {
  const [asked, setAsked] = useState<Zoom | null>(null);
  const strip = useRef<HTMLElement>(null);
  const helpId = useId();
  const stripWidth = useWidth(strip) ?? widthBeforeMeasuring;
  const groups = useMemo(() => groupBoard(board), [board]);
  const frame = useGridFrameOf(board, stripWidth, asked);
  const { days, sizes } = frame;
  const rows = groups.flatMap((group) => group.rows);
  const focus = useGridFocus(strip, { rows: rows.length, columns: days.length }, noRow);
  useKeepInView(strip, days, sizes, focus.selected?.column ?? null);
  const selectedRow = focus.selected ? rows[focus.selected.row] : undefined;
  const selectedDay = focus.selected ? days[focus.selected.column] : undefined;

  return (
    <div className="flex flex-wrap items-start gap-x-6 gap-y-4">
      <div className="min-w-0 flex-1 basis-[40rem] phone:basis-full">
        <div className="flex items-end justify-between gap-6 pb-1">
          <div className="phone:hidden">
            <Legend kinds={board.kinds} />
          </div>
          <p id={helpId} className="sr-only">
            Arrow keys move, Page Up and Page Down by a week.
          </p>
          <ChoiceBar
            label="Weeks in view"
            choices={zoomChoices}
            value={sizes.zoom}
            onChange={setAsked}
          />
        </div>
        <section
          ref={strip}
          aria-label="Roster board"
          className="relative overflow-auto print:max-h-none print:overflow-visible desk:tall:max-h-[calc(100dvh-11rem)]"
          style={{ scrollPaddingLeft: inRem(sizes.nameWidth) }}
        >
          <GridFrameProvider value={frame}>
            <GridTable groups={groups} focus={focus} helpId={helpId} />
          </GridFrameProvider>
        </section>
      </div>
      <Inspector board={board} row={selectedRow} day={selectedDay} />
    </div>
  );
}

function useGridFrameOf(board: Board, stripWidth: number, asked: Zoom | null): GridFrame {
  return useMemo(() => {
    const days = gridDays(board);
    const edges = columnEdges(board.days, board.dayStartsAtMinute);
    return { board, days, edges, sizes: columnSizes(stripWidth, days.length, asked) };
  }, [board, stripWidth, asked]);
}
