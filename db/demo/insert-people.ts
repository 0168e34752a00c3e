import {
  addDays,
  daysBetween,
  type PersonId,
  type SkillId,
  type TeamId,
} from '../../modules/units';
import { newId } from '../../modules/units/server';
import { db } from '../client';
import { contracts, leave, people, personSkills } from '../schema';
import { type DemoDates, dayOf, periodDays } from './dates';
import { type AccountContext, emailOf, insertAccount } from './insert-account';
import { type DemoPerson, type DemoTeam, hours } from './team-data';

/** Leave counts as this much work on each of its days. */
const leaveMinutesADay = hours(8);
/** Contracts began this many periods before the running one. */
const periodsInService = 13;

/** Inserts the people of a team, each with an account, skills and a contract, and their leave. */
export function insertPeople(
  team: DemoTeam,
  teamId: TeamId,
  skillIds: ReadonlyMap<string, SkillId>,
  dates: DemoDates,
  account: AccountContext,
): void {
  const startsOn = addDays(dates.running.startsOn, -periodsInService * periodDays);
  team.people.forEach((person, position) => {
    const personId = insertPerson(person, position, teamId, account);
    insertSkills(personId, person, skillIds);
    db()
      .insert(contracts)
      .values({ id: newId('con'), personId, startsOn, endsOn: null, ...person.contract })
      .run();
    insertLeave(personId, person.name, team, dates);
  });
}

function insertPerson(
  { name, staffNumber }: DemoPerson,
  position: number,
  teamId: TeamId,
  account: AccountContext,
): PersonId {
  const id = newId('per');
  const userId = insertAccount(name, { role: 'staff', teamId }, account);
  db()
    .insert(people)
    .values({
      id,
      teamId,
      userId,
      name,
      email: emailOf(name),
      staffNumber,
      isActive: true,
      position,
    })
    .run();
  return id;
}

function insertSkills(
  personId: PersonId,
  person: DemoPerson,
  skillIds: ReadonlyMap<string, SkillId>,
): void {
  person.skills.forEach((name, position) => {
    const skillId = skillIds.get(name);
    if (!skillId) throw new Error(`${person.name} holds ${name}, which the team does not have.`);
    db().insert(personSkills).values({ personId, skillId, position, expiresOn: null }).run();
  });
}

function insertLeave(personId: PersonId, name: string, team: DemoTeam, dates: DemoDates): void {
  for (const row of team.leave.filter((entry) => entry.name === name)) {
    const startsOn = dayOf(dates[row.period], row.from);
    const endsOn = dayOf(dates[row.period], row.to);
    const creditMinutes = (daysBetween(startsOn, endsOn) + 1) * leaveMinutesADay;
    db()
      .insert(leave)
      .values({ id: newId('lea'), personId, startsOn, endsOn, creditMinutes })
      .run();
  }
}
