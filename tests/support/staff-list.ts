import { db } from '@/db/client';
import { contracts, leave, people, personSkills, skills } from '@/db/schema';
import type { LocalDate, PersonId, SkillId, TeamId, UserId } from '@/modules/units';
import { newId } from '@/modules/units/server';

/** A skill of a team, in the order in which they are added. */
export function addSkill(teamId: TeamId, name: string, position = 0): SkillId {
  const id = newId('ski');
  db().insert(skills).values({ id, teamId, name, position }).run();
  return id;
}

interface PersonChanges {
  readonly position?: number;
  readonly userId?: UserId;
  readonly isActive?: boolean;
  readonly contract?: Partial<typeof contracts.$inferInsert>;
}

/** A person on 40 hours a week from 2027-01-04, exact, holding the skills; the first is the home skill. */
export function addPerson(
  teamId: TeamId,
  name: string,
  skillIds: readonly SkillId[],
  { contract = {}, ...changes }: PersonChanges = {},
): PersonId {
  const id = newId('per');
  const email = `${id}@test.example`;
  db()
    .insert(people)
    .values({ id, teamId, name, email, staffNumber: id, isActive: true, position: 0, ...changes })
    .run();
  skillIds.forEach((skillId, position) => {
    db().insert(personSkills).values({ personId: id, skillId, position, expiresOn: null }).run();
  });
  db()
    .insert(contracts)
    .values({
      id: newId('con'),
      personId: id,
      startsOn: '2027-01-04',
      endsOn: null,
      weeklyMinutes: 2400,
      underMinutes: 0,
      overtimeMinutes: 0,
      payCentsPerHour: 2000,
      paidBy: 'contract',
      mayWorkNights: true,
      ...contract,
    })
    .run();
  return id;
}

/** Leave of whole days, both included. */
export function addLeave(
  personId: PersonId,
  startsOn: LocalDate,
  endsOn: LocalDate,
  creditMinutes = 480,
): void {
  db()
    .insert(leave)
    .values({ id: newId('lea'), personId, startsOn, endsOn, creditMinutes })
    .run();
}
