'use client';

import { AskDialog } from '@/app/_ui/dialog';
import type { Coverage, Floor } from '@/modules/coverage';
import { DateDialog } from './date-dialog';
import type { Difference } from './differing-dates';
import { FloorDialog } from './floor-dialog';
import { emptyForm, toForm } from './floor-form';
import { type FloorRow, rowName } from './floor-rows';
import type { Period } from './period';
import type { FloorEdits } from './use-floor-edits';

/** The dialog that is open, and what it is about. */
export type OpenDialog =
  | { readonly kind: 'floor'; readonly floor: Floor | null }
  | { readonly kind: 'remove'; readonly floor: Floor }
  | { readonly kind: 'date'; readonly difference: Difference | null };

interface Props {
  readonly dialog: OpenDialog | null;
  readonly coverage: Coverage;
  readonly rows: readonly FloorRow[];
  readonly period: Period;
  readonly edits: FloorEdits;
  readonly onOpen: (dialog: OpenDialog | null) => void;
}

/** Whichever dialog of the sheet is open. */
export function FloorDialogs({ dialog, coverage, rows, period, edits, onOpen }: Props) {
  const close = () => onOpen(null);
  if (dialog?.kind === 'floor') {
    const { floor } = dialog;
    return (
      <FloorDialog
        skills={coverage.skills}
        currency={coverage.team.currency}
        start={floor ? toForm(floor) : emptyForm(period)}
        onSave={(input) => edits.save.mutateAsync({ floorId: floor?.id ?? null, input })}
        problem={edits.save.error}
        onClose={close}
        onRemove={floor ? () => onOpen({ kind: 'remove', floor }) : undefined}
      />
    );
  }
  if (dialog?.kind === 'date') {
    return (
      <DateDialog
        rows={rows}
        holidays={coverage.holidays}
        period={period}
        difference={dialog.difference}
        onSave={edits.setDate.mutateAsync}
        problem={edits.setDate.error}
        onClose={close}
      />
    );
  }
  if (dialog?.kind !== 'remove') return null;
  const row = rows.find(({ floor }) => floor.id === dialog.floor.id);
  return (
    <AskDialog
      title="Remove this floor?"
      confirmLabel="Remove"
      isOpen
      onOpenChange={close}
      onConfirm={() => edits.remove.mutate(dialog.floor.id)}
    >
      {row ? rowName(row) : 'This floor'} asks for nobody any more, on all its dates, and its dates
      that differ go with it. Rosters made so far stay as they are. To end it on a day, change its
      last day instead.
    </AskDialog>
  );
}
