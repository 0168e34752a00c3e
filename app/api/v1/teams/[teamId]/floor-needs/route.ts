import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { floorNeedsSchema } from '@/modules/coverage';
import { setFloorNeeds } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

export const PUT = endpoint({
  need: 'floors.write',
  params: z.object({ teamId: idSchema('tea') }),
  body: floorNeedsSchema,
  run: ({ actor, params, body }) => setFloorNeeds(actor, params.teamId, body),
});
