import type { Metadata } from 'next';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { env } from '@/db/env';
import { listTeams } from '@/modules/access/server';
import { listMails } from '@/modules/mail/server';
import { MailElsewhere } from './mail-elsewhere';
import { MailSheetView } from './mail-sheet-view';

export const metadata: Metadata = { title: 'Mail' };

/** The mails that the demo's local mail server keeps; elsewhere a sentence on where mail goes. */
export default async function MailPage() {
  const actor = await requireActor('mail.read');
  const mails = await listMails(actor);
  const [team] = listTeams(actor, 'mail.read');
  return (
    <Shell actor={actor}>
      {mails.ok && team ? (
        <MailSheetView mails={mails.value} zone={team.zone} />
      ) : (
        <MailElsewhere hasServer={env().SMTP_URL !== undefined} />
      )}
    </Shell>
  );
}
