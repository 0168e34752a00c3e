'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { Button, ButtonLink, buttonClass } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { ModelFormat, RunSummary, RunView } from '@/modules/roster';

const modelFormats: readonly ModelFormat[] = ['lp', 'mps'];

/** Stop and keep the best while it runs; afterwards to the board. The model is there for other solvers. */
export function RunActions({ run }: { readonly run: RunView }) {
  const queries = useQueryClient();
  const stopping = useMutation({
    mutationFn: () => callApi<RunSummary>('POST', `runs/${run.id}/stop`),
    onSettled: () => queries.invalidateQueries({ queryKey: ['run', run.id] }),
  });
  return (
    <div className="flex flex-wrap items-center justify-end gap-2">
      {modelFormats.map((format) => (
        <a
          key={format}
          className={buttonClass('outline')}
          href={`/api/v1/runs/${run.id}/model?format=${format}`}
          download
        >
          Model as {format.toUpperCase()} file
        </a>
      ))}
      {run.mayStop ? (
        <Button
          look={run.state === 'running' ? 'primary' : 'outline'}
          disabled={stopping.isPending || stopping.isSuccess}
          onClick={() => stopping.mutate()}
        >
          {stopping.isPending || stopping.isSuccess ? 'Stopping…' : stopWords(run)}
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

/** Once its roster stands, a run may still be looking for what stands in the way. */
const stopWords = ({ state }: RunView): string =>
  state === 'running' ? 'Stop and keep best' : 'Stop looking';
