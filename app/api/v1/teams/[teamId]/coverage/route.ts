import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readCoverage } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'floors.read',
  params: z.object({ teamId: idSchema('tea') }),
  run: ({ actor, params }) => readCoverage(actor, params.teamId),
});
