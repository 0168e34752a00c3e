import { type ReactNode, useId } from 'react';

/** What every form part shows around its control. */
export interface FieldText {
  readonly label: string;
  /** How to fill it in. */
  readonly hint?: string | undefined;
  /** What is wrong and how to mend it; react-hook-form's `errors.name?.message` fits. */
  readonly error?: string | undefined;
}

/** What the control must carry so that label, hint and error belong to it. */
export interface ControlProps {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

interface Props extends FieldText {
  readonly className?: string | undefined;
  readonly children: (control: ControlProps) => ReactNode;
}

/** Look of text, number and select controls: 16 px on phones so that they do not zoom. */
export const controlClass =
  'w-full min-h-9 border border-edge border-b-2 border-b-ink bg-lift px-2.5 text-ink ' +
  'phone:min-h-11 phone:text-[1rem] aria-invalid:border-short aria-invalid:border-b-short ' +
  'disabled:border-rule disabled:text-ink3';

/** Label above, control, then hint and error below it. */
export function FieldFrame({ label, hint, error, className = '', children }: Props) {
  const id = useId();
  const notes = useNotes(id, hint, error);
  return (
    <div className={className}>
      <label htmlFor={id} className="mb-1 block text-second font-[640]">
        {label}
      </label>
      {children({
        id,
        'aria-describedby': notes.describedBy,
        'aria-invalid': error ? true : undefined,
      })}
      {notes.element}
    </div>
  );
}

/** Hint and error of a control: their elements, and the ids it is described by. */
export function useNotes(id: string, hint: string | undefined, error: string | undefined) {
  const ids = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean);
  return {
    describedBy: ids.length > 0 ? ids.join(' ') : undefined,
    element: (
      <>
        {hint ? (
          <p id={`${id}-hint`} className="mt-1 text-second text-ink3">
            {hint}
          </p>
        ) : null}
        {error ? (
          <p id={`${id}-error`} className="mt-1 text-second font-[640] text-short">
            <span aria-hidden="true">! </span>
            {error}
          </p>
        ) : null}
      </>
    ),
  };
}
