'use client';

import { formatClock } from '@/modules/units';
import { dayNumber, longDay, weekdayName } from '../clock';
import { graphicStateOf, type ShortPlace, shortPlaces, shortPlaceText } from '../floor-graphic';
import type { GridDay } from './board-rows';
import { ground } from './day-cell';
import { useGridFrame } from './grid-context';

/** The row of day heads. Screen readers hear the day in full, with what is short on it. */
export function GridHead() {
  const { board, days } = useGridFrame();
  const isPlanned = graphicStateOf(board.lanes, board.proof !== null) === 'cover';
  const places = isPlanned ? shortPlaces(board) : [];
  const from = formatClock(board.dayStartsAtMinute);
  return (
    <tr>
      <th
        scope="col"
        className="sticky left-0 z-2 border-b-[1.5px] border-ink bg-paper pr-2 pb-0.5 text-left align-bottom text-note font-normal text-ink3"
      >
        {from} to {from}
        <span className="phone:hidden">, one column a day</span>
      </th>
      {days.map((day) => (
        <DayHead key={day.date} day={day} places={places} isPlanned={isPlanned} />
      ))}
    </tr>
  );
}

interface DayHeadProps {
  readonly day: GridDay;
  readonly places: readonly ShortPlace[];
  readonly isPlanned: boolean;
}

function DayHead({ day, places, isPlanned }: DayHeadProps) {
  const isBefore = day.dayIndex < 0;
  const short = places.filter(({ date }) => date === day.date).map(shortPlaceText);
  const description = short.length > 0 ? short.join('; ') : 'floor holds';
  const spoken = [longDay(day.date), day.holidayName, isBefore ? 'before this period' : null];
  return (
    <th
      scope="col"
      aria-label={spoken.filter(Boolean).join(', ')}
      aria-description={isPlanned && !isBefore ? description : undefined}
      className={`border-b-[1.5px] border-b-ink py-0.5 text-center text-note leading-tight font-normal ${ground(day)} ${headTone(day)}`}
    >
      <div>{weekdayName(day.date).slice(0, 2)}</div>
      <div className={isBefore ? '' : 'text-second font-[700]'}>{dayNumber(day.date)}</div>
    </th>
  );
}

function headTone(day: GridDay): string {
  if (day.dayIndex < 0) return 'text-ink3';
  const frame = day.holidayName ? 'outline-[1.25px] -outline-offset-2 outline-ink' : '';
  return `${frame} ${day.isToday ? 'text-act' : 'text-ink'}`;
}
