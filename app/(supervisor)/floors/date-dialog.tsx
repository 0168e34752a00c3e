'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import { NumberField, SelectField, TextField } from '@/app/_ui/field';
import { FormDialog } from '@/app/_ui/form-dialog';
import type { Holiday } from '@/modules/coverage';
import { isLocalDate } from '@/modules/units';
import { DialogFoot } from '../_dialog-foot';
import { showAtFields } from '../_refusal';
import { type DateChange, type DateForm, dateFormSchema } from './date-form';
import { type Difference, differenceName, usualNeed } from './differing-dates';
import { columnNames, type FloorRow, rowName } from './floor-rows';
import type { Period } from './period';

interface Props {
  readonly rows: readonly FloorRow[];
  readonly holidays: readonly Holiday[];
  readonly period: Period;
  /** The date to change; null adds one. */
  readonly difference: Difference | null;
  readonly onSave: (change: DateChange) => Promise<unknown>;
  readonly problem: unknown;
  readonly onClose: () => void;
}

/** Gives one date of one floor its own number of people. */
export function DateDialog({
  rows,
  holidays,
  period,
  difference,
  onSave,
  problem,
  onClose,
}: Props) {
  const { register, handleSubmit, setError, formState, control } = useForm<
    DateForm,
    unknown,
    DateChange
  >({ resolver: zodResolver(dateFormSchema), defaultValues: startOf(rows, difference) });
  const [floorId, date] = useWatch({ control, name: ['floorId', 'date'] });
  const save = handleSubmit((change) =>
    onSave(change).then(onClose, (refusal) => showAtFields(setError, refusal)),
  );
  const { errors, isSubmitting } = formState;
  const title = difference ? 'Change a date' : 'Add a date';
  return (
    <FormDialog title={title} isOpen onOpenChange={onClose}>
      <form noValidate onSubmit={save} className="mt-4 grid gap-4 desk:grid-cols-2">
        {difference ? (
          <p className="col-span-full">{differenceName(difference)}</p>
        ) : (
          <>
            <SelectField label="Floor" error={errors.floorId?.message} {...register('floorId')}>
              {rows.map((row) => (
                <option key={row.floor.id} value={row.floor.id}>
                  {rowName(row)}
                </option>
              ))}
            </SelectField>
            <TextField
              label="Date"
              type="date"
              min={period.startsOn}
              max={period.endsOn}
              error={errors.date?.message}
              {...register('date')}
            />
          </>
        )}
        <NumberField
          label="People on that date"
          min={0}
          max={999}
          hint={sayUsual(rows, holidays, floorId, date)}
          error={errors.people?.message}
          {...register('people')}
        />
        <TextField
          label="Reason"
          hint="Shown beside the date, for example: kennels full"
          maxLength={200}
          error={errors.reason?.message}
          {...register('reason')}
        />
        <DialogFoot
          problem={problem}
          isSaving={isSubmitting}
          saveLabel={difference ? 'Change date' : 'Add date'}
          onCancel={onClose}
        />
      </form>
    </FormDialog>
  );
}

function startOf(rows: readonly FloorRow[], difference: Difference | null): DateForm {
  return {
    floorId: difference?.row.floor.id ?? rows[0]?.floor.id ?? '',
    date: difference?.entry.date ?? '',
    people: difference ? String(difference.entry.people) : '',
    reason: difference?.entry.reason ?? '',
  };
}

function sayUsual(
  rows: readonly FloorRow[],
  holidays: readonly Holiday[],
  floorId: string,
  date: string,
): string | undefined {
  const row = rows.find(({ floor }) => floor.id === floorId);
  if (!row || !isLocalDate(date)) return undefined;
  const holiday = holidays.find((one) => one.date === date);
  const people = usualNeed(row, date, holiday !== undefined);
  return `Otherwise ${people}${holiday ? `: ${holiday.name}, ${columnNames[7].toLowerCase()} column` : ''}`;
}
