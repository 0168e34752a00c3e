import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { listMembers, listTeams } from '@/modules/access/server';
import { MembersSheetView } from './members-sheet-view';

export const metadata: Metadata = { title: 'Members' };

/** Every user of the organisation, their roles and whether they may sign in. */
export default async function MembersPage() {
  const actor = await requireActor('members.write');
  const members = listMembers(actor);
  if (!members.ok) notFound();
  const teams = listTeams(actor, 'members.write').map(({ id, name }) => ({ id, name }));
  return (
    <Shell actor={actor}>
      <MembersSheetView
        members={members.value}
        teams={teams}
        organisationName={actor.organisationName}
        ownUserId={actor.userId}
      />
    </Shell>
  );
}
