import type { TeamInfo } from '../access';
import { listFloors, listHolidays, listShiftKinds } from '../coverage/server';
import { listLeave, listPeople, listSkills } from '../people/server';
import {
  type AssembledProblem,
  assembleProblem,
  historyDays,
  type NeighbourShift,
  type PinnedCell,
} from '../problem';
import { readPayRules, readRuleSet } from '../rules/server';
import { addDays, type LocalDate, type RosterId, type TeamId } from '../units';
import { getNewestVersion, listShifts, listTeamShifts } from './store';
import type { Roster } from './stored';

/**
 * Everything the product knows today about a period, as one problem, and in notes what had to be left
 * out. Shifts of the days before and after count once published; pins are those of the roster's newest version.
 */
export function gatherProblem(
  team: TeamInfo,
  { id, startsOn, endsOn }: Pick<Roster, 'startsOn' | 'endsOn'> & { readonly id: RosterId | null },
): AssembledProblem {
  const rules = readRuleSet(team.id);
  const reach = historyDays(rules);
  return assembleProblem({
    team,
    startsOn,
    endsOn,
    skills: listSkills(team.id),
    shiftKinds: listShiftKinds(team.id),
    floors: listFloors(team.id),
    // A shift that starts on the last day may end on the day after it.
    holidays: listHolidays(team.id, addDays(startsOn, -1), addDays(endsOn, 1)),
    people: listPeople(team.id),
    leave: listLeave(team.id, startsOn, addDays(endsOn, 1)),
    history: publishedOf(team.id, addDays(startsOn, -reach), addDays(startsOn, -1)),
    following: publishedOf(team.id, addDays(endsOn, 1), addDays(endsOn, reach)),
    pins: id === null ? [] : pinsOf(id),
    rules,
    pay: readPayRules(team.organisationId),
  });
}

function pinsOf(rosterId: RosterId): PinnedCell[] {
  return listShifts(getNewestVersion(rosterId).id)
    .filter(({ isPinned }) => isPinned)
    .map(({ personId, date, shiftKindId, skillId }) => ({
      personId,
      date,
      kindId: shiftKindId,
      postSkillId: skillId,
    }));
}

function publishedOf(teamId: TeamId, from: LocalDate, to: LocalDate): NeighbourShift[] {
  const nights = new Set(
    listShiftKinds(teamId, { withRetired: true })
      .filter(({ isNight }) => isNight)
      .map(({ id }) => id),
  );
  return listTeamShifts(teamId, from, to, false).map((shift) => ({
    personId: shift.personId,
    date: shift.date,
    startsAtUtc: shift.startsAtUtc,
    endsAtUtc: shift.endsAtUtc,
    isNight: nights.has(shift.shiftKindId),
    postSkillId: shift.skillId,
  }));
}
