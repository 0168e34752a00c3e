'use client';

import { useEffect, useRef } from 'react';
import { Button, buttonClass } from '@/app/_ui/button';
import { Caution } from '@/app/_ui/caution';
import { dateRange, dateRangeWithYear } from '@/app/_ui/clock';
import { useAnnounce } from '@/app/_ui/live-region';
import { ProblemNote } from '@/app/_ui/problem-note';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { HoursView } from '@/modules/hours';
import { ChoiceFields } from './choice-fields';
import { type HoursChoice, hoursPath } from './hours-address';
import { HoursDrawing } from './hours-drawing';
import { PeriodButtons } from './period-buttons';
import { standingFigures } from './standing-figures';
import { useHours } from './use-hours';

interface Props {
  readonly teams: readonly { readonly id: string; readonly name: string }[];
  readonly start: HoursChoice;
  readonly hours: HoursView;
}

/** The hours sheet: which dates, the table of people, one person's days. */
export function HoursSheetView({ teams, start, hours }: Props) {
  const { choice, query, show, typed, isUnreadable } = useHours({ choice: start, hours });
  const { from, to } = choice.range;
  useSpokenRange(query.isPlaceholderData ? undefined : query.data);
  return (
    <>
      <Verdict
        lead={`${query.data?.teamName ?? ''}. Open: nothing is locked, so these figures can still change.`}
        actions={
          <a
            href={`/api/v1/${hoursPath(choice, '.csv')}`}
            download
            className={buttonClass('outline')}
          >
            Download CSV, {dateRangeWithYear(from, to)}
          </a>
        }
      >
        Hours, {dateRange(from, to)}
      </Verdict>
      <ChoiceFields teams={teams} typed={typed} isUnreadable={isUnreadable} onShow={show} />
      <PeriodButtons periods={query.data?.allPeriods ?? []} shown={choice.range} onShow={show} />
      <div aria-busy={query.isFetching} className="mt-4">
        <p className="text-second text-ink2">{query.isPlaceholderData ? 'Reading hours…' : null}</p>
        <ProblemNote
          problem={query.error}
          action={<Button onClick={() => query.refetch()}>Try again</Button>}
        />
        {query.data ? <HoursDrawing view={query.data} onShow={show} /> : null}
      </div>
      <div className="mt-9">
        <Caution>
          Working-time and pay rules differ by country, sector and agreement. These hours are no
          legal advice: local law, agreements and licensed practice come first.
        </Caution>
      </div>
      {query.data ? <TitleBlock figures={standingFigures(query.data)} /> : null}
    </>
  );
}

/** Has it read aloud when other dates are shown; the first drawing stays silent. */
function useSpokenRange(view: HoursView | undefined) {
  const announce = useAnnounce();
  const sentence = view
    ? `Hours of ${view.teamName}, ${dateRange(view.from, view.to, ' to ')}, ${view.people.length} people.`
    : null;
  const last = useRef(sentence);
  useEffect(() => {
    if (sentence === null || sentence === last.current) return;
    last.current = sentence;
    announce(sentence);
  }, [sentence, announce]);
}
