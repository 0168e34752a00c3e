'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { callApi } from '@/app/_api';
import { Button } from '@/app/_ui/button';
import { Caution } from '@/app/_ui/caution';
import { dateRange, hours } from '@/app/_ui/clock';
import { AskDialog } from '@/app/_ui/dialog';
import { shortPlaces, shortPlaceText } from '@/app/_ui/floor-graphic';
import { useAnnounce } from '@/app/_ui/live-region';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { Board, PublishedRoster } from '@/modules/roster';

const mostListed = 8;

/** Publishes the draft: asks once, lists what is still short and who is told. */
export function PublishButton({ board }: { readonly board: Board }) {
  const [isAsking, setAsking] = useState(false);
  const announce = useAnnounce();
  const queries = useQueryClient();
  const shortages = shortPlaces(board);
  const publishing = useMutation({
    mutationFn: () =>
      callApi<PublishedRoster>('POST', `rosters/${board.rosterId}/publish`, {
        acceptShortage: shortages.length > 0,
      }),
    onSuccess: async () => {
      await queries.invalidateQueries({ queryKey: ['board', board.rosterId] });
      announce('Published. Each person gets a mail with their own shifts.');
    },
  });
  const isClean = shortages.length === 0 && board.proof?.breaches.length === 0;
  const missing = hours(board.proof?.shortageMinutes ?? 0);
  const people = new Set(board.cells.map(({ personId }) => personId)).size;
  return (
    <>
      <Button
        look={isClean ? 'primary' : 'outline'}
        disabled={publishing.isPending}
        onClick={() => setAsking(true)}
      >
        Publish…
      </Button>
      <AskDialog
        title={`Publish the roster of ${dateRange(board.startsOn, board.endsOn)}?`}
        confirmLabel={shortages.length > 0 ? `Publish, short ${missing}` : 'Publish'}
        isOpen={isAsking}
        onOpenChange={setAsking}
        onConfirm={() => publishing.mutate()}
      >
        <p>
          It becomes version {board.version.number}. {people} people get a mail with their own
          shifts and a calendar file, and are asked to confirm.
        </p>
        {shortages.length > 0 ? (
          <>
            <p className="mt-3 font-[660] text-short">Still short {missing}, and published so:</p>
            <ul className="list-disc pl-5">
              {shortages.slice(0, mostListed).map((place) => (
                <li key={`${place.date} ${place.shiftName}`}>
                  {shortPlaceText({ ...place, spare: [] })}
                </li>
              ))}
            </ul>
            {shortages.length > mostListed ? <p>and {shortages.length - mostListed} more</p> : null}
          </>
        ) : null}
      </AskDialog>
      <ProblemNote problem={publishing.error} kept="The draft is kept as it is." />
      {publishing.data?.warnings.map((warning) => (
        <Caution key={warning}>{warning}</Caution>
      ))}
    </>
  );
}
