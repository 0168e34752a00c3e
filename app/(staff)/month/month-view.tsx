'use client';

import { useState } from 'react';
import { CalendarControls } from '@/app/_ui/calendar/calendar-controls';
import { CalendarSheet } from '@/app/_ui/calendar/calendar-sheet';
import { periodWords, zoneWords } from '@/app/_ui/calendar/period-words';
import { useCalendarPlace } from '@/app/_ui/calendar/use-calendar-place';
import { type FirstEntries, useEntries } from '@/app/_ui/calendar/use-entries';
import { Verdict } from '@/app/_ui/verdict';
import type { OwnShifts } from '@/modules/roster';
import type { LocalDate } from '@/modules/units';
import { StandingStrip } from '../standing-strip';
import { ChosenDay } from './chosen-day';
import { ownFrame, ownPeriodOn } from './own-frame';

interface Props {
  readonly own: OwnShifts;
  readonly first: FirstEntries;
}

/** A person's own calendar: month, week, day or agenda, and the chosen day in words. */
export function MonthView({ own, first }: Props) {
  const frame = ownFrame(own);
  const place = useCalendarPlace(own.today);
  const [chosen, setChosen] = useState<LocalDate>(own.today);
  const { data, error, refetch } = useEntries('me/calendar', place.readRange, first);
  const selected = place.view === 'day' ? place.date : chosen;
  const period = ownPeriodOn(own, selected);
  const pick = (date: LocalDate) => {
    setChosen(date);
    if (place.view === 'week') place.show('day', date);
  };
  return (
    <>
      <Verdict
        lead={`${periodWords(frame.periods, place.range)} ${zoneWords(frame.zone)}`}
        actions={<CalendarControls place={place} today={own.today} />}
      >
        {place.title}
      </Verdict>
      <CalendarSheet
        place={place}
        frame={frame}
        audience="own"
        leave={own.periods.flatMap(({ leave }) => leave)}
        selected={selected}
        onPick={pick}
        entries={data ?? null}
        problem={error}
        onRetry={() => void refetch()}
      >
        <ChosenDay own={own} date={selected} />
      </CalendarSheet>
      {period ? (
        <section aria-label="Your figures of the period" className="mt-4 mb-9 max-w-160">
          <StandingStrip period={period} />
        </section>
      ) : null}
    </>
  );
}
