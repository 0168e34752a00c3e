import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { chooseTeam } from '@/app/_team';
import { Shell } from '@/app/_ui/shell';
import { TeamChoice } from '@/app/_ui/team-choice';
import { canInTeam } from '@/modules/access';
import { listRosters, suggestNextStart } from '@/modules/roster/server';
import { PeriodsView } from './periods-view';

export const metadata: Metadata = { title: 'Roster' };

export default async function Page({ searchParams }: PageProps<'/roster'>) {
  const actor = await requireActor('rosters.read');
  const { team, teams } = await chooseTeam(actor, 'rosters.read', searchParams);
  const rosters = listRosters(actor, team.id);
  const nextStart = suggestNextStart(actor, team.id);
  if (!rosters.ok || !nextStart.ok) notFound();
  return (
    <Shell actor={actor}>
      <PeriodsView
        key={team.id}
        team={team}
        rosters={rosters.value}
        nextStart={nextStart.value}
        mayOpen={canInTeam(actor, 'rosters.write', team)}
        choice={<TeamChoice teams={teams} teamId={team.id} />}
      />
    </Shell>
  );
}
