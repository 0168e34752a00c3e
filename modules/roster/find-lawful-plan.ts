import type { PlannedRoster, Problem } from '../problem';
import { proveRoster } from '../proof';
import type { RosterId } from '../units';
import { matchShifts } from './match-shifts';
import { getNewestVersion, listShifts } from './store';

/**
 * The newest version of a roster as a start for a run, or null when it is empty or breaks a rule of the
 * problem. A run that starts from it never ends with a worse roster.
 */
export function findLawfulPlan(rosterId: RosterId, problem: Problem): PlannedRoster | null {
  const shifts = listShifts(getNewestVersion(rosterId).id);
  const names = { person: (id: string) => id, kind: (id: string) => id };
  const { roster, breaches } = matchShifts(problem, shifts, names);
  if (roster.length === 0 || breaches.length > 0) return null;
  return proveRoster(problem, roster).breaches.length === 0 ? roster : null;
}
