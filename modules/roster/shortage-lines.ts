import type { Problem } from '../problem';
import type { ProvenShortage } from '../proof';
import { formatClock, formatDay, toLocal } from '../units';
import { originOf } from './axis';

/**
 * What is short, in words by date, window and skill, in order of time:
 * `Thu 11 Feb 23:00-07:00, Vet: short 1`. Windows read as the team's wall clock shows them.
 */
export function shortageLines(
  problem: Pick<Problem, 'days' | 'skills' | 'zone'>,
  shortages: readonly ProvenShortage[],
): string[] {
  const skillNames = new Map(problem.skills.map(({ id, name }) => [id, name]));
  const clock = axisClock(problem);
  return [...shortages]
    .sort((one, other) => one.startMinute - other.startMinute)
    .map(({ startMinute, endMinute, skillId, missingPeople, isFirm }) => {
      const start = clock(startMinute);
      const window = `${formatClock(start.minute)}-${formatClock(clock(endMinute).minute)}`;
      const skill = skillId === null ? 'anybody' : (skillNames.get(skillId) ?? skillId);
      const wished = isFirm ? '' : ' (wished)';
      return `${formatDay(start.date)} ${window}, ${skill}: short ${missingPeople}${wished}`;
    });
}

/** Reads minutes of a problem's time axis on the team's wall clock. */
function axisClock(problem: Pick<Problem, 'days' | 'zone'>) {
  const origin = originOf(problem).instant;
  return (axisMinute: number) => toLocal(origin + axisMinute * 60_000, problem.zone);
}
