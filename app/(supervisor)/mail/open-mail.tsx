import { useQuery } from '@tanstack/react-query';
import { callApi } from '@/app/_api';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { FakeMail } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { MailBody } from './mail-body';
import { sentWords, subjectWords } from './mail-words';

interface Props {
  readonly name: string;
  readonly zone: Zone;
  /** Id of the heading, which takes the focus when the mail opens. */
  readonly headId: string;
  readonly onClose: () => void;
}

/** One mail in full: its head, its two bodies and what is attached. */
export function OpenMail({ name, zone, headId, onClose }: Props) {
  const { data: mail, error } = useQuery({
    queryKey: ['mails', name],
    queryFn: () => callApi<FakeMail>('GET', `mails/${name}`),
    staleTime: Number.POSITIVE_INFINITY,
  });
  return (
    <section
      aria-labelledby={headId}
      className="line-cut min-w-0 pt-3"
      onKeyDown={(event) => event.key === 'Escape' && onClose()}
    >
      <div className="flex items-start justify-between gap-4">
        <h2 id={headId} tabIndex={-1} className="text-verdict font-[660]">
          {mail ? subjectWords(mail.subject) : 'Reading mail…'}
        </h2>
        <Button look="quiet" onClick={onClose}>
          Close
        </Button>
      </div>
      <ProblemNote problem={error} />
      {mail ? (
        <>
          <p className="mt-1 mb-3 text-second text-ink2">
            To {mail.to}, {sentWords(mail.sentAtUtc, zone)}
          </p>
          <MailBody mail={mail} zone={zone} />
        </>
      ) : null}
    </section>
  );
}
