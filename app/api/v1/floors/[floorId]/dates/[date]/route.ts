import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { floorDateInputSchema } from '@/modules/coverage';
import { clearFloorDate, setFloorDate } from '@/modules/coverage/server';
import { idSchema, localDateSchema } from '@/modules/units';

const params = z.object({ floorId: idSchema('flr'), date: localDateSchema });

export const PUT = endpoint({
  need: 'floors.write',
  params,
  body: floorDateInputSchema,
  run: ({ actor, params, body }) =>
    setFloorDate(actor, params.floorId, { ...body, date: params.date }),
});

export const DELETE = endpoint({
  need: 'floors.write',
  params,
  run: ({ actor, params }) => clearFloorDate(actor, params.floorId, params.date),
});
