import type { ComponentProps } from 'react';
import { controlClass, FieldFrame, type FieldText } from './field-frame';

type InputProps = FieldText & ComponentProps<'input'>;

/** One line of text; also e-mail, password and date through `type`. Takes `register('name')`. */
export function TextField({ label, hint, error, className, ...input }: InputProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error} className={className}>
      {(control) => <input type="text" {...input} {...control} className={controlClass} />}
    </FieldFrame>
  );
}

/** A number, with the figures' own keyboard on phones. Register it with `valueAsNumber`. */
export function NumberField({ label, hint, error, className, ...input }: InputProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error} className={className}>
      {(control) => (
        <input
          type="number"
          inputMode="numeric"
          {...input}
          {...control}
          className={`${controlClass} figures`}
        />
      )}
    </FieldFrame>
  );
}

/** A time of day as text, `HH:MM`; read it with `parseClock`. */
export function TimeField({ label, hint, error, className, ...input }: InputProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error} className={className}>
      {(control) => (
        <input
          type="text"
          inputMode="numeric"
          autoComplete="off"
          placeholder="07:00"
          maxLength={5}
          {...input}
          {...control}
          className={`${controlClass} figures placeholder:text-ink3`}
        />
      )}
    </FieldFrame>
  );
}

type SelectProps = FieldText & ComponentProps<'select'>;

/** A choice of one; its options are the children. */
export function SelectField({ label, hint, error, className, children, ...select }: SelectProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error} className={className}>
      {(control) => (
        <select {...select} {...control} className={controlClass}>
          {children}
        </select>
      )}
    </FieldFrame>
  );
}
