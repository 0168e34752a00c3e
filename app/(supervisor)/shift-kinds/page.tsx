import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { listTeams } from '@/modules/access/server';
import { readCoverage } from '@/modules/coverage/server';
import { chooseTeam, TeamChoice } from '../_team-choice';
import { ShiftKindsSheet } from './shift-kinds-sheet';

export const metadata: Metadata = { title: 'Shift kinds' };

/** The patterns of one day that a team's people work: start, end, break, and who may stand in them. */
export default async function Page({ searchParams }: PageProps<'/shift-kinds'>) {
  const actor = await requireActor('floors.read');
  const asked = await searchParams;
  const teams = listTeams(actor, 'floors.read');
  const team = chooseTeam(teams, asked.team);
  const coverage = team ? readCoverage(actor, team.id) : null;
  if (!team || !coverage?.ok) notFound();
  return (
    <Shell actor={actor}>
      <ShiftKindsSheet
        key={team.id}
        coverage={coverage.value}
        teamChoice={<TeamChoice teams={teams} team={team} />}
      />
    </Shell>
  );
}
