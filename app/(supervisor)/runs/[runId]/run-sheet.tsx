'use client';

import { formatInstant } from '@/app/_ui/clock';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { Board, RunView } from '@/modules/roster';
import { runLead, runStateWords, runVerdict } from '../run-words';
import { BestRoster } from './best-roster';
import { Knots } from './knots';
import { RunActions } from './run-actions';
import { StageOne } from './stage-one';
import { StageTwo } from './stage-two';
import { useLiveRun } from './use-live-run';

/** What the drawing of the best roster needs beside its lanes. */
export type BoardFrame = Pick<Board, 'days' | 'dayStartsAtMinute' | 'kinds' | 'skills' | 'zone'>;

interface Props {
  readonly start: RunView;
  readonly frame: BoardFrame;
}

/** One run: its two stages as they go, the best roster so far, and what it was checked against. */
export function RunSheet({ start, frame }: Props) {
  const run = useLiveRun(start);
  return (
    <>
      <Verdict lead={runLead(run)} actions={<RunActions run={run} />}>
        {runVerdict(run)}
      </Verdict>
      <div className="grid gap-9 desk:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
        <div className="grid content-start gap-6">
          <StageOne run={run} />
          <Knots run={run} />
          <StageTwo run={run} />
        </div>
        <BestRoster run={run} frame={frame} />
      </div>
      <TitleBlock
        figures={[
          {
            label: 'Run',
            value: `${run.number}, started by ${run.startedByName} ${formatInstant(run.startedAtUtc, frame.zone)}`,
          },
          { label: 'State', value: runStateWords[run.state] },
          { label: 'Size', value: `${run.peopleCount} people, ${run.dayCount} days` },
        ]}
      />
    </>
  );
}
