import type { Problem, ProblemPerson } from './problem';
import type { ProblemRules } from './problem-rules';
import { type LimitName, type Requirement, requirementKey, unlimited } from './requirement';
import { creditOf } from './returned-credit';

/**
 * The problem in which these requirements do not bind; every roster that keeps the others is lawful in it.
 * An absence that is dropped gives its credit back as hours that may be worked, not as hours that must be.
 * Dropping every hour a person can work as a most leaves what fits into the days.
 */
export function without(problem: Problem, requirements: readonly Requirement[]): Problem {
  const dropped = new Set(requirements.map(requirementKey));
  const isDropped = (requirement: Requirement): boolean => dropped.has(requirementKey(requirement));
  const { floors, ceilings, teamRules, rules, people } = problem;
  return {
    ...problem,
    floors: floors.filter(
      ({ floorId, dayIndex, priceCentsPerHour }) =>
        priceCentsPerHour !== null || !isDropped({ kind: 'floor', floorId, dayIndex }),
    ),
    ceilings: ceilings.filter(
      ({ ceilingId, dayIndex, priceCentsPerHour }) =>
        priceCentsPerHour !== null || !isDropped({ kind: 'ceiling', ceilingId, dayIndex }),
    ),
    teamRules: teamRules.filter(
      ({ id, priceCents }) => priceCents !== null || !isDropped({ kind: 'teamRule', ruleId: id }),
    ),
    rules: loosenRules(rules, (limit) => isDropped({ kind: 'limit', limit })),
    people: people.map((person) => withoutOf(problem, person, isDropped)),
  };
}

type IsDropped = (requirement: Requirement) => boolean;

function withoutOf(problem: Problem, person: ProblemPerson, isDropped: IsDropped): ProblemPerson {
  const { id: personId, absences, pins, kindLimits, rules } = person;
  const isGone = ({ startMinute, endMinute }: ProblemPerson['absences'][number]): boolean =>
    isDropped({ kind: 'absence', personId, startMinute, endMinute });
  const returned = absences
    .filter(isGone)
    .reduce((sum, absence) => sum + creditOf(person, absence), 0);
  const creditMinutes = Math.max(0, person.creditMinutes - returned);
  const minimum = person.minimumMinutes - (person.creditMinutes - creditMinutes);
  return {
    ...person,
    creditMinutes,
    minimumMinutes: isDropped({ kind: 'leastHours', personId }) ? 0 : Math.max(0, minimum),
    maximumMinutes: isDropped({ kind: 'mostHours', personId })
      ? Math.max(person.maximumMinutes, everyMinute(problem, person))
      : person.maximumMinutes,
    mayWorkNights: person.mayWorkNights || isDropped({ kind: 'noNights', personId }),
    absences: absences.filter((absence) => !isGone(absence)),
    pins: pins.filter(({ dayIndex }) => !isDropped({ kind: 'pin', personId, dayIndex })),
    kindLimits: kindLimits.filter(
      ({ kindId }) => !isDropped({ kind: 'kindLimit', personId, kindId }),
    ),
    rules: rules && loosenRules(rules, (limit) => isDropped({ kind: 'ownLimit', personId, limit })),
  };
}

/** More than anybody can work: the longest shift on every day, and the credit. */
export const everyMinute = ({ days, shifts }: Problem, { creditMinutes }: ProblemPerson): number =>
  creditMinutes + days.length * Math.max(0, ...shifts.map(({ paidMinutes }) => paidMinutes));

function loosenRules(rules: ProblemRules, isDropped: (limit: LimitName) => boolean): ProblemRules {
  const dropped = Object.entries(unlimited).filter(([name]) => isDropped(name as LimitName));
  return dropped.length === 0 ? rules : { ...rules, ...Object.fromEntries(dropped) };
}
