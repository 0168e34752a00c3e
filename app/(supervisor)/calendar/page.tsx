import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { chooseTeam } from '@/app/_team';
import { rangeOf } from '@/app/_ui/calendar/view-range';
import { Shell } from '@/app/_ui/shell';
import { TeamChoice } from '@/app/_ui/team-choice';
import { readCalendarFrame, readTeamCalendar } from '@/modules/roster/server';
import { TeamCalendar } from './team-calendar';

export const metadata: Metadata = { title: 'Calendar' };

/** The shifts of a team by month, week, day or agenda, for those who may read rosters. */
export default async function Page({ searchParams }: PageProps<'/calendar'>) {
  const actor = await requireActor('rosters.read');
  const { team, teams } = await chooseTeam(actor, 'rosters.read', searchParams);
  const frame = readCalendarFrame(actor, team.id);
  if (!frame.ok) notFound();
  const range = rangeOf('month', frame.value.today);
  const entries = readTeamCalendar(actor, team.id, range);
  if (!entries.ok) notFound();
  return (
    <Shell actor={actor}>
      <TeamCalendar
        key={team.id}
        team={team}
        frame={frame.value}
        first={{ range, entries: entries.value }}
        teamChoice={<TeamChoice teams={teams} teamId={team.id} />}
      />
    </Shell>
  );
}
