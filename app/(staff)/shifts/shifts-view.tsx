'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { useAnnounce } from '@/app/_ui/live-region';
import { TitleBlock } from '@/app/_ui/title-block';
import type { OwnPeriod, OwnShifts } from '@/modules/roster';
import { formatClock, formatDay } from '@/modules/units';
import { ConfirmBox, confirmId } from './confirm-box';
import { ConfirmNotice } from './confirm-notice';
import { NextUp } from './next-up';
import { periodsAhead } from './order-periods';
import { PeriodSection } from './period-section';

const key = ['own-shifts'];

/** A person's own shifts: what comes next, then each published period with its question to confirm. */
export function ShiftsView({ first }: { readonly first: OwnShifts }) {
  const client = useQueryClient();
  const announce = useAnnounce();
  const { data: own, refetch } = useQuery({
    queryKey: key,
    queryFn: () => callApi<OwnShifts>('GET', 'me/shifts'),
    initialData: first,
  });
  const confirming = useMutation({
    mutationFn: ({ versionId }: OwnPeriod) =>
      callApi<OwnShifts>('POST', 'me/confirmations', { versionId }),
    onSuccess: (answer, period) => {
      client.setQueryData(key, answer);
      announce('Confirmed.');
      // The button that had the focus goes away.
      document.getElementById(confirmId(period))?.focus();
    },
  });
  const periods = periodsAhead(own.periods, own.today);
  return (
    <>
      <NextUp own={own} periods={periods} />
      <ConfirmNotice periods={periods} today={own.today} />
      <div className="grid gap-x-12 desk:grid-cols-2">
        {periods.map((period) => {
          const isAsked = confirming.variables?.versionId === period.versionId;
          return (
            <PeriodSection key={period.versionId} period={period} own={own}>
              <ConfirmBox
                period={period}
                own={own}
                onConfirm={() => confirming.mutate(period)}
                isSending={isAsked && confirming.isPending}
                problem={isAsked ? confirming.error : null}
                onReadAgain={() => {
                  confirming.reset();
                  void refetch();
                }}
              />
            </PeriodSection>
          );
        })}
      </div>
      <TitleBlock
        figures={[
          { label: 'Team', value: own.teamName },
          { label: "Times by the team's clock", value: own.zone },
          {
            label: 'As of',
            value: `${formatDay(own.today)}, ${formatClock(own.nowMinute)}`,
            isLast: true,
          },
        ]}
      />
    </>
  );
}
