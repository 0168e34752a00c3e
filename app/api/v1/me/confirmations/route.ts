import { endpoint } from '@/app/_endpoint';
import { confirmSchema } from '@/modules/roster';
import { confirmRoster } from '@/modules/roster/server';

export const POST = endpoint({
  need: 'own-shifts.confirm',
  body: confirmSchema,
  run: ({ actor, body }) => confirmRoster(actor, body),
});
