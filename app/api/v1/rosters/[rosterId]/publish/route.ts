import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { publishSchema } from '@/modules/roster';
import { publishRoster } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'rosters.publish',
  params: z.object({ rosterId: idSchema('ros') }),
  body: publishSchema,
  run: ({ actor, params, body }) => publishRoster(actor, params.rosterId, body),
});
