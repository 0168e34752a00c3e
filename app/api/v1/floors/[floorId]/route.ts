import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { floorInputSchema } from '@/modules/coverage';
import { changeFloor, removeFloor } from '@/modules/coverage/server';
import { idSchema } from '@/modules/units';

const params = z.object({ floorId: idSchema('flr') });

export const PUT = endpoint({
  need: 'floors.write',
  params,
  body: floorInputSchema,
  run: ({ actor, params, body }) => changeFloor(actor, params.floorId, body),
});

export const DELETE = endpoint({
  need: 'floors.write',
  params,
  run: ({ actor, params }) => removeFloor(actor, params.floorId),
});
