import type { Membership } from '../../modules/access';
import type { OrganisationId, UserId } from '../../modules/units';
import { newId } from '../../modules/units/server';
import { db } from '../client';
import { memberships, users } from '../schema';

/** `Ingrid Solane` signs in as `ingrid.solane@ravelmere.example`. */
export const emailOf = (name: string): string =>
  `${name.toLowerCase().replaceAll(' ', '.')}@ravelmere.example`;

/** What every account of the demo shares. */
export interface AccountContext {
  readonly organisationId: OrganisationId;
  readonly passwordHash: string;
}

/** Inserts a user with one role. */
export function insertAccount(
  name: string,
  membership: Membership,
  { organisationId, passwordHash }: AccountContext,
): UserId {
  const id = newId('usr');
  db()
    .insert(users)
    .values({ id, organisationId, email: emailOf(name), name, passwordHash })
    .run();
  db()
    .insert(memberships)
    .values({ id: newId('mem'), userId: id, ...membership })
    .run();
  return id;
}
