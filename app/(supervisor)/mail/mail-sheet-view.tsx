'use client';

import { useQuery } from '@tanstack/react-query';
import { useId, useState } from 'react';
import { callApi } from '@/app/_api';
import { ProblemNote } from '@/app/_ui/problem-note';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { FakeMailSummary } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { MailTable } from './mail-table';
import { sentWords } from './mail-words';
import { OpenMail } from './open-mail';

interface Props {
  readonly mails: readonly FakeMailSummary[];
  readonly zone: Zone;
}

/** Mails arrive a moment after publishing. */
const lookAgainMilliseconds = 15_000;

/** The mail sheet of a demonstration: what was sent, and one mail in full. */
export function MailSheetView({ mails: atFirst, zone }: Props) {
  const [openName, setOpenName] = useState<string | null>(null);
  const headId = useId();
  const { data: mails, error } = useQuery({
    queryKey: ['mails'],
    queryFn: () => callApi<FakeMailSummary[]>('GET', 'mails'),
    initialData: [...atFirst],
    refetchInterval: lookAgainMilliseconds,
  });
  const open = (name: string) => {
    setOpenName(name);
    requestAnimationFrame(() => document.getElementById(headId)?.focus());
  };
  const close = () => {
    if (openName) document.getElementById(`mail-${openName}`)?.focus();
    setOpenName(null);
  };
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
        <div className="grid items-start gap-x-9 gap-y-6 min-[70rem]:grid-cols-2">
          <div className="min-w-0 min-[70rem]:sticky min-[70rem]:top-4">
            <MailTable mails={mails} zone={zone} openName={openName} onOpen={open} />
          </div>
          {openName ? (
            <OpenMail key={openName} name={openName} zone={zone} headId={headId} onClose={close} />
          ) : (
            <p className="line-cut pt-3 text-body text-ink2">Choose a mail to read it.</p>
          )}
        </div>
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
