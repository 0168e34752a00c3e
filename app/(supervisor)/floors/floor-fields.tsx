import { useFormContext, useWatch } from 'react-hook-form';
import { CheckField } from '@/app/_ui/check-field';
import { SelectField, TextField, TimeField } from '@/app/_ui/field';
import type { Skill } from '@/modules/people';
import { windowHint } from '../_window';
import type { FloorForm } from './floor-form';
import { NeedFields } from './need-fields';

interface Props {
  readonly skills: readonly Skill[];
  readonly currency: string;
}

/** Everything that makes a floor: who, when, how many, how they count, and whether it must hold. */
export function FloorFields({ skills, currency }: Props) {
  const { register, formState } = useFormContext<FloorForm>();
  const { errors } = formState;
  const [start, end] = useWatch<FloorForm, ['startMinute', 'endMinute']>({
    name: ['startMinute', 'endMinute'],
  });
  return (
    <>
      <div className="grid items-start gap-4 desk:grid-cols-3">
        <SelectField label="Skill" error={errors.skillId?.message} {...register('skillId')}>
          <option value="">Anybody</option>
          {skills.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        <TimeField label="From" error={errors.startMinute?.message} {...register('startMinute')} />
        <TimeField
          label="To"
          hint={windowHint(start, end)}
          error={errors.endMinute?.message}
          {...register('endMinute')}
        />
      </div>
      <NeedFields />
      <CountingFields />
      <ForceFields currency={currency} />
      <div className="grid items-start gap-4 desk:grid-cols-2">
        <TextField
          label="First day"
          type="date"
          error={errors.effectiveFrom?.message}
          {...register('effectiveFrom')}
        />
        <TextField
          label="Last day"
          type="date"
          hint="Empty: until you change it"
          error={errors.effectiveTo?.message}
          {...register('effectiveTo')}
        />
      </div>
    </>
  );
}

function CountingFields() {
  const { register } = useFormContext<FloorForm>();
  return (
    <fieldset>
      <legend className="text-second font-[640]">Who counts</legend>
      <CheckField
        type="radio"
        label="Seated"
        value="seated"
        hint="Each person counts once, in the post they hold; seated floors of one skill that overlap add up."
        {...register('counting')}
      />
      <CheckField
        type="radio"
        label="Shared"
        value="shared"
        hint="Everybody on duty who holds the skill counts, even if another floor counts them too."
        {...register('counting')}
      />
    </fieldset>
  );
}

function ForceFields({ currency }: Pick<Props, 'currency'>) {
  const { register, formState } = useFormContext<FloorForm>();
  const force = useWatch<FloorForm, 'force'>({ name: 'force' });
  return (
    <fieldset>
      <legend className="text-second font-[640]">Must it hold?</legend>
      <CheckField
        type="radio"
        label="Firm"
        value="firm"
        hint="The roster keeps to it, and says where it can’t."
        {...register('force')}
      />
      <CheckField
        type="radio"
        label="Wished"
        value="wished"
        hint="The roster may leave it short where that costs less than its price."
        {...register('force')}
      />
      {force === 'wished' ? (
        <TextField
          label={`Price of one missing person for one hour, ${currency}`}
          inputMode="decimal"
          placeholder="40.00"
          error={formState.errors.priceCentsPerHour?.message}
          className="mt-2 max-w-72"
          {...register('priceCentsPerHour')}
        />
      ) : null}
    </fieldset>
  );
}
