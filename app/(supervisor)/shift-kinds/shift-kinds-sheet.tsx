'use client';

import { type ReactNode, useRef, useState } from 'react';
import { callApi } from '@/app/_api';
import { Button } from '@/app/_ui/button';
import { hours } from '@/app/_ui/clock';
import { AskDialog } from '@/app/_ui/dialog';
import { ProblemNote } from '@/app/_ui/problem-note';
import { type StandingFigure, TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { Coverage, ShiftKind, ShiftKindInput } from '@/modules/coverage';
import { useCoverage, useCoverageChange } from '../_coverage';
import { KindDialog } from './kind-dialog';
import { paidRange } from './kind-words';
import { KindsTable } from './kinds-table';

interface Props {
  readonly coverage: Coverage;
  readonly teamChoice: ReactNode;
}

/** The dialog that is open; a form without a kind adds one. */
type OpenDialog =
  | { readonly kind: 'form'; readonly of: ShiftKind | null }
  | { readonly kind: 'retire'; readonly of: ShiftKind };

/** The shift kinds sheet. */
export function ShiftKindsSheet({ coverage: initial, teamChoice }: Props) {
  const [dialog, setDialog] = useState<OpenDialog | null>(null);
  const addButton = useRef<HTMLButtonElement>(null);
  const coverage = useCoverage(initial);
  const { save, retire } = useKindChanges(coverage);
  const open = (next: OpenDialog | null) => {
    save.reset();
    setDialog(next);
  };
  const add = (
    <Button ref={addButton} look="primary" onClick={() => open({ kind: 'form', of: null })}>
      Add a shift kind…
    </Button>
  );
  return (
    <>
      <Verdict
        lead={`The shifts that people of ${coverage.team.name} work: start, end and unpaid break. Runs place people on these.`}
        actions={coverage.kinds.length > 0 ? add : null}
      >
        Shift kinds
      </Verdict>
      {teamChoice}
      {coverage.kinds.length > 0 ? (
        <KindsTable
          coverage={coverage}
          onChange={(of) => open({ kind: 'form', of })}
          onRetire={(of) => open({ kind: 'retire', of })}
        />
      ) : (
        <div className="line-cut pt-4">
          <p className="mb-3 text-head">
            No shift kinds yet. Add the first: its name, its hours and its break.
          </p>
          {add}
        </div>
      )}
      <div className="mt-3">
        <ProblemNote problem={retire.error} kept="The shift kind is as it was." />
      </div>
      {dialog?.kind === 'form' ? (
        <KindDialog
          kind={dialog.of}
          skills={coverage.skills}
          onSave={(input) => save.mutateAsync({ kind: dialog.of, input })}
          problem={save.error}
          onClose={() => open(null)}
        />
      ) : null}
      {dialog?.kind === 'retire' ? (
        <AskDialog
          title={`Retire ${dialog.of.name}?`}
          confirmLabel="Retire"
          isOpen
          onOpenChange={() => open(null)}
          onConfirm={() =>
            // Its row goes away with its buttons: the keyboard needs another place.
            retire.mutate(dialog.of, { onSuccess: () => addButton.current?.focus() })
          }
        >
          New runs offer {dialog.of.name} no more, and its name and letter are free again. Rosters
          made so far keep it. It cannot be brought back; you would add it anew.
        </AskDialog>
      ) : null}
      <TitleBlock figures={standingFigures(coverage)} />
    </>
  );
}

function useKindChanges({ team }: Coverage) {
  const save = useCoverageChange(
    ({ kind, input }: { readonly kind: ShiftKind | null; readonly input: ShiftKindInput }) =>
      kind
        ? callApi<ShiftKind>('PUT', `shift-kinds/${kind.id}`, input)
        : callApi<ShiftKind>('POST', `teams/${team.id}/shift-kinds`, input),
    ({ kind }, { name }) => (kind ? `${name} changed.` : `${name} added.`),
  );
  const retire = useCoverageChange(
    ({ id }: ShiftKind) => callApi('DELETE', `shift-kinds/${id}`),
    ({ name }) => `${name} retired.`,
  );
  return { save, retire };
}

function standingFigures({ kinds }: Coverage): StandingFigure[] {
  const range = paidRange(kinds);
  const nights = kinds.filter(({ isNight }) => isNight).length;
  return [
    { label: 'Shift kinds in use', value: kinds.length },
    { label: 'Of these Nights', value: nights },
    ...(range
      ? [
          {
            label: 'Paid length',
            value:
              range.least === range.most
                ? hours(range.least)
                : `${hours(range.least)} to ${hours(range.most)}`,
          },
        ]
      : []),
  ];
}
