'use client';

import { Button } from '@/app/_ui/button';
import { Caution } from '@/app/_ui/caution';
import { dateRange } from '@/app/_ui/clock';
import { ProblemNote } from '@/app/_ui/problem-note';
import { TitleBlock } from '@/app/_ui/title-block';
import type { HoursView } from '@/modules/hours';
import { ChoiceFields } from './choice-fields';
import type { HoursChoice } from './hours-address';
import { HoursDrawing } from './hours-drawing';
import { HoursVerdict } from './hours-verdict';
import { NothingPublished, type NothingPublishedProps } from './nothing-published';
import { PeriodButtons } from './period-buttons';
import { standingFigures } from './standing-figures';
import { useHours } from './use-hours';
import { useSpokenRange } from './use-spoken-range';

interface Props {
  readonly teams: readonly { readonly id: string; readonly name: string }[];
  readonly start: HoursChoice;
  readonly hours: HoursView;
}

/** The hours sheet: which dates, the table of people, one person's days. */
export function HoursSheetView({ teams, start, hours }: Props) {
  const { choice, query, show, typed, isUnreadable } = useHours({ choice: start, hours });
  const view = query.data;
  const teamName = teams.find(({ id }) => id === choice.teamId)?.name ?? hours.teamName;
  useSpokenRange(query.isPlaceholderData ? undefined : view);
  return (
    <>
      <HoursVerdict choice={choice} teamName={teamName} />
      <ChoiceFields teams={teams} typed={typed} isUnreadable={isUnreadable} onShow={show} />
      <PeriodButtons periods={view?.allPeriods ?? []} shown={choice.range} onShow={show} />
      <div aria-busy={query.isFetching} className="mt-4">
        {query.isPlaceholderData && view ? (
          <p className="mb-2 text-body text-ink2">
            Reading hours… Below are still those of {view.teamName}, {dateRange(view.from, view.to)}
            .
          </p>
        ) : null}
        <ProblemNote
          problem={query.error}
          action={<Button onClick={() => query.refetch()}>Try again</Button>}
        />
        {view ? <Hours view={view} onShow={show} /> : null}
      </div>
      <div className="mt-9">
        <Caution>
          Working-time and pay rules differ by country, sector and agreement. These hours are no
          legal advice: local law, agreements and licensed practice come first.
        </Caution>
      </div>
      {view ? <TitleBlock figures={standingFigures(view)} /> : null}
    </>
  );
}

function Hours({ view, onShow }: NothingPublishedProps) {
  return view.people.some(({ days }) => days.length > 0) ? (
    <HoursDrawing view={view} />
  ) : (
    <NothingPublished view={view} onShow={onShow} />
  );
}
