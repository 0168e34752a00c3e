import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { fakeMailNameSchema } from '@/modules/mail';
import { readMail } from '@/modules/mail/server';

export const dynamic = 'force-dynamic';

/** One kept mail with its HTML, text and attachments; demonstrations only. */
export const GET = endpoint({
  need: 'mail.read',
  params: z.object({ name: fakeMailNameSchema }),
  run: ({ actor, params }) => readMail(actor, params.name),
});
