import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { readBoard } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';
import { RosterView } from './roster-view';

export const metadata: Metadata = { title: 'Roster' };

export default async function Page({ params }: PageProps<'/roster/[rosterId]'>) {
  const actor = await requireActor('rosters.read');
  const rosterId = idSchema('ros').safeParse((await params).rosterId);
  const board = rosterId.success ? readBoard(actor, rosterId.data) : null;
  if (!board?.ok) notFound();
  return (
    <Shell actor={actor}>
      <RosterView start={board.value} />
    </Shell>
  );
}
