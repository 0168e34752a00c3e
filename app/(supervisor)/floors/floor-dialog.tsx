'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '@/app/_ui/button';
import { FormDialog } from '@/app/_ui/form-dialog';
import type { FloorInput } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import { DialogFoot } from '../_dialog-foot';
import { showAtFields } from '../_refusal';
import { FloorFields } from './floor-fields';
import { type FloorForm, floorFormSchema } from './floor-form';

interface Props {
  readonly skills: readonly Skill[];
  readonly currency: string;
  /** What stands in the fields at first. */
  readonly start: FloorForm;
  readonly onSave: (input: FloorInput) => Promise<unknown>;
  readonly problem: unknown;
  readonly onClose: () => void;
  /** Given for a floor that exists. */
  readonly onRemove?: (() => void) | undefined;
}

/** Adds a floor, or changes or removes one that exists. */
export function FloorDialog({
  skills,
  currency,
  start,
  onSave,
  problem,
  onClose,
  onRemove,
}: Props) {
  const form = useForm<FloorForm, unknown, FloorInput>({
    resolver: zodResolver(floorFormSchema),
    defaultValues: start,
  });
  const save = form.handleSubmit((input) =>
    onSave(input).then(onClose, (refusal) => showAtFields(form.setError, refusal)),
  );
  return (
    <FormDialog title={onRemove ? 'Change a floor' : 'Add a floor'} isOpen onOpenChange={onClose}>
      <FormProvider {...form}>
        <form noValidate onSubmit={save} className="mt-4 grid gap-5">
          <FloorFields skills={skills} currency={currency} />
          <DialogFoot
            problem={problem}
            isSaving={form.formState.isSubmitting}
            saveLabel={onRemove ? 'Change floor' : 'Add floor'}
            onCancel={onClose}
            aside={onRemove ? <Button onClick={onRemove}>Remove floor…</Button> : null}
          />
        </form>
      </FormProvider>
    </FormDialog>
  );
}
