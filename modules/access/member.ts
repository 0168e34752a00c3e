import { z } from 'zod';
import type { UserId } from '../units';
import type { Membership } from './actor';
import { roles } from './actor';

/** A user as the owner sees them. */
export interface Member {
  readonly userId: UserId;
  readonly name: string;
  readonly email: string;
  readonly isDisabled: boolean;
  readonly memberships: readonly Membership[];
}

/** One role; a team for supervisor and staff, none for owner and hr. */
const membershipInputSchema = z
  .strictObject({ role: z.enum(roles), teamId: z.string().nullable() })
  .refine(({ role, teamId }) => (role === 'owner' || role === 'hr') === (teamId === null), {
    path: ['teamId'],
    message: 'Supervisor and staff need a team; owner and HR have none.',
  });

/** What an owner may change of a member. Left out: unchanged. */
export const memberChangeSchema = z.strictObject({
  isDisabled: z.boolean().optional(),
  memberships: z
    .array(membershipInputSchema)
    .min(1, 'Leave at least one role, or disable the account.')
    .max(20)
    .optional(),
});
export type MemberChange = z.infer<typeof memberChangeSchema>;
