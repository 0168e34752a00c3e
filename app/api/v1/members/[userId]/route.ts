import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { memberChangeSchema } from '@/modules/access';
import { changeMember } from '@/modules/access/server';
import { idSchema } from '@/modules/units';

/** Disables, enables or gives other roles; bites on the member's next request. */
export const PATCH = endpoint({
  need: 'members.write',
  params: z.object({ userId: idSchema('usr') }),
  body: memberChangeSchema,
  run: ({ actor, params, body }) => changeMember(actor, params.userId, body),
});
