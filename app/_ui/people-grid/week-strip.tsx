'use client';

import { useMemo, useRef } from 'react';
import type { Board } from '@/modules/roster';
import { Button } from '../button';
import { dayNumber, longDay, weekdayName } from '../clock';
import { columnEdges, coverSentence, graphicStateOf } from '../floor-graphic';
import { weekendBands } from '../floor-graphic/bands';
import { coverSteps } from '../floor-graphic/cover-steps';
import { layOut } from '../floor-graphic/drawing';
import { FloorDrawing } from '../floor-graphic/floor-drawing';
import { labelledShortages } from '../floor-graphic/sentence';
import { inRem, useWidth } from '../floor-graphic/use-width';

interface Props {
  readonly board: Board;
  readonly dayIndex: number;
  readonly onChoose: (dayIndex: number) => void;
}

const height = 80;
const widthBeforeMeasuring = 358;
const daysPerWeek = 7;

/** A week of cover with a button for each day, and steps to the weeks around it. */
export function WeekStrip({ board, dayIndex, onChoose }: Props) {
  const strip = useRef<HTMLDivElement>(null);
  const measured = useWidth(strip);
  const width = measured ?? widthBeforeMeasuring;
  const start = dayIndex - (dayIndex % daysPerWeek);
  const week = useMemo(
    () => ({ ...board, days: board.days.slice(start, start + daysPerWeek) }),
    [board, start],
  );
  const state = graphicStateOf(board.lanes, board.proof !== null);
  const drawing = layOut({
    steps: coverSteps(board.lanes),
    shortages: labelledShortages(week),
    edges: columnEdges(week.days, board.dayStartsAtMinute),
    width,
    height,
    state,
  });
  const isFirst = start === 0;
  const isLast = start + daysPerWeek >= board.days.length;
  return (
    <div>
      <div ref={strip} className="pt-7" style={{ height: `calc(${inRem(height)} + 1.75rem)` }}>
        <FloorDrawing
          drawing={drawing}
          width={width}
          height={height}
          bands={weekendBands(week.days, width)}
          sentence={coverSentence(week, 'all skills', state)}
          className="h-full w-full"
          isStretched={measured === null}
        />
      </div>
      <div className="line-group flex">
        {week.days.map(({ date }, index) => (
          <button
            key={date}
            type="button"
            aria-pressed={start + index === dayIndex}
            aria-label={longDay(date)}
            onClick={() => onChoose(start + index)}
            className={`min-h-11 min-w-0 flex-1 text-note leading-tight ${
              start + index === dayIndex
                ? 'bg-act-wash outline-2 -outline-offset-2 outline-act'
                : ''
            }`}
          >
            <span className="block text-ink2">
              {date === board.today ? 'today' : weekdayName(date)}
            </span>
            <span className="text-body font-[680]">{dayNumber(date)}</span>
          </button>
        ))}
      </div>
      <div className="flex justify-between">
        <Button look="quiet" disabled={isFirst} onClick={() => onChoose(start - daysPerWeek)}>
          ‹ Week before
        </Button>
        <Button look="quiet" disabled={isLast} onClick={() => onChoose(start + daysPerWeek)}>
          Week after ›
        </Button>
      </div>
    </div>
  );
}
