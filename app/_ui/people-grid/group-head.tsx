'use client';

import { useMemo } from 'react';
import { coverSentence, graphicStateOf, laneVerdict } from '../floor-graphic';
import { weekendBands } from '../floor-graphic/bands';
import { coverSteps } from '../floor-graphic/cover-steps';
import { layOut } from '../floor-graphic/drawing';
import { FloorDrawing } from '../floor-graphic/floor-drawing';
import { inRem } from '../floor-graphic/use-width';
import { type BoardGroup, daysBefore } from './board-rows';
import { useGridFrame } from './grid-context';

interface Props {
  readonly group: BoardGroup;
  readonly highest: number;
}

const height = 22;

/** Head of a group: its name, how its floor stands, and its cover over the grid's columns. */
export function GroupHead({ group, highest }: Props) {
  const { board, days, edges, sizes } = useGridFrame();
  const lanes = useMemo(() => (group.lane ? [group.lane] : []), [group.lane]);
  const state = graphicStateOf(lanes, board.proof !== null);
  const verdict = group.lane ? laneVerdict({ ...board, lanes }, state) : '';
  const width = board.days.length * sizes.dayWidth;
  const drawing = useMemo(
    () => layOut({ steps: coverSteps(lanes), shortages: [], edges, width, height, state, highest }),
    [lanes, edges, width, state, highest],
  );
  return (
    <tr>
      <th
        scope="row"
        className="sticky left-0 z-2 border-b-[1.5px] border-ink bg-paper pt-1.5 pr-2 text-left align-bottom font-normal"
      >
        <span className="flex flex-wrap items-baseline justify-between gap-x-2">
          <span className="text-body font-[660]">{group.name}</span>
          <span
            className={`text-note ${verdict.startsWith('short') ? 'font-[660] text-short' : 'text-ink2'}`}
          >
            {verdict}
          </span>
        </span>
      </th>
      <td colSpan={days.length} className="border-b-[1.5px] border-ink pt-1.5 align-bottom">
        {lanes.length > 0 ? (
          <span
            className="block"
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
              sentence={coverSentence({ ...board, lanes }, group.name, state)}
              className="h-full w-full"
            />
          </span>
        ) : null}
      </td>
    </tr>
  );
}
