import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readLatestSizing } from '@/modules/sizing/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'sizing.run',
  params: z.object({ teamId: idSchema('tea') }),
  run: ({ actor, params }) => readLatestSizing(actor, params.teamId),
});
