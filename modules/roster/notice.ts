import type { TeamInfo } from '../access';
import { addDays, daysBetween, type LocalDate } from '../units';

/** Days people have to confirm a roster, unless its first day is nearer. */
const confirmDays = 3;

/** Last day to confirm: the day before the period, at most three days away and never in the past. */
export function confirmByOf(startsOn: LocalDate, today: LocalDate): LocalDate {
  const daysLeft = daysBetween(today, startsOn) - 1;
  return addDays(today, Math.max(0, Math.min(daysLeft, confirmDays)));
}

/**
 * A sentence when publishing today gives less notice than the team promises, else null. Notice is
 * counted in calendar days: from the 1st to the 15th is 14.
 */
export function noticeWarningOf(
  team: Pick<TeamInfo, 'noticeDays'>,
  startsOn: LocalDate,
  today: LocalDate,
): string | null {
  const days = daysBetween(today, startsOn);
  if (days >= team.noticeDays) return null;
  const given = days < 0 ? 'The period has begun already' : `People get ${counted(days)} of notice`;
  return `${given}; this team promises ${counted(team.noticeDays)}.`;
}

const counted = (days: number): string => `${days} ${days === 1 ? 'day' : 'days'}`;
