'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { Button, ButtonLink, buttonClass } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { RunSummary, RunView } from '@/modules/roster';

/** Stop and keep the best while it runs; afterwards to the board. The model is there for other solvers. */
export function RunActions({ run }: { readonly run: RunView }) {
  const queries = useQueryClient();
  const stopping = useMutation({
    mutationFn: () => callApi<RunSummary>('POST', `runs/${run.id}/stop`),
    onSettled: () => queries.invalidateQueries({ queryKey: ['run', run.id] }),
  });
  return (
    <div className="flex flex-wrap items-center justify-end gap-2">
      <a className={buttonClass('outline')} href={`/api/v1/runs/${run.id}/model`} download>
        Model as LP file
      </a>
      {run.mayStop ? (
        <Button
          look="primary"
          disabled={stopping.isPending || stopping.isSuccess}
          onClick={() => stopping.mutate()}
        >
          {stopping.isPending || stopping.isSuccess ? 'Stopping…' : 'Stop and keep best'}
        </Button>
      ) : null}
      {run.state === 'running' ? null : (
        <ButtonLink look="primary" href={`/roster/${run.rosterId}`}>
          Open the board
        </ButtonLink>
      )}
      <ProblemNote problem={stopping.error} />
    </div>
  );
}
