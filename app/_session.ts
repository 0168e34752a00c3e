import { redirect } from 'next/navigation';
import { getServerSession } from 'next-auth';
import { cache } from 'react';
import { type Actor, can, type Need } from '@/modules/access';
import { findActor } from '@/modules/access/server';
import { authOptions } from './_auth';

/** Who is asking, or null. The session and the roles are read from the database on each request. */
export const currentActor = cache(async (): Promise<Actor | null> => {
  const session = await getServerSession(authOptions);
  return session?.sessionId ? findActor(session.sessionId) : null;
});

/**
 * The actor of a page. Sends strangers to sign in and people without the need to a page that says so.
 * Rows are guarded by the use-cases; this opens the page only.
 */
export async function requireActor(need: Need): Promise<Actor> {
  const actor = await currentActor();
  if (!actor) redirect('/sign-in');
  if (!can(actor, need)) redirect('/not-allowed');
  return actor;
}
