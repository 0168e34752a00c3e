import type { LocalDate, TeamId } from '../units';
import { findNewestPublished, listRostersTouching, listTeamShifts } from './store';
import type { VersionShift } from './stored';

/** Shifts of a team that start in a range, of the newest published versions only. No permission check. */
export const listPublishedShifts = (
  teamId: TeamId,
  from: LocalDate,
  to: LocalDate,
): VersionShift[] => listTeamShifts(teamId, from, to, false);

/** Published periods of a team that share a day with a range, earliest first. No permission check. */
export const listPublishedPeriods = (
  teamId: TeamId,
  from: LocalDate,
  to: LocalDate,
): { readonly startsOn: LocalDate; readonly endsOn: LocalDate }[] =>
  listRostersTouching(teamId, from, to)
    .filter(({ id }) => findNewestPublished(id) !== null)
    .map(({ startsOn, endsOn }) => ({ startsOn, endsOn }));
