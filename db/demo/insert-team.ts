import type { TeamId, UserId } from '../../modules/units';
import { newId } from '../../modules/units/server';
import { db } from '../client';
import { skills, teams } from '../schema';
import type { DemoDates } from './dates';
import { type AccountContext, insertAccount } from './insert-account';
import { insertCoverage } from './insert-coverage';
import { insertPeople } from './insert-people';
import type { DemoTeam } from './team-data';

/** A team and its supervisor's account, as inserted. */
export interface InsertedTeam {
  readonly teamId: TeamId;
  readonly supervisorId: UserId;
}

/** Inserts one team with everything but rosters. Call it inside a transaction. */
export function insertTeam(
  team: DemoTeam,
  dates: DemoDates,
  account: AccountContext,
): InsertedTeam {
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
  const supervisorId = insertAccount(team.supervisor, { role: 'supervisor', teamId }, account);
  insertCoverage(team, teamId, skillIds, dates);
  insertPeople(team, teamId, skillIds, dates, account);
  return { teamId, supervisorId };
}
