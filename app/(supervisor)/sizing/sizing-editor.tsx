import { zodResolver } from '@hookform/resolvers/zod';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import { SectionHead } from '@/app/_ui/section-head';
import type { ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import type { SizingInput } from '@/modules/sizing';
import { showAtFields } from '../_refusal';
import { LinesTable } from './lines-table';
import { QuestionFields } from './question-fields';
import { type SizingForm, sizingFormSchema, toForm } from './sizing-form';

interface Props {
  readonly kinds: readonly ShiftKind[];
  readonly skills: readonly Skill[];
  readonly currency: string;
  /** What stands in the table at first. */
  readonly start: SizingInput;
  /** The table made from the floors. */
  readonly beginning: SizingInput;
  readonly onSize: (input: SizingInput) => Promise<unknown>;
  readonly onStartAgain: () => void;
  readonly problem: unknown;
}

/** The question of a sizing. What was typed stays when it is refused, with the reason at its field. */
export function SizingEditor({
  kinds,
  skills,
  currency,
  start,
  beginning,
  onSize,
  onStartAgain,
  problem,
}: Props) {
  const { form, ask } = useSizingForm(start, onSize);
  const { isSubmitting } = form.formState;
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={ask} aria-label="What to size">
        <SectionHead>What to size</SectionHead>
        <QuestionFields />
        <h3 className="mt-2 text-body font-[660]">Patterns people may work</h3>
        <p className="mb-2 max-w-[60rem] text-second text-ink2">
          One line for each kind of job: so many days in a row on one shift kind every week,
          beginning on one of the days ticked. Pay is in {currency} for one day worked. Without a
          skill, people count only where a floor asks for anybody.
        </p>
        <LinesTable
          kinds={kinds}
          skills={skills}
          onStartAgain={() => {
            form.reset(toForm(beginning));
            onStartAgain();
          }}
        />
        <div className="mt-5 mb-4 flex flex-wrap items-center gap-4">
          <Button type="submit" look="primary" disabled={isSubmitting}>
            {isSubmitting ? 'Sizing…' : 'Size'}
          </Button>
          <ProblemNote problem={problem} kept="What you typed is kept." />
        </div>
      </form>
    </FormProvider>
  );
}

/** The form and what submitting it does: read, ask, and show a refusal at the fields it names. */
function useSizingForm(start: SizingInput, onSize: Props['onSize']) {
  const form = useForm<SizingForm, unknown, SizingInput>({
    resolver: zodResolver(sizingFormSchema),
    defaultValues: toForm(start),
  });
  const ask = form.handleSubmit(async (input) => {
    try {
      await onSize(input);
    } catch (refusal) {
      showAtFields(form.setError, refusal);
    }
  });
  return { form, ask };
}
