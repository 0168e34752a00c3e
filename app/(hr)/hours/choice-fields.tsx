import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '@/app/_ui/button';
import { SelectField, TextField } from '@/app/_ui/field';
import type { HoursChoice } from './hours-address';
import { rangeFormSchema, type TypedChoice } from './range-form';

interface Props {
  readonly teams: readonly { readonly id: string; readonly name: string }[];
  /** What stands in the address, also dates that cannot be read. */
  readonly typed: TypedChoice;
  /** Whether the address holds dates that cannot be read. */
  readonly isUnreadable: boolean;
  readonly onShow: (choice: HoursChoice) => void;
}

const dateFields = [
  { name: 'from', label: 'First day' },
  { name: 'to', label: 'Last day' },
] as const;

/** Team and dates. What was typed stays when it is refused, with the reason at its field. */
export function ChoiceFields({ teams, typed, isUnreadable, onShow }: Props) {
  const form = useForm({ resolver: zodResolver(rangeFormSchema), values: typed });
  const { errors } = form.formState;
  const { trigger } = form;
  useEffect(() => {
    if (isUnreadable) trigger();
  }, [isUnreadable, trigger]);
  return (
    <form
      noValidate
      aria-label="Which hours"
      onSubmit={form.handleSubmit(({ teamId, ...range }) => onShow({ teamId, range }))}
      className="flex flex-wrap items-start gap-4 phone:gap-3"
      data-print="off"
    >
      {teams.length > 1 ? (
        <SelectField
          label="Team"
          className="w-56 phone:w-full"
          defaultValue={typed.teamId}
          {...form.register('teamId')}
        >
          {teams.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
      ) : null}
      {dateFields.map(({ name, label }) => (
        <TextField
          key={name}
          label={label}
          type="date"
          error={errors[name]?.message}
          className="w-44 phone:w-[calc(50%-0.375rem)]"
          defaultValue={typed[name]}
          {...form.register(name)}
        />
      ))}
      <Button type="submit" look="primary" className="mt-[1.4rem] min-h-9! phone:mt-0 phone:w-full">
        Show hours
      </Button>
    </form>
  );
}
