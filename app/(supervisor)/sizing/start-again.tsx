import { useState } from 'react';
import { Button } from '@/app/_ui/button';
import { AskDialog } from '@/app/_ui/dialog';

/** Fills the table from the floors again; asks first, since typed lines are lost. */
export function StartAgain({ onStartAgain }: { readonly onStartAgain: () => void }) {
  const [isAsking, setAsking] = useState(false);
  return (
    <>
      <Button onClick={() => setAsking(true)}>Start again from the floors…</Button>
      <AskDialog
        title="Start again from the floors?"
        confirmLabel="Start again"
        isOpen={isAsking}
        onOpenChange={setAsking}
        onConfirm={onStartAgain}
      >
        The table is filled with five days on and two off for every skill and shift kind the floors
        of this week ask for. The lines that stand there now are lost.
      </AskDialog>
    </>
  );
}
