import { useId, useState } from 'react';
import type { FakeMailSummary } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { MailTable } from './mail-table';
import { OpenMail } from './open-mail';

interface Props {
  readonly mails: readonly FakeMailSummary[];
  readonly zone: Zone;
}

/** The list, and the open mail beside it, below it where there is no room. */
export function MailsAndOne({ mails, zone }: Props) {
  const [openName, setOpenName] = useState<string | null>(null);
  const headId = useId();
  const open = (name: string) => {
    setOpenName(name);
    requestAnimationFrame(() => document.getElementById(headId)?.focus());
  };
  const close = () => {
    if (openName) document.getElementById(`mail-${openName}`)?.focus();
    setOpenName(null);
  };
  return (
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
  );
}
