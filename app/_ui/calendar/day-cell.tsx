'use client';

import type { DateHeaderProps } from 'react-big-calendar';
import type { LocalDate } from '@/modules/units';
import { dayNumber, longDay } from '../clock';
import { DayLine } from '../day-line';
import { KindMark } from '../kind-mark';
import { blockTimes, isDraft, ownDaySentence, teamDaySentence } from './block-words';
import type { Block } from './blocks';
import { type CalendarWorld, useCalendarWorld } from './calendar-world';
import { periodOn } from './period-edges';
import { dateOf } from './wall-date';

/** Kinds that fit into a cell; the others are counted and stand in the view of the day. */
const mostKinds = 4;

/** A day of the month: one button with everything the day holds, so that keyboard and finger reach it. */
export function DayCell({ date: moment, isOffRange }: DateHeaderProps) {
  const world = useCalendarWorld();
  const date = dateOf(moment);
  const blocks = world.blocksOn.get(date) ?? [];
  const notes = dayNotes(world, date);
  const isToday = date === world.frame.today;
  const isOwn = world.audience === 'own';
  const daySentence = isOwn ? ownDaySentence : teamDaySentence;
  return (
    <button
      type="button"
      aria-current={isToday ? 'date' : undefined}
      aria-pressed={world.selected === null ? undefined : date === world.selected}
      onClick={() => world.onPick(date)}
      className={`day-cell ${isOffRange ? 'text-ink3' : 'text-ink'}`}
    >
      <span className="sr-only">
        {world.isRead ? daySentence(date, blocks, notes) : longDay(date)}
      </span>
      <span aria-hidden="true" className="flex min-w-0 flex-1 flex-col">
        <span className="flex flex-wrap items-baseline justify-between gap-x-1">
          <span className="text-body font-[700]">{dayNumber(date)}</span>
          {isToday ? <span className="text-note font-[660] text-act">today</span> : null}
        </span>
        {notes.holidayName ? (
          <span className="text-note break-words text-ink2">{notes.holidayName}</span>
        ) : null}
        <span className="mt-auto block pt-2">
          {isOwn ? <OwnShifts blocks={blocks} isLeave={notes.isLeave} /> : null}
          {isOwn ? null : <Counts blocks={blocks} />}
          {isDraft(blocks) ? <span className="block text-note text-ink2">draft</span> : null}
        </span>
      </span>
    </button>
  );
}

function OwnShifts({
  blocks,
  isLeave,
}: {
  readonly blocks: readonly Block[];
  readonly isLeave: boolean;
}) {
  const { frame } = useCalendarWorld();
  return (
    <>
      {isLeave ? <span className="block text-note">leave</span> : null}
      {blocks.map((block) => (
        <span key={block.id} className="block">
          <span className="block truncate text-note">
            {block.kindName} <span className="text-ink2 phone:hidden">{blockTimes(block)}</span>
          </span>
          <DayLine shift={block} dayStartsAtMinute={frame.dayStartsAtMinute} />
        </span>
      ))}
    </>
  );
}

/** How many people each kind has: `E Early 5`. */
function Counts({ blocks }: { readonly blocks: readonly Block[] }) {
  const shown = blocks.length > mostKinds ? blocks.slice(0, mostKinds - 1) : blocks;
  const more = blocks.length - shown.length;
  return (
    <>
      {shown.map((block) => (
        <span key={block.id} className="flex items-center gap-1.5 py-px text-note">
          <KindMark kind={block} tone={block.tone} />
          <span className="min-w-0 truncate phone:hidden">{block.kindName}</span>
          <span className="font-[660]">{block.entries.length}</span>
        </span>
      ))}
      {more > 0 ? <span className="block text-note text-act underline">{more} more</span> : null}
    </>
  );
}

function dayNotes({ frame, leave }: CalendarWorld, date: LocalDate) {
  return {
    holidayName: frame.holidays.find((holiday) => holiday.date === date)?.name ?? null,
    isLeave: leave.some(({ startsOn, endsOn }) => startsOn <= date && date <= endsOn),
    hasRoster: periodOn(frame.periods, date) !== null,
  };
}
