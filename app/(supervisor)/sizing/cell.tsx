import { type ComponentProps, useId } from 'react';
import { controlClass, useNotes } from '@/app/_ui/field-frame';

interface CellText {
  /** Column and line, e.g. "Days on, Vet Early": the cell shows no label of its own. */
  readonly label: string;
  readonly error?: string | undefined;
}

/** What label and error add to the control of a cell, and the error's own element. */
function useCell({ label, error }: CellText) {
  const id = useId();
  const notes = useNotes(id, undefined, error);
  const control = {
    'aria-label': label,
    'aria-describedby': notes.describedBy,
    'aria-invalid': error ? (true as const) : undefined,
  };
  return { control, notes: notes.element };
}

/** One line of text in a cell; its error stands below it. Takes `register('name')`. */
export function CellInput({
  label,
  error,
  className = '',
  ...input
}: CellText & ComponentProps<'input'>) {
  const { control, notes } = useCell({ label, error });
  return (
    <div className={className}>
      <input type="text" autoComplete="off" {...input} {...control} className={controlClass} />
      {notes}
    </div>
  );
}

/** A choice of one in a cell; its options are the children. */
export function CellSelect({
  label,
  error,
  className = '',
  children,
  ...select
}: CellText & ComponentProps<'select'>) {
  const { control, notes } = useCell({ label, error });
  return (
    <div className={className}>
      <select {...select} {...control} className={controlClass}>
        {children}
      </select>
      {notes}
    </div>
  );
}

interface CellChoicesProps extends CellText {
  readonly choices: readonly { readonly value: string; readonly label: string }[];
  /** What `register('name')` gives; each choice carries its own value. */
  readonly field: ComponentProps<'input'>;
}

/** Several choices side by side in a cell. The column's head shows their letters: `ChoiceLetters`. */
export function CellChoices({ label, error, choices, field }: CellChoicesProps) {
  const { control, notes } = useCell({ label, error });
  return (
    <fieldset aria-label={label} aria-describedby={control['aria-describedby']}>
      <div className="relative top-[0.4375rem] mb-2 flex">
        {choices.map((choice) => (
          <div key={choice.value} className={choiceClass}>
            <input
              type="checkbox"
              {...field}
              value={choice.value}
              aria-label={choice.label}
              aria-invalid={control['aria-invalid']}
              className="size-6 accent-act"
            />
          </div>
        ))}
      </div>
      {notes}
    </fieldset>
  );
}

/** The letters of `CellChoices`, each above its boxes. */
export function ChoiceLetters({ choices }: Pick<CellChoicesProps, 'choices'>) {
  return (
    <span aria-hidden="true" className="flex font-normal text-ink3">
      {choices.map(({ value, label }) => (
        <span key={value} className={choiceClass}>
          {label.slice(0, 2)}
        </span>
      ))}
    </span>
  );
}

const choiceClass = 'grid w-7 shrink-0 place-items-center phone:w-9';
