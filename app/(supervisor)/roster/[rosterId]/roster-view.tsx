'use client';

import { useQuery } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { dateRangeWithYear } from '@/app/_ui/clock';
import { graphicStateOf } from '@/app/_ui/floor-graphic';
import { BoardView } from '@/app/_ui/people-grid';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { Board } from '@/modules/roster';
import { boardFigures } from './board-figures';
import { leadOf } from './board-words';
import { RosterActions } from './roster-actions';
import { ShortageList } from './shortage-list';

/** The roster of one period: the floor graphic over the people grid, and what can be done with it. */
export function RosterView({ start }: { readonly start: Board }) {
  const { data: board } = useQuery({
    queryKey: ['board', start.rosterId],
    queryFn: () => callApi<Board>('GET', `rosters/${start.rosterId}`),
    initialData: start,
  });
  const isEmpty = graphicStateOf(board.lanes, board.proof !== null) !== 'cover';
  return (
    <>
      <Verdict
        lead={leadOf(board)}
        actions={board.mayEdit ? <RosterActions board={board} /> : null}
      >
        Roster, {dateRangeWithYear(board.startsOn, board.endsOn)}
      </Verdict>
      {isEmpty ? null : <ShortageList board={board} />}
      <BoardView board={board} />
      <TitleBlock figures={boardFigures(board)} />
    </>
  );
}
