import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readRun } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ runId: idSchema('run') }),
  run: ({ actor, params }) => readRun(actor, params.runId),
});
