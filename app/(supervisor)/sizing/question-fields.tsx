import { useFormContext } from 'react-hook-form';
import { NumberField, SelectField, TextField } from '@/app/_ui/field';
import { weekdayNames } from '@/modules/units';
import type { SizingForm } from './sizing-form';

/** What is asked of all lines together: which floors, what is made least, how many people at most. */
export function QuestionFields() {
  const { register, formState } = useFormContext<SizingForm>();
  const { errors } = formState;
  return (
    <div className="grid grid-cols-[repeat(auto-fit,minmax(11rem,1fr))] items-start gap-4 py-3 desk:max-w-[60rem]">
      <TextField
        label="Week of"
        type="date"
        hint="Any date of the week whose floors are taken"
        error={errors.weekOf?.message}
        {...register('weekOf')}
      />
      <SelectField label="Floors of" error={errors.span?.message} {...register('span')}>
        <option value="week">the whole week</option>
        {weekdayNames.map((name, weekday) => (
          <option key={name} value={weekday}>
            {name}, as if every day were one
          </option>
        ))}
      </SelectField>
      <SelectField label="Make least" error={errors.objective?.message} {...register('objective')}>
        <option value="people">the number of people</option>
        <option value="pay">their pay</option>
      </SelectField>
      <NumberField
        label="Most people altogether"
        hint="Empty: no limit"
        min={0}
        error={errors.mostPeople?.message}
        {...register('mostPeople')}
      />
    </div>
  );
}
