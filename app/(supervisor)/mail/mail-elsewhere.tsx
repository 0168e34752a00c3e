import { Verdict } from '@/app/_ui/verdict';

interface Props {
  /** Whether a mail server is set up; otherwise mails are kept as files. */
  readonly hasServer: boolean;
}

/** Outside demonstrations no mail is shown: other people's mail is read where it arrives. */
export function MailElsewhere({ hasServer }: Props) {
  return (
    <>
      <Verdict>Mail goes out, it is not shown here</Verdict>
      <p className="max-w-[46rem] text-body">
        {hasServer
          ? 'Mail of this site goes to its SMTP server, and each person reads it in their own mailbox.'
          : 'No SMTP server is set up, so mail reaches nobody: it is kept as files on this server. Whoever runs it can set SMTP_URL.'}{' '}
        Mails are shown on this page in demonstrations only.
      </p>
    </>
  );
}
