import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { shiftKindInputSchema } from '@/modules/coverage';
import { changeShiftKind, retireShiftKind } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

const params = z.object({ kindId: idSchema('knd') });

export const PUT = endpoint({
  need: 'floors.write',
  params,
  body: shiftKindInputSchema,
  run: ({ actor, params, body }) => changeShiftKind(actor, params.kindId, body),
});

export const DELETE = endpoint({
  need: 'floors.write',
  params,
  run: ({ actor, params }) => retireShiftKind(actor, params.kindId),
});
