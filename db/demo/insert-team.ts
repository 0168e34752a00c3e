import { newId } from '../../modules/units/server';
import { db } from '../client';
import { skills, teams } from '../schema';
import type { DemoDates } from './dates';
import { type AccountContext, insertAccount } from './insert-account';
import { insertCoverage } from './insert-coverage';
import { insertPeople } from './insert-people';
import type { DemoTeam } from './team-data';

/** Inserts one team with everything but rosters. Call it inside a transaction. */
export function insertTeam(team: DemoTeam, dates: DemoDates, account: AccountContext): void {
  const teamId = newId('tea');
  const { organisationId } = account;
  db()
    .insert(teams)
    .values({ id: teamId, organisationId, ...team.settings })
    .run();
  const skillIds = new Map(team.skills.map((name) => [name, newId('ski')]));
  [...skillIds].forEach(([name, id], position) => {
    db().insert(skills).values({ id, teamId, name, position }).run();
  });
  insertAccount(team.supervisor, { role: 'supervisor', teamId }, account);
  insertCoverage(team, teamId, skillIds, dates);
  insertPeople(team, teamId, skillIds, dates, account);
}
