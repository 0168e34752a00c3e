import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { chooseTeam } from '@/app/_team';
import { Shell } from '@/app/_ui/shell';
import { TeamChoice } from '@/app/_ui/team-choice';
import { readSizingSheet } from '@/modules/sizing/server';
import { SizingSheetView } from './sizing-sheet-view';

export const metadata: Metadata = { title: 'Sizing' };

/** How many people, on which patterns, the floors of a team take at least. */
export default async function Page({ searchParams }: PageProps<'/sizing'>) {
  const actor = await requireActor('sizing.run');
  const { team, teams } = await chooseTeam(actor, 'sizing.run', searchParams);
  const sheet = readSizingSheet(actor, team.id);
  if (!sheet.ok) notFound();
  return (
    <Shell actor={actor}>
      <SizingSheetView
        key={team.id}
        sheet={sheet.value}
        teamChoice={<TeamChoice teams={teams} teamId={team.id} />}
      />
    </Shell>
  );
}
