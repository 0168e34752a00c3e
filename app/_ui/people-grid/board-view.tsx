'use client';

import { useState } from 'react';
import type { Board } from '@/modules/roster';
import { formatDay } from '@/modules/units';
import { ChoiceBar } from '../choice-bar';
import { Legend } from '../legend';
import { DayView } from './day-view';
import { PeopleGrid } from './people-grid';

const views = [
  { value: 'day', label: 'One day' },
  { value: 'grid', label: 'Whole board' },
] as const;

/** The roster of one period: the people grid, or on phones one day by shift with the grid a tap away. */
export function BoardView({ board }: { readonly board: Board }) {
  const [view, setView] = useState<'day' | 'grid'>('day');
  return (
    <div>
      <ChoiceBar
        label="View"
        choices={views}
        value={view}
        onChange={setView}
        className="mb-3 desk:hidden print:hidden"
      />
      <div className={`desk:hidden print:hidden ${view === 'day' ? '' : 'hidden'}`}>
        <DayView board={board} />
      </div>
      <p className="hidden pb-2 font-[660] print:block">{printedWords(board)}</p>
      <div className={view === 'grid' ? '' : 'phone:hidden print:block'}>
        <PeopleGrid board={board} />
      </div>
      <div className="desk:hidden print:hidden">
        <Legend kinds={board.kinds} />
      </div>
    </div>
  );
}

/** A roster on the wall says whether it holds and of which day it is. */
function printedWords({ version, today }: Board): string {
  const asOf = `as of ${formatDay(today)} ${today.slice(0, 4)}`;
  return version.publishedAtUtc === null
    ? `DRAFT ${version.number}, not valid, ${asOf}`
    : `Version ${version.number}, ${asOf}`;
}
