'use client';

import { format, getDay, startOfWeek } from 'date-fns';
import { enGB } from 'date-fns/locale/en-GB';
import { useMemo, useState } from 'react';
import { Calendar, type Components, dateFnsLocalizer, type Formats } from 'react-big-calendar';
import 'react-big-calendar/lib/css/react-big-calendar.css';
import './calendar.css';
import { formatClock } from '@/modules/units';
import type { Block } from './blocks';
import { type CalendarEvent, toEvents } from './calendar-events';
import { type CalendarWorld, CalendarWorldProvider } from './calendar-world';
import { DayCell } from './day-cell';
import { AgendaDate, AgendaTime, DayHead, WeekdayHead } from './day-heads';
import { groundClass } from './ground-class';
import { columnStart } from './lay-out-day';
import { AgendaBlock, TimeBlock } from './time-block';
import { agendaDays, type View } from './view-range';
import { dateOf, noonOf, wallDate } from './wall-date';

interface Props {
  readonly view: View;
  readonly blocks: readonly Block[];
  readonly world: CalendarWorld;
}

/* English weeks begin on Monday. */
const localizer = dateFnsLocalizer({ format, startOfWeek, getDay, locales: { 'en-GB': enGB } });

const components: Components<CalendarEvent> = {
  eventWrapper: TimeBlock,
  month: { header: WeekdayHead, dateHeader: DayCell },
  week: { header: DayHead },
  agenda: { date: AgendaDate, time: AgendaTime, event: AgendaBlock },
};

/**
 * The views of react-big-calendar in our look. It lays out months, weeks, days and the agenda; what stands
 * in them is ours: cells of the month as buttons, blocks placed by the team's clock.
 */
export default function BigCalendar({ view, blocks, world }: Props) {
  const { frame, date, selected, onPick, isRead } = world;
  const events = useMemo(
    () => toEvents(blocks, frame.dayStartsAtMinute),
    [blocks, frame.dayStartsAtMinute],
  );
  const start = columnStart(blocks, frame.dayStartsAtMinute);
  const [loaded] = useState(() => ({ minute: frame.nowMinute, at: performance.now() }));
  return (
    <CalendarWorldProvider value={world}>
      <Calendar<CalendarEvent>
        localizer={localizer}
        culture="en-GB"
        formats={formatsFrom(start)}
        components={components}
        toolbar={false}
        view={view}
        onView={() => undefined}
        date={noonOf(date)}
        onNavigate={() => undefined}
        onDrillDown={(moment) => onPick(dateOf(moment))}
        events={view === 'month' ? [] : events}
        length={agendaDays - 1}
        dayLayoutAlgorithm={({ events: ofDay }) => ofDay.map((event) => ({ event, style: {} }))}
        tooltipAccessor={null}
        enableAutoScroll={false}
        dayPropGetter={(moment) => ({ className: groundClass(frame, dateOf(moment), selected) })}
        getNow={() => {
          const minute = loaded.minute + Math.floor((performance.now() - loaded.at) / 60_000);
          return wallDate(frame.today, view === 'month' ? minute : minute - start);
        }}
        messages={{ noEventsInRange: isRead ? 'No shifts on these days.' : '' }}
      />
    </CalendarWorldProvider>
  );
}

/** Day columns begin at `start`, so the labels of their hours are that much later. */
const formatsFrom = (start: number): Formats => ({
  weekdayFormat: 'EEE',
  timeGutterFormat: (moment) => formatClock(moment.getHours() * 60 + moment.getMinutes() + start),
});
