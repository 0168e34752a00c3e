'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { FormProvider, useForm } from 'react-hook-form';
import { FormDialog } from '@/app/_ui/form-dialog';
import type { ShiftKind, ShiftKindInput } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import { DialogFoot } from '../_dialog-foot';
import { showAtFields } from '../_refusal';
import { KindFields } from './kind-fields';
import { emptyForm, type KindForm, kindFormSchema, toForm } from './kind-form';

interface Props {
  /** null adds one. */
  readonly kind: ShiftKind | null;
  readonly skills: readonly Skill[];
  readonly onSave: (input: ShiftKindInput) => Promise<unknown>;
  readonly problem: unknown;
  readonly onClose: () => void;
}

/** Adds a shift kind or changes one. */
export function KindDialog({ kind, skills, onSave, problem, onClose }: Props) {
  const form = useForm<KindForm, unknown, ShiftKindInput>({
    resolver: zodResolver(kindFormSchema),
    defaultValues: kind ? toForm(kind) : emptyForm(),
  });
  const save = form.handleSubmit((input) =>
    onSave(input).then(onClose, (refusal) => showAtFields(form.setError, refusal)),
  );
  return (
    <FormDialog
      title={kind ? `Change ${kind.name}` : 'Add a shift kind'}
      isOpen
      onOpenChange={onClose}
    >
      <FormProvider {...form}>
        <form noValidate onSubmit={save} className="mt-4 grid gap-5">
          <KindFields skills={skills} />
          {kind ? (
            <p className="text-second text-ink2">
              The change counts from the next run on; rosters keep the times they were planned with.
            </p>
          ) : null}
          <DialogFoot
            problem={problem}
            isSaving={form.formState.isSubmitting}
            saveLabel={kind ? 'Change shift kind' : 'Add shift kind'}
            onCancel={onClose}
          />
        </form>
      </FormProvider>
    </FormDialog>
  );
}
