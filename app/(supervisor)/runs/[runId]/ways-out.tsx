'use client';

import { useMutation } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { Button } from '@/app/_ui/button';
import { useAnnounce } from '@/app/_ui/live-region';
import { ProblemNote } from '@/app/_ui/problem-note';
import { Table } from '@/app/_ui/table';
import type { RunView, WayOutView } from '@/modules/roster';
import { costChangeWords, shortageChangeWords, undoesWords } from './knot-words';

interface Props {
  readonly run: RunView;
  /** Which knot of the run. */
  readonly place: number;
}

/** Works out what loosening the members of a knot would do, on demand. Chooses and changes nothing. */
export function WaysOut({ run, place }: Props) {
  const announce = useAnnounce();
  const working = useMutation({
    mutationFn: () => callApi<WayOutView[]>('POST', `runs/${run.id}/ways-out`, { knot: place }),
    onSuccess: (ways) => announce(`Ways out worked out: ${ways.length}.`),
  });
  return (
    <div className="grid justify-items-start gap-2 pt-2">
      {working.data ? (
        <Ways ways={working.data} currency={run.currency} place={place} />
      ) : (
        <Button disabled={working.isPending} onClick={() => working.mutate()}>
          {working.isPending ? 'Working out, up to a minute…' : 'Work out the ways out'}
        </Button>
      )}
      <ProblemNote problem={working.error} />
    </div>
  );
}

interface WaysProps {
  readonly ways: readonly WayOutView[];
  readonly currency: string;
  readonly place: number;
}

function Ways({ ways, currency, place }: WaysProps) {
  if (ways.length === 0) {
    return <p>No way out was found that may be tried: what is left has a law behind it.</p>;
  }
  return (
    <>
      <p className="text-second text-ink2">
        Each compared with the roster of this run. Nothing is changed here: the choice is yours, and
        floors that protect life belong to whoever is licensed to set them.
      </p>
      <Table label={`Ways out of knot ${place + 1}`} holdsFirstColumn={false}>
        <thead>
          <tr>
            <th scope="col">Change</th>
            <th scope="col">Ask</th>
            <th scope="col">Unties it</th>
            <th scope="col">Shortage</th>
            <th scope="col" data-figure>
              Cost
            </th>
            <th scope="col">How sure</th>
          </tr>
        </thead>
        <tbody>
          {ways.map((way) => (
            <Way key={way.changes.map(({ words }) => words).join()} way={way} currency={currency} />
          ))}
        </tbody>
      </Table>
    </>
  );
}

function Way({ way, currency }: { readonly way: WayOutView; readonly currency: string }) {
  const { changes, effect } = way;
  const cost = effect?.costChangeCents;
  return (
    <tr>
      <th scope="row">
        {changes.map(({ words }) => (
          <div key={words}>{words}</div>
        ))}
      </th>
      <td>
        {[...new Set(changes.map(({ ask }) => ask))].map((ask) => (
          <div key={ask}>{ask}</div>
        ))}
      </td>
      <td>{undoesWords(way)}</td>
      <td>{effect ? shortageChangeWords(effect.shortageChangeMinutes) : ''}</td>
      <td data-figure>{cost ? costChangeWords(cost, currency) : ''}</td>
      <td>
        {effect === null ? 'not worked out in time' : effect.isProven ? 'proven' : 'estimate'}
      </td>
    </tr>
  );
}
