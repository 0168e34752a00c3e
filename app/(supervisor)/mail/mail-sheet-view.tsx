'use client';

import { useQuery } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { ProblemNote } from '@/app/_ui/problem-note';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { FakeMailSummary } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { sentWords } from './mail-words';
import { MailsAndOne } from './mails-and-one';

interface Props {
  readonly mails: readonly FakeMailSummary[];
  readonly zone: Zone;
}

/** Mails arrive a moment after publishing. */
const lookAgainMilliseconds = 15_000;

/** The mail sheet of a demonstration: what was sent, and one mail in full. */
export function MailSheetView({ mails: atFirst, zone }: Props) {
  const { data: mails, error } = useQuery({
    queryKey: ['mails'],
    queryFn: () => callApi<FakeMailSummary[]>('GET', 'mails'),
    initialData: [...atFirst],
    refetchInterval: lookAgainMilliseconds,
  });
  return (
    <>
      <Verdict lead="This is a demonstration: mail goes to a mail server on this machine that keeps it and passes nothing on. What it kept of your teams is here, newest first.">
        Mail kept by the demo’s own mail server
      </Verdict>
      <ProblemNote problem={error} kept="The list below is as it was read before." />
      {mails.length === 0 ? (
        <p className="line-cut max-w-[46rem] pt-6 text-body">
          No mail yet. Publish a roster, and each person’s mail appears here.
        </p>
      ) : (
        <MailsAndOne mails={mails} zone={zone} />
      )}
      <TitleBlock
        figures={[
          { label: 'Mails kept', value: mails.length },
          { label: 'Newest', value: mails[0] ? sentWords(mails[0].sentAtUtc, zone) : 'none' },
          { label: 'Times of', value: zone, isLast: true },
        ]}
      />
    </>
  );
}
