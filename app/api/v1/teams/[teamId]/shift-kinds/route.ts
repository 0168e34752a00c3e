import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { shiftKindInputSchema } from '@/modules/coverage';
import { addShiftKind } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

export const POST = endpoint({
  need: 'floors.write',
  params: z.object({ teamId: idSchema('tea') }),
  body: shiftKindInputSchema,
  status: 201,
  run: ({ actor, params, body }) => addShiftKind(actor, params.teamId, body),
});
