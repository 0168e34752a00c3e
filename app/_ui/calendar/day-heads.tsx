'use client';

import type { AgendaDateProps, AgendaTimeProps, HeaderProps } from 'react-big-calendar';
import { formatDay } from '@/modules/units';
import { dayNumber, longDay, monthName, weekdayName } from '../clock';
import { blockTimes, endsNote } from './block-words';
import type { PlacedBlock } from './calendar-events';
import { useCalendarWorld } from './calendar-world';
import { dateOf } from './wall-date';

/** The weekday above a column of the month, Monday first. */
export function WeekdayHead({ label }: HeaderProps) {
  return (
    // biome-ignore lint/a11y/useFocusableInteractive: heads hold no focus of their own
    // biome-ignore lint/a11y/useSemanticElements: the package's table is made of div elements
    <span role="columnheader">{label}</span>
  );
}

/** The head of a day column of the week; the package puts it into the button that opens the day. */
export function DayHead({ date: moment }: HeaderProps) {
  const { frame } = useCalendarWorld();
  const date = dateOf(moment);
  const holiday = frame.holidays.find((one) => one.date === date);
  return (
    <span className="block">
      <span className="sr-only">{longDay(date)}</span>
      <span aria-hidden="true">
        {weekdayName(date)} {dayNumber(date)}
        <span className="phone:hidden"> {monthName(date).slice(0, 3)}</span>
      </span>
      {date === frame.today ? <span className="block text-act">today</span> : null}
      {holiday ? <span className="block font-normal">{holiday.name}</span> : null}
    </span>
  );
}

/** The date in front of its rows in the agenda. */
export function AgendaDate({ day }: AgendaDateProps) {
  const { frame } = useCalendarWorld();
  const date = dateOf(day);
  const holiday = frame.holidays.find((one) => one.date === date);
  return (
    <>
      <span className="font-[660]">{formatDay(date)}</span>
      {date === frame.today ? <span className="block text-note text-act">today</span> : null}
      {holiday ? <span className="block text-note text-ink2">{holiday.name}</span> : null}
    </>
  );
}

/** The times of a row in the agenda. */
export function AgendaTime({ event }: AgendaTimeProps) {
  const { block } = event.resource as PlacedBlock;
  const ends = endsNote(block);
  return (
    <>
      {blockTimes(block)}
      {ends ? <span className="block text-note text-ink2">{ends}</span> : null}
    </>
  );
}
