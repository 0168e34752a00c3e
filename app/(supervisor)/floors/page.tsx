import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { chooseTeam } from '@/app/_team';
import { Shell } from '@/app/_ui/shell';
import { TeamChoice } from '@/app/_ui/team-choice';
import { readCoverage } from '@/modules/coverage/server';
import { listRosters, readFooting, suggestNextStart } from '@/modules/roster/server';
import { FloorsSheet } from './floors-sheet';
import { choosePeriod, listPeriods } from './period';

export const metadata: Metadata = { title: 'Floors' };

/** Least people on duty: the floors of a team, and whether contracts give the hours they need. */
export default async function Page({ searchParams }: PageProps<'/floors'>) {
  const actor = await requireActor('floors.read');
  const { team, teams } = await chooseTeam(actor, 'floors.read', searchParams);
  const coverage = readCoverage(actor, team.id);
  const rosters = listRosters(actor, team.id);
  const nextStart = suggestNextStart(actor, team.id);
  if (!coverage.ok || !rosters.ok || !nextStart.ok) notFound();
  const periods = listPeriods(rosters.value, nextStart.value, team.periodDays);
  const period = choosePeriod(periods, rosters.value, (await searchParams).period);
  if (!period) notFound();
  const footing = readFooting(actor, team.id, { from: period.startsOn, to: period.endsOn });
  if (!footing.ok) notFound();
  return (
    <Shell actor={actor}>
      <FloorsSheet
        key={team.id}
        coverage={coverage.value}
        periods={periods}
        period={period}
        footing={footing.value}
        teamChoice={<TeamChoice teams={teams} teamId={team.id} />}
      />
    </Shell>
  );
}
