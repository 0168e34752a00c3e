import { and, asc, eq, gte, lte } from 'drizzle-orm';
import { db } from '../../db/client';
import { contracts, leave, people, personSkills, skills } from '../../db/schema';
import type { LocalDate, PersonId, TeamId, UserId } from '../units';
import type { Contract, HeldSkill, Leave, Person, Skill } from './person';

/** The skills of a team in the order of its lists. */
export function listSkills(teamId: TeamId): Skill[] {
  return db()
    .select()
    .from(skills)
    .where(eq(skills.teamId, teamId))
    .orderBy(asc(skills.position), asc(skills.name))
    .all();
}

/** Everybody of a team, people who left included (`isActive` false), in the order of its lists. */
export function listPeople(teamId: TeamId): Person[] {
  const rows = db()
    .select()
    .from(people)
    .where(eq(people.teamId, teamId))
    .orderBy(asc(people.position), asc(people.name))
    .all();
  const held = skillsByPerson(teamId);
  const agreed = contractsByPerson(teamId);
  return rows.map(({ position: _, ...person }) => ({
    ...person,
    skills: held.get(person.id) ?? [],
    contracts: agreed.get(person.id) ?? [],
  }));
}

/** The person in a staff list that a user is; null for users who work no shifts. */
export function findPersonOfUser(userId: UserId): Person | null {
  const row = db()
    .select({ teamId: people.teamId })
    .from(people)
    .where(eq(people.userId, userId))
    .get();
  if (!row) return null;
  return listPeople(row.teamId).find((person) => person.userId === userId) ?? null;
}

/** Leave of a team that touches the dates `from` to `to`, both included, earliest first. */
export function listLeave(teamId: TeamId, from: LocalDate, to: LocalDate): Leave[] {
  return db()
    .select({
      id: leave.id,
      personId: leave.personId,
      startsOn: leave.startsOn,
      endsOn: leave.endsOn,
      creditMinutes: leave.creditMinutes,
    })
    .from(leave)
    .innerJoin(people, eq(people.id, leave.personId))
    .where(and(eq(people.teamId, teamId), lte(leave.startsOn, to), gte(leave.endsOn, from)))
    .orderBy(asc(leave.startsOn), asc(people.position))
    .all();
}

function skillsByPerson(teamId: TeamId): Map<PersonId, HeldSkill[]> {
  const rows = db()
    .select({
      personId: personSkills.personId,
      skillId: personSkills.skillId,
      position: personSkills.position,
      expiresOn: personSkills.expiresOn,
    })
    .from(personSkills)
    .innerJoin(people, eq(people.id, personSkills.personId))
    .where(eq(people.teamId, teamId))
    .orderBy(asc(personSkills.position))
    .all();
  return groupByPerson(rows);
}

function contractsByPerson(teamId: TeamId): Map<PersonId, Contract[]> {
  const rows = db()
    .select({
      personId: contracts.personId,
      startsOn: contracts.startsOn,
      endsOn: contracts.endsOn,
      weeklyMinutes: contracts.weeklyMinutes,
      underMinutes: contracts.underMinutes,
      overtimeMinutes: contracts.overtimeMinutes,
      payCentsPerHour: contracts.payCentsPerHour,
      paidBy: contracts.paidBy,
      mayWorkNights: contracts.mayWorkNights,
    })
    .from(contracts)
    .innerJoin(people, eq(people.id, contracts.personId))
    .where(eq(people.teamId, teamId))
    .orderBy(asc(contracts.startsOn))
    .all();
  return groupByPerson(rows);
}

function groupByPerson<T extends { readonly personId: PersonId }>(
  rows: readonly T[],
): Map<PersonId, Omit<T, 'personId'>[]> {
  const groups = new Map<PersonId, Omit<T, 'personId'>[]>();
  for (const { personId, ...row } of rows) {
    const group = groups.get(personId);
    if (group) group.push(row);
    else groups.set(personId, [row]);
  }
  return groups;
}
