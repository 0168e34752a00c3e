'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useForm } from 'react-hook-form';
import { callApi } from '@/app/_api';
import { Button } from '@/app/_ui/button';
import { dateRangeWithYear } from '@/app/_ui/clock';
import { TextField } from '@/app/_ui/field';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { TeamInfo } from '@/modules/access';
import { openPeriodSchema, type RosterSummary } from '@/modules/roster';
import { addDays, isLocalDate, type LocalDate } from '@/modules/units';

interface Props {
  readonly team: TeamInfo;
  readonly nextStart: LocalDate;
}

/** Opens a period from its first day; its length is the team's. */
export function OpenPeriod({ team, nextStart }: Props) {
  const router = useRouter();
  const form = useForm({
    resolver: zodResolver(openPeriodSchema),
    defaultValues: { startsOn: nextStart },
  });
  const opening = useMutation({
    mutationFn: (input: { startsOn: LocalDate }) =>
      callApi<RosterSummary>('POST', `teams/${team.id}/rosters`, input),
    onSuccess: ({ id }) => router.push(`/roster/${id}`),
  });
  const startsOn = form.watch('startsOn');
  const span = isLocalDate(startsOn)
    ? dateRangeWithYear(startsOn, addDays(startsOn, team.periodDays - 1))
    : null;
  return (
    <form
      noValidate
      onSubmit={form.handleSubmit((input) => opening.mutate(input))}
      className="grid max-w-[30rem] gap-3 pt-2"
    >
      <TextField
        label="First day"
        type="date"
        hint={span ? `The period is ${span}.` : `The period has ${team.periodDays} days.`}
        error={form.formState.errors.startsOn?.message}
        {...form.register('startsOn')}
      />
      <div>
        <Button type="submit" look="primary" disabled={opening.isPending}>
          Open period
        </Button>
      </div>
      <ProblemNote problem={opening.error} kept="The date you chose is kept." />
    </form>
  );
}
