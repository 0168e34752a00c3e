import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { floorInputSchema } from '@/modules/coverage';
import { addFloor } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'floors.write',
  params: z.object({ teamId: idSchema('tea') }),
  body: floorInputSchema,
  status: 201,
  run: ({ actor, params, body }) => addFloor(actor, params.teamId, body),
});
