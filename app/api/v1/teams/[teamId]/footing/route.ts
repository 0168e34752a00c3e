import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readFooting } from '@/modules/roster/server';
import { dateRangeSchema, idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'floors.read',
  params: z.object({ teamId: idSchema('tea') }),
  query: dateRangeSchema,
  run: ({ actor, params, query }) => readFooting(actor, params.teamId, query),
});
