import { endpoint } from '@/app/_endpoint';
import { readOwnCalendar } from '@/modules/roster/server';
import { dateRangeSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'own-shifts.read',
  query: dateRangeSchema,
  run: ({ actor, query }) => readOwnCalendar(actor, query),
});
