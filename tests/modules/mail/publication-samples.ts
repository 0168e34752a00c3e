import { db } from '@/db/client';
import { people, rosters, rosterVersions } from '@/db/schema';
import type { Actor } from '@/modules/access';
import type { MailShift, PersonShifts, Publication } from '@/modules/mail';
import {
  addDays,
  elapsedMinutes,
  type LocalDate,
  type PersonId,
  type TeamId,
  toInstant,
} from '@/modules/units';
import { newId } from '@/modules/units/server';
import { addActor, addOrganisation, addTeam } from '@/tests/support/organisation';

export const zone = 'Europe/Berlin';

const kinds = {
  Early: { letter: 'E', tone: 0, startMinute: 420, endMinute: 900 },
  Late: { letter: 'L', tone: 2, startMinute: 900, endMinute: 1380 },
  Night: { letter: 'N', tone: 3, startMinute: 1380, endMinute: 1860 },
} as const;

/** A shift in Berlin, paid from start to end. */
export function shiftOn(
  date: LocalDate,
  kindName: keyof typeof kinds,
  skillName = 'Nurse',
): MailShift {
  const kind = kinds[kindName];
  const startsAtUtc = toInstant(date, kind.startMinute, zone);
  const endsAtUtc = toInstant(date, kind.endMinute, zone);
  const paidMinutes = elapsedMinutes(startsAtUtc, endsAtUtc);
  return { date, kindName, skillName, startsAtUtc, endsAtUtc, paidMinutes, ...kind };
}

export function personShifts(
  personId: PersonId,
  personName: string,
  recipient: string,
  shifts: readonly MailShift[],
): PersonShifts {
  const nights = shifts.filter(({ tone }) => tone === 3).length;
  return { personId, personName, recipient, shifts, nights, weekends: 1 };
}

/** Stores a team, two people and a version 1 that can be published. */
export function storedPublication(changes: { readonly startsOn?: LocalDate } = {}): {
  readonly publication: Publication;
  readonly supervisor: Actor;
} {
  const organisationName = 'Tierklinik Grünau, Süd';
  const organisationId = addOrganisation(organisationName);
  const teamId = addTeam(organisationId, { zone });
  const supervisor = addActor(organisationId, 'supervisor', teamId);
  const startsOn = changes.startsOn ?? '2027-03-01';
  const endsOn = addDays(startsOn, 27);
  const rosterId = newId('ros');
  const versionId = newId('ver');
  db().insert(rosters).values({ id: rosterId, teamId, startsOn, endsOn }).run();
  db().insert(rosterVersions).values({ id: versionId, rosterId, number: 1 }).run();
  const publication: Publication = {
    ...{ teamId, teamName: 'Pflege', organisationName, rosterId, versionId, versionNumber: 1 },
    ...{ startsOn, endsOn, zone },
    confirmBy: addDays(startsOn, -7),
    publishedAtUtc: toInstant(addDays(startsOn, -14), 605, zone),
    publishedByName: 'Ingrid Solane',
    holidays: [{ date: addDays(startsOn, 17), name: 'Lantern Day' }],
    people: [
      personShifts(addPerson(teamId, 1), 'Jörg Müller-Ößner', 'joerg@grueneau.example', [
        shiftOn(addDays(startsOn, 1), 'Late', 'Pflegekraft für Kälber'),
        shiftOn(addDays(startsOn, 17), 'Early'),
        shiftOn(addDays(startsOn, 26), 'Night'),
      ]),
      personShifts(addPerson(teamId, 2), 'Łucja Mirov', 'lucja@grueneau.example', [
        shiftOn(addDays(startsOn, 2), 'Night'),
      ]),
    ],
  };
  return { publication, supervisor };
}

function addPerson(teamId: TeamId, position: number): PersonId {
  const id = newId('per');
  const [email, staffNumber] = [`${id}@grueneau.example`, `S${position}`];
  db()
    .insert(people)
    .values({ id, teamId, name: id, email, staffNumber, isActive: true, position })
    .run();
  return id;
}
