import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { readTeamCalendar } from '@/modules/roster/server';
import { dateRangeSchema, idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ teamId: idSchema('tea') }),
  query: dateRangeSchema,
  run: ({ actor, params, query }) => readTeamCalendar(actor, params.teamId, query),
});
