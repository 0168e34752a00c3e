import { type MemberChange, memberChangeSchema } from '@/modules/access';
import { membershipsOf, type RoleGroup } from './role-choices';

/** What ticked boxes ask for, checked with the schema that the route shares; or why it cannot be. */
export function readRoles(
  keys: readonly string[],
  groups: readonly RoleGroup[],
): { readonly change: MemberChange } | { readonly error: string } {
  const outcome = memberChangeSchema.safeParse({ memberships: membershipsOf(keys, groups) });
  if (outcome.success) return { change: outcome.data };
  return { error: outcome.error.issues.map(({ message }) => message).join(' ') };
}
