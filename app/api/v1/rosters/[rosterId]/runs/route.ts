import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { startRunSchema } from '@/modules/roster';
import { startRun } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'rosters.write',
  params: z.object({ rosterId: idSchema('ros') }),
  body: startRunSchema,
  status: 201,
  run: ({ actor, params, body }) => startRun(actor, params.rosterId, body),
});
