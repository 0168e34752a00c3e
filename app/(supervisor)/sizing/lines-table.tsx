import { useRef } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '@/app/_ui/button';
import { Table } from '@/app/_ui/table';
import type { ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import { LineRow } from './line-row';
import { LinesHead } from './lines-head';
import { NoLines } from './no-lines';
import { emptyLine, type SizingForm } from './sizing-form';
import { StartAgain } from './start-again';

interface Props {
  readonly kinds: readonly ShiftKind[];
  readonly skills: readonly Skill[];
  readonly onStartAgain: () => void;
}

/** The patterns people may work: lines to edit, add and remove. */
export function LinesTable({ kinds, skills, onStartAgain }: Props) {
  const { control, getValues, formState } = useFormContext<SizingForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'lines', keyName: 'key' });
  const addButton = useRef<HTMLButtonElement>(null);
  const addLine = () =>
    append(emptyLine(getValues('lines'), kinds), { focusName: `lines.${fields.length}.name` });
  const removeLine = (index: number) => {
    remove(index);
    addButton.current?.focus();
  };
  const problem = formState.errors.lines?.root?.message ?? formState.errors.lines?.message;
  return (
    <>
      <Table label="Patterns people may work">
        <LinesHead />
        <tbody>
          {fields.map(({ key }, index) => (
            <LineRow
              key={key}
              index={index}
              kinds={kinds}
              skills={skills}
              onRemove={() => removeLine(index)}
            />
          ))}
        </tbody>
      </Table>
      {fields.length === 0 ? <NoLines /> : null}
      {problem ? (
        <p role="alert" className="mt-1 text-second font-[640] text-short">
          {problem}
        </p>
      ) : null}
      <div className="mt-3 flex flex-wrap gap-2">
        <Button ref={addButton} onClick={addLine}>
          Add a pattern
        </Button>
        <StartAgain onStartAgain={onStartAgain} />
      </div>
    </>
  );
}
