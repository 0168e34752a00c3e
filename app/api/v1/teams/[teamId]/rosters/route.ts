import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { openPeriodSchema } from '@/modules/roster';
import { listRosters, openPeriod } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

const params = z.object({ teamId: idSchema('tea') });

export const GET = endpoint({
  need: 'rosters.read',
  params,
  run: ({ actor, params }) => listRosters(actor, params.teamId),
});

export const POST = endpoint({
  need: 'rosters.write',
  params,
  body: openPeriodSchema,
  status: 201,
  run: ({ actor, params, body }) => openPeriod(actor, params.teamId, body),
});
