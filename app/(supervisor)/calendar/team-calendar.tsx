'use client';

import { type ReactNode, useState } from 'react';
import { CalendarControls } from '@/app/_ui/calendar/calendar-controls';
import { CalendarSheet } from '@/app/_ui/calendar/calendar-sheet';
import { type Choice, chooseEntries, everything } from '@/app/_ui/calendar/choose-entries';
import { periodWords, zoneWords } from '@/app/_ui/calendar/period-words';
import { useCalendarPlace } from '@/app/_ui/calendar/use-calendar-place';
import { type FirstEntries, useEntries } from '@/app/_ui/calendar/use-entries';
import { Verdict } from '@/app/_ui/verdict';
import type { TeamInfo } from '@/modules/access';
import type { CalendarFrame } from '@/modules/roster';
import { ChoiceFields } from './choice-fields';

interface Props {
  readonly team: Pick<TeamInfo, 'id' | 'name'>;
  readonly frame: CalendarFrame;
  readonly first: FirstEntries;
  readonly teamChoice: ReactNode;
}

/** The calendar of a team: everybody, one post or one person. */
export function TeamCalendar({ team, frame, first, teamChoice }: Props) {
  const place = useCalendarPlace(frame.today);
  const [choice, setChoice] = useState<Choice>(everything);
  const { data, error, refetch } = useEntries(`teams/${team.id}/calendar`, place.readRange, first);
  return (
    <>
      <Verdict
        lead={`${team.name}. ${periodWords(frame.periods, place.range)} ${zoneWords(frame.zone)}`}
        actions={<CalendarControls place={place} today={frame.today} />}
      >
        {place.title}
      </Verdict>
      <div
        data-print="off"
        className="mb-3 grid max-w-200 grid-cols-[repeat(auto-fit,minmax(9rem,1fr))] gap-3"
      >
        {teamChoice}
        <ChoiceFields entries={data ?? []} choice={choice} onChoose={setChoice} />
      </div>
      <CalendarSheet
        place={place}
        frame={frame}
        audience={choice.personId === null ? 'team' : 'own'}
        leave={[]}
        selected={null}
        onPick={(date) => place.show('day', date)}
        entries={data ? chooseEntries(data, choice) : null}
        problem={error}
        onRetry={() => void refetch()}
      />
    </>
  );
}
