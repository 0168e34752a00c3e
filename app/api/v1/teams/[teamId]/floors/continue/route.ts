import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { continueFloorsSchema } from '@/modules/coverage';
import { continueFloors } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'floors.write',
  params: z.object({ teamId: idSchema('tea') }),
  body: continueFloorsSchema,
  run: ({ actor, params, body }) => continueFloors(actor, params.teamId, body),
});
