import { endpoint } from '@/app/_endpoint';
import { readOwnShifts } from '@/modules/roster/server';

export const GET = endpoint({
  need: 'own-shifts.read',
  run: ({ actor }) => readOwnShifts(actor),
});
