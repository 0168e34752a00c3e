import Link from 'next/link';
import type { ReactNode } from 'react';
import { dateRange, formatInstant, hours } from '@/app/_ui/clock';
import { Money } from '@/app/_ui/money';
import { Table } from '@/app/_ui/table';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { TeamInfo } from '@/modules/access';
import type { RunSummary } from '@/modules/roster';
import { gapOf, gapText } from './gap';
import { runStateWords } from './run-words';

interface Props {
  readonly runs: readonly RunSummary[];
  readonly team: TeamInfo;
  readonly choice: ReactNode;
}

/** Every run of a team, newest first. */
export function RunsTable({ runs, team, choice }: Props) {
  return (
    <>
      <Verdict
        lead="A run first finds out whether the floors can be held, then looks for the cheapest roster that holds them, with proof of how good it is."
        actions={choice}
      >
        Runs
      </Verdict>
      {runs.length === 0 ? (
        <p className="text-body">
          No runs yet.{' '}
          <Link href="/roster" className="text-act underline underline-offset-3">
            Open a period
          </Link>{' '}
          and start one from its board.
        </p>
      ) : (
        <Table label={`Runs of ${team.name}`}>
          <thead>
            <tr>
              <th scope="col">Run</th>
              <th scope="col">Period</th>
              <th scope="col">Started</th>
              <th scope="col">State</th>
              <th scope="col">Cover</th>
              <th scope="col" data-figure>
                Cost
              </th>
              <th scope="col" data-figure>
                Proven gap
              </th>
            </tr>
          </thead>
          <tbody>
            {runs.map((run) => (
              <RunRow key={run.id} run={run} team={team} />
            ))}
          </tbody>
        </Table>
      )}
      <TitleBlock figures={[{ label: 'Runs', value: runs.length }]} />
    </>
  );
}

function RunRow({ run, team }: { readonly run: RunSummary; readonly team: TeamInfo }) {
  const gap = gapOf(run);
  const isShort = (run.shortageMinutes ?? 0) > 0;
  return (
    <tr>
      <th scope="row">
        <Link
          href={`/runs/${run.id}`}
          className="inline-flex min-h-6 items-center text-act underline underline-offset-3 phone:min-h-11"
        >
          Run {run.number}
        </Link>
      </th>
      <td className="whitespace-nowrap">{dateRange(run.startsOn, run.endsOn)}</td>
      <td className="whitespace-nowrap">
        {formatInstant(run.startedAtUtc, team.zone)} by {run.startedByName}
      </td>
      <td>{runStateWords[run.state]}</td>
      <td className={isShort ? 'text-short' : 'text-holds'}>
        {run.shortageMinutes === null
          ? ''
          : isShort
            ? `short ${hours(run.shortageMinutes)}`
            : 'floor holds'}
      </td>
      <td data-figure>
        {run.bestCostCents === null ? (
          ''
        ) : (
          <Money cents={run.bestCostCents} currency={team.currency} />
        )}
      </td>
      <td data-figure>{gap === null ? '' : gapText(gap)}</td>
    </tr>
  );
}
