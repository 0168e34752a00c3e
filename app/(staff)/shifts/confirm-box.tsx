'use client';

import { Button } from '@/app/_ui/button';
import { formatInstant } from '@/app/_ui/clock';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { OwnPeriod, OwnShifts } from '@/modules/roster';
import { confirmSentence, counted } from './period-words';

interface Props {
  readonly period: OwnPeriod;
  readonly own: Pick<OwnShifts, 'zone' | 'today'>;
  readonly onConfirm: () => void;
  readonly isSending: boolean;
  readonly problem: unknown;
  /** Reads the shifts again, e.g. when a newer version was published meanwhile. */
  readonly onReadAgain: () => void;
}

const meaning = 'Confirm means: I have seen them. You can still ask for changes.';

/** What confirming means, by when, and what follows if not; after it: when it was done. */
export function ConfirmBox({ period, own, onConfirm, isSending, problem, onReadAgain }: Props) {
  const { confirmedAtUtc } = period;
  const isDone = confirmedAtUtc !== null;
  return (
    <div
      id={confirmId(period)}
      tabIndex={-1}
      className={`mt-4 ${isDone ? 'border-l-3 border-holds py-1 pl-3' : 'border-[1.25px] border-ink p-3'}`}
    >
      {isDone ? (
        <p>
          <strong className="font-[660] text-holds">Confirmed</strong>{' '}
          {formatInstant(confirmedAtUtc, own.zone)}. You can still ask for changes.
        </p>
      ) : (
        <>
          <p>{meaning}</p>
          <p className="mt-1 text-ink2">{confirmSentence(period, own.today)}</p>
          <Button
            look="primary"
            className="mt-3 phone:w-full"
            disabled={isSending}
            onClick={onConfirm}
          >
            {isSending ? 'Confirming…' : `Confirm ${counted(period.shifts.length, 'shift')}`}
          </Button>
          <div className="mt-2 empty:hidden">
            <ProblemNote
              problem={problem}
              action={<Button onClick={onReadAgain}>Read my shifts again</Button>}
            />
          </div>
        </>
      )}
    </div>
  );
}

/** Where the question stands, for the link above the list and for the focus after confirming. */
export const confirmId = ({ versionId }: OwnPeriod): string => `confirm-${versionId}`;
