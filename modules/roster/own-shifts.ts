import { now } from '../../db/clock';
import type { Actor, TeamInfo } from '../access';
import { listHolidays } from '../coverage/server';
import { findContract, type Person } from '../people';
import { listLeave } from '../people/server';
import { readTerms } from '../problem';
import { addDays, datesOf, type Outcome, ok, toLocal } from '../units';
import { describeShift } from './describe-shift';
import { requireOwnPerson } from './require-own';
import { findConfirmation, findNewestPublished, listRostersOf, listShifts } from './store';
import type { KeptShift, Roster, Version } from './stored';
import { readTeamWords, type TeamWords } from './team-words';
import type { OwnPeriod, OwnShifts } from './views';

/** Published periods are shown until this many days after their end. */
const daysShown = 62;

/**
 * What a person sees of the published rosters of their team: their own shifts and, of others, only the
 * names of those in the same post on the same shift.
 */
export function readOwnShifts(actor: Actor): Outcome<OwnShifts> {
  const own = requireOwnPerson(actor, 'own-shifts.read');
  if (!own.ok) return own;
  const { person, team } = own.value;
  const { date: today, minute: nowMinute } = toLocal(now(), team.zone);
  const words = readTeamWords(team.id);
  const periods = listRostersOf(team.id)
    .filter(({ endsOn }) => endsOn >= addDays(today, -daysShown))
    .flatMap((roster) => {
      const version = findNewestPublished(roster.id);
      return version ? [readPeriod(team, person, roster, version, words)] : [];
    });
  return ok({
    personName: person.name,
    teamName: team.name,
    zone: team.zone,
    dayStartsAtMinute: team.dayStartsAtMinute,
    today,
    nowMinute,
    weeklyMinutes: findContract(person, today)?.weeklyMinutes ?? 0,
    periods,
    holidays: holidaysOf(team, periods),
  });
}

function readPeriod(
  team: TeamInfo,
  person: Person,
  roster: Roster,
  version: Version,
  words: TeamWords,
): OwnPeriod {
  const { startsOn, endsOn } = roster;
  const all = listShifts(version.id);
  const own = all.filter(({ personId }) => personId === person.id);
  const proven = version.proof?.people.find(({ personId }) => personId === person.id);
  return {
    rosterId: roster.id,
    versionId: version.id,
    versionNumber: version.number,
    startsOn,
    endsOn,
    confirmBy: version.confirmBy,
    confirmedAtUtc: findConfirmation(version.id, person.id),
    contractMinutes: readTerms(person, datesOf(startsOn, endsOn))?.contractMinutes ?? 0,
    plannedMinutes: own.reduce((sum, { paidMinutes }) => sum + paidMinutes, 0),
    nights: proven?.nights ?? 0,
    weekends: proven?.weekends ?? 0,
    shifts: own.map((shift) =>
      describeShift(shift, team.zone, words, colleaguesOn(shift, all, words)),
    ),
    leave: listLeave(team.id, startsOn, endsOn)
      .filter(({ personId }) => personId === person.id)
      .map((leave) => ({ startsOn: leave.startsOn, endsOn: leave.endsOn })),
  };
}

/** Names of the others in the same post on the same shift: all that a person learns of them. */
const colleaguesOn = (
  shift: KeptShift,
  all: readonly KeptShift[],
  words: TeamWords,
): readonly string[] =>
  all
    .filter(
      (other) =>
        other.personId !== shift.personId &&
        other.date === shift.date &&
        other.shiftKindId === shift.shiftKindId &&
        other.skillId === shift.skillId,
    )
    .map(({ personId }) => words.person(personId));

function holidaysOf(team: TeamInfo, periods: readonly OwnPeriod[]): OwnShifts['holidays'] {
  const first = periods[0]?.startsOn;
  const last = periods.at(-1)?.endsOn;
  return first !== undefined && last !== undefined ? listHolidays(team.id, first, last) : [];
}
