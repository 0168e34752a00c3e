import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { listTeams } from '@/modules/access/server';
import { readHours, suggestRange } from '@/modules/hours/server';
import { queryOf, readAddress } from './hours-address';
import { HoursSheetView } from './hours-sheet-view';

export const metadata: Metadata = { title: 'Hours' };

/** Planned and worked hours of a team over a range of dates; the address says which. */
export default async function HoursPage({ searchParams }: PageProps<'/hours'>) {
  const actor = await requireActor('hours.read');
  const asked = readAddress(queryOf(await searchParams));
  const teams = listTeams(actor, 'hours.read').map(({ id, name }) => ({ id, name }));
  const team = asked.teamId ? teams.find(({ id }) => id === asked.teamId) : teams[0];
  if (!team) notFound();
  const suggested = suggestRange(actor, team.id);
  if (!suggested.ok) notFound();
  const range = asked.range ?? suggested.value;
  const hours = readHours(actor, team.id, range);
  if (!hours.ok) notFound();
  return (
    <Shell actor={actor}>
      <HoursSheetView teams={teams} start={{ teamId: team.id, range }} hours={hours.value} />
    </Shell>
  );
}
