import type { TeamInfo } from '../access';
import { listFloors } from '../coverage/server';
import { gatherProblem } from './gather-problem';
import { proofOf } from './prove-version';
import { findNewestPublished, getNewestVersion, listShifts, readConfirmations } from './store';
import type { Roster } from './stored';
import { readTeamWords } from './team-words';
import type { RosterSummary } from './views';

/** The line of one period in the list of periods. */
export function summariseRoster(team: TeamInfo, roster: Roster): RosterSummary {
  const words = readTeamWords(team.id);
  const version = getNewestVersion(roster.id);
  const shifts = listShifts(version.id);
  const told = findNewestPublished(roster.id);
  const toldShifts = told?.id === version.id ? shifts : told ? listShifts(told.id) : [];
  const proof = proofOf(version, shifts, words, () => gatherProblem(team, roster).problem);
  const isDraft = version.publishedAtUtc === null;
  return {
    id: roster.id,
    teamId: roster.teamId,
    startsOn: roster.startsOn,
    endsOn: roster.endsOn,
    state: roster.closedAtUtc !== null ? 'closed' : isDraft ? 'draft' : 'published',
    versionNumber: version.number,
    hasFloors: listFloors(team.id).some(
      ({ effectiveFrom, effectiveTo }) =>
        effectiveFrom <= roster.endsOn && (effectiveTo === null || roster.startsOn <= effectiveTo),
    ),
    shiftCount: shifts.length,
    shortageMinutes: proof?.shortageMinutes ?? null,
    confirmedCount: told ? readConfirmations(told.id).size : 0,
    peopleCount: told
      ? new Set(toldShifts.map(({ personId }) => personId)).size
      : words.people.filter(({ isActive }) => isActive).length,
  };
}
