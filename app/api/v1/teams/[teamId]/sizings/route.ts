import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { sizingInputSchema } from '@/modules/sizing';
import { sizeTeam } from '@/modules/sizing/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'sizing.run',
  params: z.object({ teamId: idSchema('tea') }),
  body: sizingInputSchema,
  status: 201,
  run: ({ actor, params, body }) => sizeTeam(actor, params.teamId, body),
});
