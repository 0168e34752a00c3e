import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { chooseTeam } from '@/app/_team';
import { Shell } from '@/app/_ui/shell';
import { TeamChoice } from '@/app/_ui/team-choice';
import { readCoverage } from '@/modules/coverage/server';
import { ShiftKindsSheet } from './shift-kinds-sheet';

export const metadata: Metadata = { title: 'Shift kinds' };

/** The patterns of one day that a team's people work: start, end, break, and who may stand in them. */
export default async function Page({ searchParams }: PageProps<'/shift-kinds'>) {
  const actor = await requireActor('floors.read');
  const { team, teams } = await chooseTeam(actor, 'floors.read', searchParams);
  const coverage = readCoverage(actor, team.id);
  if (!coverage.ok) notFound();
  return (
    <Shell actor={actor}>
      <ShiftKindsSheet
        key={team.id}
        coverage={coverage.value}
        teamChoice={<TeamChoice teams={teams} teamId={team.id} />}
      />
    </Shell>
  );
}
