'use client';

import { useEffect, useId, useMemo, useRef, useState } from 'react';
import type { Board } from '@/modules/roster';
import { ChoiceBar } from '../choice-bar';
import { dateRangeWithYear } from '../clock';
import { columnEdges } from '../floor-graphic';
import { coverSteps } from '../floor-graphic/cover-steps';
import { highestStack } from '../floor-graphic/drawing';
import { inRem, useWidth } from '../floor-graphic/use-width';
import { Legend } from '../legend';
import { daysBefore, gridDays, groupBoard } from './board-rows';
import { columnSizes, type Zoom, zooms } from './day-columns';
import { type GridFrame, GridFrameProvider } from './grid-context';
import { GridHead } from './grid-head';
import { GroupRows } from './group-rows';
import { Inspector } from './inspector';
import { TotalStrip } from './total-strip';
import { useGridFocus } from './use-grid-focus';

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
  const highest = useMemo(
    () => Math.max(1, ...board.lanes.map((lane) => highestStack(coverSteps([lane])))),
    [board.lanes],
  );
  useKeepInView(strip, frame, focus.selected?.column ?? null);
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
            <table
              // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: a table of cells to move in is the grid pattern of ARIA
              role="grid"
              aria-label={`Roster ${dateRangeWithYear(board.startsOn, board.endsOn)}, people and days`}
              aria-describedby={helpId}
              aria-readonly="true"
              className="table-fixed border-separate border-spacing-0"
              style={{ width: inRem(gridWidth(sizes, days.length)) }}
              onKeyDown={focus.onKeyDown}
              onFocus={focus.onFocus}
            >
              <colgroup>
                <col style={{ width: inRem(sizes.nameWidth) }} />
                <col span={days.length} style={{ width: inRem(sizes.dayWidth) }} />
              </colgroup>
              <thead className="sticky top-0 z-3 bg-paper">
                <TotalStrip />
                <GridHead />
              </thead>
              {groups.map((group) => (
                <GroupRows
                  key={group.name}
                  group={group}
                  tabStop={focus.tabStop}
                  selected={focus.selected}
                  highest={highest}
                />
              ))}
            </table>
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

/** After a change of zoom the selected day, else the first of the period, stands beside the names. */
function useKeepInView(
  strip: React.RefObject<HTMLElement | null>,
  { sizes, days }: GridFrame,
  selectedColumn: number | null,
): void {
  const column = useRef(selectedColumn);
  column.current = selectedColumn;
  useEffect(() => {
    const node = strip.current;
    if (!node || sizes.zoom === 4) return;
    const today = days.findIndex(({ isToday, dayIndex }) => isToday && dayIndex >= 0);
    const shown = column.current ?? (today >= 0 ? today : daysBefore);
    node.scrollLeft = (node.scrollWidth * (shown * sizes.dayWidth)) / gridWidth(sizes, days.length);
  }, [strip, sizes, days]);
}

const gridWidth = (sizes: GridFrame['sizes'], columns: number): number =>
  sizes.nameWidth + columns * sizes.dayWidth;
