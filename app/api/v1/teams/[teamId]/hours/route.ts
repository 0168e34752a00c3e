import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readHours } from '@/modules/hours/server';
import { dateRangeSchema, idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'hours.read',
  params: z.object({ teamId: idSchema('tea') }),
  query: dateRangeSchema,
  run: ({ actor, params, query }) => readHours(actor, params.teamId, query),
});
