import { endpoint } from '@/app/_endpoint';
import { listMails } from '@/modules/mail/server';

export const dynamic = 'force-dynamic';

/** The mails that the local fake kept; demonstrations only. */
export const GET = endpoint({ need: 'mail.read', run: ({ actor }) => listMails(actor) });
