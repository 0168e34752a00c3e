import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { chooseTeam } from '@/app/_team';
import { Shell } from '@/app/_ui/shell';
import { TeamChoice } from '@/app/_ui/team-choice';
import { listRuns } from '@/modules/roster/server';
import { RunsTable } from './runs-table';

export const metadata: Metadata = { title: 'Runs' };

export default async function Page({ searchParams }: PageProps<'/runs'>) {
  const actor = await requireActor('rosters.write');
  const { team, teams } = await chooseTeam(actor, 'rosters.write', searchParams);
  const runs = listRuns(actor, team.id);
  if (!runs.ok) notFound();
  return (
    <Shell actor={actor}>
      <RunsTable
        runs={runs.value}
        team={team}
        choice={<TeamChoice teams={teams} teamId={team.id} />}
      />
    </Shell>
  );
}
