import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { waysOutSchema } from '@/modules/roster';
import { workOutWays } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

/** Takes up to a minute; ends when the caller leaves. */
export const POST = endpoint({
  need: 'rosters.write',
  params: z.object({ runId: idSchema('run') }),
  body: waysOutSchema,
  run: ({ actor, params, body, request }) => workOutWays(actor, params.runId, body, request.signal),
});
