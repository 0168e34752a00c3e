import type { Actor, TeamInfo } from '../access';
import { listHolidays } from '../coverage/server';
import type { Publication } from '../mail';
import type { Proof } from '../proof';
import type { LocalDate, PersonId, UtcMilliseconds } from '../units';
import { describeShift } from './describe-shift';
import type { KeptShift, Roster, Version } from './stored';
import type { TeamWords } from './team-words';

/** A version about to be published, with the shifts people were told of before. */
export interface Release {
  readonly actor: Actor;
  readonly team: TeamInfo;
  readonly roster: Roster;
  readonly version: Version;
  readonly shifts: readonly KeptShift[];
  /** Shifts of the version published before; empty for the first. */
  readonly shiftsBefore: readonly KeptShift[];
  readonly proof: Proof;
  readonly confirmBy: LocalDate;
  readonly publishedAtUtc: UtcMilliseconds;
  readonly words: TeamWords;
}

/** What the mails tell: everybody who has shifts now, or had some in the version before. */
export function composePublication(release: Release): Publication {
  const { actor, team, roster, version, words } = release;
  const own = byPerson(release.shifts);
  const before = byPerson(release.shiftsBefore);
  const counts = new Map(release.proof.people.map((person) => [person.personId, person]));
  const describe = (shift: KeptShift) => describeShift(shift, team.zone, words, []);
  return {
    teamId: team.id,
    teamName: team.name,
    organisationName: team.organisationName,
    rosterId: roster.id,
    versionId: version.id,
    versionNumber: version.number,
    startsOn: roster.startsOn,
    endsOn: roster.endsOn,
    zone: team.zone,
    confirmBy: release.confirmBy,
    publishedAtUtc: release.publishedAtUtc,
    publishedByName: actor.name,
    holidays: listHolidays(team.id, roster.startsOn, roster.endsOn),
    people: words.people
      .filter(({ id }) => own.has(id) || before.has(id))
      .map((person) => {
        const shifts = own.get(person.id) ?? [];
        const dates = new Set(shifts.map(({ date }) => date));
        return {
          personId: person.id,
          personName: person.name,
          recipient: person.email,
          shifts: shifts.map(describe),
          removedShifts: (before.get(person.id) ?? [])
            .filter(({ date }) => !dates.has(date))
            .map(describe),
          nights: counts.get(person.id)?.nights ?? 0,
          weekends: counts.get(person.id)?.weekends ?? 0,
        };
      }),
  };
}

function byPerson(shifts: readonly KeptShift[]): ReadonlyMap<PersonId, KeptShift[]> {
  const groups = new Map<PersonId, KeptShift[]>();
  for (const shift of shifts) {
    const group = groups.get(shift.personId);
    if (group) group.push(shift);
    else groups.set(shift.personId, [shift]);
  }
  return groups;
}
