import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { stopRun } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'rosters.write',
  params: z.object({ runId: idSchema('run') }),
  run: ({ actor, params }) => stopRun(actor, params.runId),
});
