import { useFormContext } from 'react-hook-form';
import { controlClass, useNotes } from '@/app/_ui/field-frame';
import { weekdayNames } from '@/modules/units';
import type { FloorForm } from './floor-form';
import { columnNames } from './floor-rows';

const columns = [...weekdayNames, 'Holiday'];
const notesId = 'need-fields';

/** People needed for each weekday and on public holidays, side by side. */
export function NeedFields() {
  const { register, formState } = useFormContext<FloorForm>();
  const errors = formState.errors.needs;
  const problem = columnNames
    .map((name, day) => ({ name, message: errors?.[day]?.message }))
    .find(({ message }) => message);
  const notes = useNotes(
    notesId,
    undefined,
    problem ? `${problem.name}: ${problem.message}` : undefined,
  );
  return (
    <fieldset aria-describedby={notes.describedBy}>
      <legend className="mb-1 text-second font-[640]">People needed</legend>
      <div className="grid grid-cols-8 gap-2 phone:grid-cols-4">
        {columns.map((name, day) => (
          <label key={name} className="block text-second text-ink2">
            {name}
            <input
              type="text"
              inputMode="numeric"
              autoComplete="off"
              aria-label={`People on ${columnNames[day]}`}
              aria-invalid={errors?.[day] ? true : undefined}
              className={`${controlClass} figures`}
              {...register(`needs.${day}`)}
            />
          </label>
        ))}
      </div>
      {notes.element}
    </fieldset>
  );
}
