import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { listRuns } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ teamId: idSchema('tea') }),
  run: ({ actor, params }) => listRuns(actor, params.teamId),
});
