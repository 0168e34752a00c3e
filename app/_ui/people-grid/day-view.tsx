'use client';

import { useState } from 'react';
import type { Board } from '@/modules/roster';
import { clockRange, longDay } from '../clock';
import { shortPlaceText } from '../floor-graphic';
import { Brick } from './brick';
import { coverOfDay, type DayLine, type DayShift } from './day-cover';
import { WeekStrip } from './week-strip';

/** The board of phones: one day by shift, with its week above. */
export function DayView({ board }: { readonly board: Board }) {
  const today = board.days.findIndex(({ date }) => date === board.today);
  const [dayIndex, setDayIndex] = useState(Math.max(0, today));
  const day = board.days[dayIndex];
  if (!day) return null;
  const { shifts, others } = coverOfDay(board, day.date);
  return (
    <div>
      <h2 aria-live="polite" className="pb-1 text-verdict font-[660]">
        {longDay(day.date)}
        {day.holidayName ? <span className="text-head text-ink2">, {day.holidayName}</span> : null}
      </h2>
      <WeekStrip board={board} dayIndex={dayIndex} onChoose={setDayIndex} />
      {shifts.length === 0 ? (
        <p className="py-4 text-ink2">Nobody is planned on this day.</p>
      ) : (
        <p className="pt-2 text-right text-note text-ink2">on shift / needed to hold the floor</p>
      )}
      {shifts.map((shift) => (
        <ShiftSection key={shift.kind.id} shift={shift} isPlanned={board.proof !== null} />
      ))}
      {others.map((place) => (
        <p key={place.shiftName} className="py-2 font-[660] text-short">
          {shortPlaceText(place)}
        </p>
      ))}
    </div>
  );
}

function ShiftSection({
  shift: { kind, lines, short },
  isPlanned,
}: {
  readonly shift: DayShift;
  readonly isPlanned: boolean;
}) {
  const verdict = short > 0 ? `short ${short}` : 'floor holds';
  return (
    <section className="pt-3">
      <h3 className="line-group flex items-center gap-2 pb-1.5 text-head font-[660]">
        <Brick kind={kind} letter={kind.letter} className="h-5 min-w-4 px-0.5" />
        {kind.name}
        <span className="figures text-body font-normal text-ink2">
          {clockRange(kind.startMinute, kind.endMinute)}
        </span>
        {isPlanned ? (
          <span
            className={`ml-auto text-second ${short > 0 ? 'text-short' : 'font-normal text-ink2'}`}
          >
            {verdict}
          </span>
        ) : null}
      </h3>
      <ul>
        {lines.map((line) => (
          <Line key={line.skillName} line={line} />
        ))}
      </ul>
    </section>
  );
}

function Line({ line: { skillName, names, short } }: { readonly line: DayLine }) {
  return (
    <li className="line-row flex min-h-9 items-center gap-3 py-1.5">
      <span className="w-16 shrink-0 text-second text-ink2">{skillName}</span>
      <span className="flex min-w-0 flex-1 flex-wrap items-center gap-2">
        {names.join(', ')}
        {short > 0 ? (
          <>
            <span aria-hidden="true" className="hatch h-4 w-11" />
            <strong className="font-[660] text-short">short {short}</strong>
          </>
        ) : null}
      </span>
      <span className="figures shrink-0 text-second text-ink2">
        {names.length}/{names.length + short}
        <span className="sr-only"> on shift of those needed</span>
      </span>
    </li>
  );
}
