'use client';

import { Button, ButtonLink } from './_ui/button';
import { NoticePage } from './_ui/notice-page';

interface Props {
  readonly error: unknown;
  readonly retry: () => void;
}

/** Shown when a page breaks; the server log holds the cause under the same number. */
export default function PageError({ error, retry }: Props) {
  const digest = error instanceof Error && 'digest' in error ? String(error.digest) : null;
  return (
    <NoticePage title="This sheet could not be drawn">
      <p>
        Something broke on our side. What is stored was not changed.
        {digest ? ` If it stays, give this number to whoever runs the server: ${digest}.` : ''}
      </p>
      <div className="flex flex-wrap gap-2">
        <Button look="primary" onClick={retry}>
          Try again
        </Button>
        <ButtonLink href="/">Go to your first sheet</ButtonLink>
      </div>
    </NoticePage>
  );
}
