import type { LimitName, Problem, Requirement } from '../problem';
import { assertNever } from '../units';
import type { WayOutView } from './knot-views';

type Change = WayOutView['changes'][number];
type Size = 'step' | 'dropped';

/** One change of a way out as something to do, and whom it must be asked. */
export function changeOf(
  problem: Problem,
  requirement: Requirement,
  words: string,
  size: Size,
): Change {
  const change = size === 'dropped' ? 'Do without' : stepWords(requirement);
  return { words: `${change}: ${words}`, ...askOf(problem, requirement) };
}

/** The least step by which a requirement is loosened. */
function stepWords(requirement: Requirement): string {
  switch (requirement.kind) {
    case 'floor':
      return 'One person fewer';
    case 'ceiling':
      return 'One person more';
    case 'limit':
    case 'ownLimit':
      return limitStep(requirement.limit);
    case 'leastHours':
      return 'One shift less';
    case 'mostHours':
    case 'kindLimit':
      return 'One shift more';
    case 'teamRule':
    case 'noNights':
    case 'absence':
    case 'pin':
      return 'Do without';
    default:
      return assertNever(requirement);
  }
}

function limitStep(limit: LimitName): string {
  switch (limit) {
    case 'restMinutes':
      return 'One hour less';
    case 'shortestRunDays':
    case 'shortestRunFreeDays':
      return 'One fewer';
    case 'kindsThatMayNotFollow':
      return 'Do without';
    default:
      return 'One more';
  }
}

function askOf({ people }: Problem, requirement: Requirement): Pick<Change, 'ask' | 'asksPerson'> {
  if ('personId' in requirement) {
    const name = people.find(({ id }) => id === requirement.personId)?.name ?? 'the person';
    return { ask: `Ask ${name} first`, asksPerson: true };
  }
  const isCover = requirement.kind === 'floor' || requirement.kind === 'ceiling';
  const ask = isCover
    ? 'Whoever answers for this floor'
    : 'Whoever answers for the rules of the team';
  return { ask, asksPerson: false };
}
