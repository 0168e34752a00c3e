import { endpoint } from '@/app/_endpoint';
import { listMembers } from '@/modules/access/server';

/** Every user of the organisation, for owners. */
export const GET = endpoint({ need: 'members.write', run: ({ actor }) => listMembers(actor) });
