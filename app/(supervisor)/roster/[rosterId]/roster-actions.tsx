'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { callApi } from '@/app/_api';
import { Button, ButtonLink } from '@/app/_ui/button';
import { graphicStateOf } from '@/app/_ui/floor-graphic';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { Board, RunSummary } from '@/modules/roster';
import { PublishButton } from './publish-button';

/** What a supervisor can do with the roster: set floors, run, see the run, publish. */
export function RosterActions({ board }: { readonly board: Board }) {
  const router = useRouter();
  const starting = useMutation({
    mutationFn: () => callApi<RunSummary>('POST', `rosters/${board.rosterId}/runs`, {}),
    onSuccess: ({ id }) => router.push(`/runs/${id}`),
  });
  const state = graphicStateOf(board.lanes, board.proof !== null);
  if (state === 'no-floors') {
    return (
      <ButtonLink look="primary" href={`/floors?team=${board.teamId}`}>
        Set floors
      </ButtonLink>
    );
  }
  const run = board.activeRunId ? (
    <ButtonLink href={`/runs/${board.activeRunId}`}>See the run that is on</ButtonLink>
  ) : (
    <Button
      look={state === 'no-roster' ? 'primary' : 'outline'}
      disabled={starting.isPending}
      onClick={() => starting.mutate()}
    >
      {state === 'no-roster' ? 'Run' : 'Run again'}
    </Button>
  );
  return (
    <div className="flex flex-wrap items-center justify-end gap-2">
      {board.run ? (
        <ButtonLink href={`/runs/${board.run.id}`}>Run {board.run.number}</ButtonLink>
      ) : null}
      {run}
      {state === 'cover' && board.version.publishedAtUtc === null ? (
        <PublishButton board={board} />
      ) : null}
      <ProblemNote problem={starting.error} />
    </div>
  );
}
