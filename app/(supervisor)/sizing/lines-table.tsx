import { useRef, useState } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '@/app/_ui/button';
import { AskDialog } from '@/app/_ui/dialog';
import { Table } from '@/app/_ui/table';
import type { ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import { LineRow } from './line-row';
import { LinesHead } from './lines-head';
import { emptyLine, type SizingForm } from './sizing-form';

interface Props {
  readonly kinds: readonly ShiftKind[];
  readonly skills: readonly Skill[];
  readonly onStartAgain: () => void;
}

/** The patterns people may work: lines to edit, add and remove. */
export function LinesTable({ kinds, skills, onStartAgain }: Props) {
  const { control, getValues, formState } = useFormContext<SizingForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'lines', keyName: 'key' });
  const [isAsking, setAsking] = useState(false);
  const addButton = useRef<HTMLButtonElement>(null);
  const addLine = () =>
    append(emptyLine(getValues('lines'), kinds), { focusName: `lines.${fields.length}.name` });
  const problem = formState.errors.lines?.root?.message ?? formState.errors.lines?.message;
  return (
    <>
      <Table label="Patterns people may work">
        <LinesHead />
        <tbody>
          {fields.map((field, index) => (
            <LineRow
              key={field.key}
              index={index}
              kinds={kinds}
              skills={skills}
              onRemove={() => {
                remove(index);
                addButton.current?.focus();
              }}
            />
          ))}
        </tbody>
      </Table>
      {problem ? (
        <p role="alert" className="mt-1 text-second font-[640] text-short">
          {problem}
        </p>
      ) : null}
      <div className="mt-3 flex flex-wrap gap-2">
        <Button ref={addButton} onClick={addLine}>
          Add a pattern
        </Button>
        <Button onClick={() => setAsking(true)}>Start again from the floors…</Button>
      </div>
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
