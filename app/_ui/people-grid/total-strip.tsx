'use client';

import { useMemo } from 'react';
import { coverSentence, graphicStateOf } from '../floor-graphic';
import { weekendBands } from '../floor-graphic/bands';
import { coverSteps } from '../floor-graphic/cover-steps';
import { layOut } from '../floor-graphic/drawing';
import { FloorDrawing } from '../floor-graphic/floor-drawing';
import { labelledShortages } from '../floor-graphic/sentence';
import { inRem } from '../floor-graphic/use-width';
import { daysBefore } from './board-rows';
import { useGridFrame } from './grid-context';
import { NamedDays } from './named-days';

const height = 76;

/** Cover of all skills above the day heads, over the same columns. */
export function TotalStrip() {
  const { board, days, edges, sizes } = useGridFrame();
  const width = board.days.length * sizes.dayWidth;
  const state = graphicStateOf(board.lanes, board.proof !== null);
  const drawing = useMemo(() => {
    const steps = coverSteps(board.lanes);
    const shortages = labelledShortages(board);
    return layOut({ steps, shortages, edges, width, height, state });
  }, [board, edges, width, state]);
  return (
    <tr>
      <th
        scope="row"
        className="sticky left-0 z-2 bg-paper pt-10 pr-2 text-left align-top text-note leading-tight font-normal text-ink2"
      >
        <span className="block text-body font-[660] text-ink">All skills</span>
        people on duty
        <span className="phone:hidden">, hour by hour</span>
        {drawing.top.people > 0 && state !== 'no-floors' ? (
          <span
            className="absolute right-1.5 -translate-y-1/2 tabular-nums text-ink3"
            style={{ top: `calc(2.5rem + ${inRem(drawing.top.y)})` }}
          >
            <span className="sr-only">, highest floor </span>
            {drawing.top.people}
          </span>
        ) : null}
      </th>
      <td colSpan={days.length} className="pt-10">
        <span
          className="relative block"
          style={{
            marginLeft: inRem(daysBefore * sizes.dayWidth),
            width: inRem(width),
            height: inRem(height),
          }}
        >
          <FloorDrawing
            drawing={drawing}
            width={width}
            height={height}
            bands={weekendBands(board.days, width)}
            sentence={coverSentence(board, 'all skills', state)}
            className="h-full w-full"
          />
          <NamedDays />
        </span>
      </td>
    </tr>
  );
}
