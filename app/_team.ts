import { notFound } from 'next/navigation';
import type { Actor, Need, TeamInfo } from '@/modules/access';
import { listTeams } from '@/modules/access/server';

/** The search parameter that chooses a team on sheets of people with several. */
export type TeamSearch = Promise<{ readonly [key: string]: string | string[] | undefined }>;

/** The teams of a sheet and the one it shows: `?team=` when it is among them, else the first. */
export async function chooseTeam(
  actor: Actor,
  need: Need,
  search: TeamSearch,
): Promise<{ readonly team: TeamInfo; readonly teams: readonly TeamInfo[] }> {
  const teams = listTeams(actor, need);
  const { team: wanted } = await search;
  const team = teams.find(({ id }) => id === wanted) ?? teams[0];
  if (!team) notFound();
  return { team, teams };
}
