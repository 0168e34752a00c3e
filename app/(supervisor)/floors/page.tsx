import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { listTeams } from '@/modules/access/server';
import { readCoverage } from '@/modules/coverage/server';
import { listRosters, readFooting, suggestNextStart } from '@/modules/roster/server';
import { chooseTeam, TeamChoice } from '../_team-choice';
import { FloorsSheet } from './floors-sheet';
import { choosePeriod, listPeriods } from './period';

export const metadata: Metadata = { title: 'Floors' };

/** Least people on duty: the floors of a team, and whether contracts give the hours they need. */
export default async function Page({ searchParams }: PageProps<'/floors'>) {
  const actor = await requireActor('floors.read');
  const asked = await searchParams;
  const teams = listTeams(actor, 'floors.read');
  const team = chooseTeam(teams, asked.team);
  if (!team) notFound();
  const coverage = readCoverage(actor, team.id);
  const rosters = listRosters(actor, team.id);
  const nextStart = suggestNextStart(actor, team.id);
  if (!coverage.ok || !rosters.ok || !nextStart.ok) notFound();
  const periods = listPeriods(rosters.value, nextStart.value, team.periodDays);
  const period = choosePeriod(periods, rosters.value, asked.period);
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
        teamChoice={<TeamChoice teams={teams} team={team} />}
      />
    </Shell>
  );
}
