import { now } from '../../db/clock';
import type { Actor, TeamInfo } from '../access';
import { requireTeam } from '../access/server';
import { listHolidays } from '../coverage/server';
import type { Leave, Person } from '../people';
import { listLeave } from '../people/server';
import { type ClockRules, creditIn, readTerms } from '../problem';
import {
  listPublishedPeriods,
  listPublishedShifts,
  readTeamWords,
  type TeamWords,
} from '../roster/server';
import { readPayRules } from '../rules/server';
import {
  addDays,
  type DateRange,
  datesOf,
  type Outcome,
  ok,
  type PersonId,
  type TeamId,
  toLocal,
} from '../units';
import { anyDate } from './any-date';
import { listWorkedShifts } from './store';
import { type PlannedTime, sumDay, type WorkedTime } from './sum-day';
import { sumPerson } from './sum-person';
import type { HoursPerson, HoursView } from './views';

/**
 * Planned and worked hours of a team over a range of dates: planned from the newest published versions,
 * worked from what was recorded, each counted on the local date on which it starts.
 */
export function readHours(actor: Actor, teamId: TeamId, range: DateRange): Outcome<HoursView> {
  const team = requireTeam(actor, 'hours.read', teamId);
  if (!team.ok) return team;
  const { from, to } = range;
  return ok({
    teamName: team.value.name,
    from,
    to,
    today: toLocal(now(), team.value.zone).date,
    periods: listPublishedPeriods(teamId, from, to),
    allPeriods: listPublishedPeriods(teamId, anyDate.from, anyDate.to),
    payRules: readPayRules(team.value.organisationId),
    people: readPeople(team.value, range),
  });
}

function readPeople(team: TeamInfo, { from, to }: DateRange): HoursPerson[] {
  const words = readTeamWords(team.id);
  const leave = listLeave(team.id, from, to);
  const planned = groupByPersonAndDate(
    listPublishedShifts(team.id, from, to).map((shift) => ({
      ...shift,
      shift: words.kind(shift.shiftKindId).name,
      post: words.skill(shift.skillId),
    })),
  );
  const worked = groupByPersonAndDate(listWorkedShifts(team.id, from, to));
  const clock = clockOf(team, from, to);
  return words.people
    .filter(({ id, isActive }) => isActive || planned.has(id) || worked.has(id))
    .map((person) => {
      const plannedOn = planned.get(person.id) ?? new Map<string, PlannedTime[]>();
      const workedOn = worked.get(person.id) ?? new Map<string, WorkedTime[]>();
      const dates = [...new Set([...plannedOn.keys(), ...workedOn.keys()])].sort();
      const days = dates.map((date) =>
        sumDay(date, plannedOn.get(date) ?? [], workedOn.get(date) ?? [], clock),
      );
      return {
        ...describePerson(person, leave, { from, to }, words),
        ...sumPerson(days),
        days,
      };
    });
}

function describePerson(
  person: Person,
  leave: readonly Leave[],
  { from, to }: DateRange,
  words: TeamWords,
) {
  const home = person.skills[0];
  const own = leave.filter(({ personId }) => personId === person.id);
  const period = { startsOn: from, endsOn: to };
  return {
    personId: person.id,
    name: person.name,
    staffNumber: person.staffNumber,
    homeSkill: home ? words.skill(home.skillId) : '',
    contractMinutes: readTerms(person, datesOf(from, to))?.contractMinutes ?? 0,
    leaveMinutes: own.reduce((sum, away) => sum + creditIn(away, period), 0),
  };
}

/** The last shift of a range may end two dates later: 24 hours from 23:59, and a clock change. */
function clockOf(team: TeamInfo, from: string, to: string): ClockRules {
  const holidays = new Set(listHolidays(team.id, from, addDays(to, 2)).map(({ date }) => date));
  return {
    zone: team.zone,
    pay: readPayRules(team.organisationId),
    isHoliday: (date) => holidays.has(date),
  };
}

function groupByPersonAndDate<T extends { readonly personId: PersonId; readonly date: string }>(
  rows: readonly T[],
): ReadonlyMap<PersonId, ReadonlyMap<string, T[]>> {
  const groups = new Map<PersonId, Map<string, T[]>>();
  for (const row of rows) {
    const days = groups.get(row.personId) ?? new Map<string, T[]>();
    days.set(row.date, [...(days.get(row.date) ?? []), row]);
    groups.set(row.personId, days);
  }
  return groups;
}
