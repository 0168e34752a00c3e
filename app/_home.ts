import type { Actor, Role } from '@/modules/access';

const homes: Record<Role, string> = {
  owner: '/roster',
  supervisor: '/roster',
  hr: '/hours',
  staff: '/shifts',
};
/** For people with several roles: the one with the most to do comes first. */
const order: readonly Role[] = ['supervisor', 'owner', 'hr', 'staff'];

/** Where a person starts after signing in. */
export function homeOf(actor: Actor): string {
  const role = order.find((candidate) => actor.memberships.some((one) => one.role === candidate));
  return role ? homes[role] : '/not-allowed';
}
