import { useFormContext, useWatch } from 'react-hook-form';
import { CheckField } from '@/app/_ui/check-field';
import { NumberField, TextField, TimeField } from '@/app/_ui/field';
import { useNotes } from '@/app/_ui/field-frame';
import type { Skill } from '@/modules/people';
import { windowHint } from '../_window';
import type { KindForm } from './kind-form';

interface Props {
  readonly skills: readonly Skill[];
}

/** Everything that makes a shift kind. */
export function KindFields({ skills }: Props) {
  const { register, formState } = useFormContext<KindForm>();
  const { errors } = formState;
  const [start, end] = useWatch<KindForm, ['startMinute', 'endMinute']>({
    name: ['startMinute', 'endMinute'],
  });
  return (
    <>
      <div className="grid items-start gap-4 desk:grid-cols-[2fr_1fr]">
        <TextField label="Name" maxLength={40} error={errors.name?.message} {...register('name')} />
        <TextField
          label="Letter on the brick"
          hint="One to three letters"
          maxLength={3}
          error={errors.letter?.message}
          {...register('letter')}
        />
      </div>
      <div className="grid items-start gap-4 desk:grid-cols-3">
        <TimeField label="From" error={errors.startMinute?.message} {...register('startMinute')} />
        <TimeField
          label="To"
          hint={windowHint(start, end)}
          error={errors.endMinute?.message}
          {...register('endMinute')}
        />
        <NumberField
          label="Unpaid break, minutes"
          min={0}
          max={240}
          error={errors.unpaidBreakMinutes?.message}
          {...register('unpaidBreakMinutes')}
        />
      </div>
      <CheckField
        label="Counts as a Night"
        hint="For the rules on nights: runs of nights, nights in a period, people who do no nights."
        {...register('isNight')}
      />
      <PostFields skills={skills} />
    </>
  );
}

const notesId = 'post-fields';

function PostFields({ skills }: Props) {
  const { register, formState } = useFormContext<KindForm>();
  const posts = useWatch<KindForm, 'posts'>({ name: 'posts' });
  const notes = useNotes(notesId, undefined, formState.errors.skillIds?.message);
  return (
    <fieldset aria-describedby={notes.describedBy}>
      <legend className="text-second font-[640]">Skills that work it</legend>
      <div className="flex flex-wrap gap-x-6">
        <CheckField type="radio" label="All" value="all" {...register('posts')} />
        <CheckField type="radio" label="Only these" value="some" {...register('posts')} />
      </div>
      {posts === 'some' ? (
        <div className="flex flex-wrap gap-x-6 pl-7">
          {skills.map(({ id, name }) => (
            <CheckField key={id} label={name} value={id} {...register('skillIds')} />
          ))}
        </div>
      ) : null}
      {notes.element}
    </fieldset>
  );
}
