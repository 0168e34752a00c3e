import type { ReactNode } from 'react';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';

interface Props {
  /** What the last try to save threw. */
  readonly problem: unknown;
  readonly isSaving: boolean;
  readonly saveLabel: string;
  readonly onCancel: () => void;
  /** Another action, at the other end. */
  readonly aside?: ReactNode;
}

/** The end of a form in a dialog: what went wrong, and the buttons. Spans the columns of the form. */
export function DialogFoot({ problem, isSaving, saveLabel, onCancel, aside }: Props) {
  return (
    <div className="col-span-full grid gap-4">
      <ProblemNote problem={problem} kept="What you typed is kept." />
      <div className="flex flex-wrap items-center justify-between gap-4">
        <div>{aside}</div>
        <div className="flex flex-wrap gap-2">
          <Button onClick={onCancel}>Cancel</Button>
          <Button type="submit" look="primary" disabled={isSaving}>
            {isSaving ? 'Saving…' : saveLabel}
          </Button>
        </div>
      </div>
    </div>
  );
}
