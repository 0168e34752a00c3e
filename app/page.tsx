import { redirect } from 'next/navigation';
import { homeOf } from './_home';
import { currentActor } from './_session';

/** The bare address leads everybody to their own first sheet. */
export default async function Page() {
  const actor = await currentActor();
  redirect(actor ? homeOf(actor) : '/sign-in');
}
