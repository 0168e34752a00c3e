import { type ComponentProps, useId } from 'react';
import { type FieldText, useNotes } from './field-frame';

type Props = FieldText & ComponentProps<'input'>;

/** A yes or no with its words behind it. Takes `register('name')`; `type="radio"` makes one of a set. */
export function CheckField({ label, hint, error, className = '', ...input }: Props) {
  const id = useId();
  const notes = useNotes(id, hint, error);
  return (
    <div className={className}>
      <label htmlFor={id} className="flex min-h-8 items-center gap-2 text-body phone:min-h-11">
        <input
          type="checkbox"
          {...input}
          id={id}
          aria-describedby={notes.describedBy}
          aria-invalid={error ? true : undefined}
          className="size-5 shrink-0 accent-act phone:size-6"
        />
        {label}
      </label>
      {notes.element}
    </div>
  );
}
