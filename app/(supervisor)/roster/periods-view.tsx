'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import { dateRangeWithYear, hours } from '@/app/_ui/clock';
import { SectionHead } from '@/app/_ui/section-head';
import { Table } from '@/app/_ui/table';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { TeamInfo } from '@/modules/access';
import type { RosterSummary } from '@/modules/roster';
import type { LocalDate } from '@/modules/units';
import { OpenPeriod } from './open-period';

interface Props {
  readonly team: TeamInfo;
  readonly rosters: readonly RosterSummary[];
  readonly nextStart: LocalDate;
  readonly mayOpen: boolean;
  readonly choice: ReactNode;
}

const columns = ['Period', 'State', 'Floors', 'Shifts planned', 'Cover', 'Confirmed'];

/** The periods of a team, and opening the next one. */
export function PeriodsView({ team, rosters, nextStart, mayOpen, choice }: Props) {
  return (
    <>
      <Verdict
        lead={`The rosters of ${team.name}, one for each period of ${team.periodDays} days. Open one to see its board.`}
        actions={choice}
      >
        Rosters
      </Verdict>
      {rosters.length === 0 ? (
        <p className="text-body">No period is open yet. Open the first one below.</p>
      ) : (
        <Table label={`Periods of ${team.name}`}>
          <thead>
            <tr>
              {columns.map((column) => (
                <th key={column} scope="col">
                  {column}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rosters.map((roster) => (
              <PeriodRow key={roster.id} roster={roster} />
            ))}
          </tbody>
        </Table>
      )}
      {mayOpen ? (
        <section aria-labelledby="open-period" className="mt-9">
          <SectionHead id="open-period">Open a period</SectionHead>
          <OpenPeriod team={team} nextStart={nextStart} />
        </section>
      ) : null}
      <TitleBlock
        figures={[
          { label: 'Team', value: team.name },
          { label: 'Periods', value: rosters.length },
          { label: 'Times in', value: team.zone },
        ]}
      />
    </>
  );
}

function PeriodRow({ roster }: { readonly roster: RosterSummary }) {
  const { state, versionNumber, shortageMinutes } = roster;
  return (
    <tr>
      <th scope="row">
        <Link
          href={`/roster/${roster.id}`}
          className="inline-flex min-h-6 items-center whitespace-nowrap text-act underline underline-offset-3 phone:min-h-11"
        >
          {dateRangeWithYear(roster.startsOn, roster.endsOn)}
        </Link>
      </th>
      <td className="whitespace-nowrap">{stateWords(state, versionNumber)}</td>
      <td>{roster.hasFloors ? 'set' : 'no floors yet'}</td>
      <td>{roster.shiftCount === 0 ? 'nothing planned yet' : roster.shiftCount}</td>
      <td className={shortageMinutes ? 'text-short' : 'text-holds'}>{coverWords(roster)}</td>
      <td>{state === 'draft' ? '' : `${roster.confirmedCount} of ${roster.peopleCount}`}</td>
    </tr>
  );
}

const stateWords = (state: RosterSummary['state'], number: number): string =>
  state === 'draft'
    ? `Draft ${number}`
    : `${state === 'closed' ? 'Closed' : 'Published'}, version ${number}`;

function coverWords({ shortageMinutes, hasFloors }: RosterSummary): string {
  if (shortageMinutes === null || !hasFloors) return '';
  return shortageMinutes === 0 ? 'floor holds' : `short ${hours(shortageMinutes)}`;
}
