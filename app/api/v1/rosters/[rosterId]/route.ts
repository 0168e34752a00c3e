import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readBoard } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ rosterId: idSchema('ros') }),
  run: ({ actor, params }) => readBoard(actor, params.rosterId),
});
