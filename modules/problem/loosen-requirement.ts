import type { Problem, ProblemPerson } from './problem';
import type { ProblemRules } from './problem-rules';
import type { LimitName, Requirement } from './requirement';
import { without } from './without-requirements';

/**
 * The problem with one requirement loosened by its least step: a floor asks for one person less, a
 * ceiling, a count or a run takes one more, rest is an hour shorter, hours give one longest shift more
 * or less. What has no steps (an absence, a pin, no Nights, a team rule, kinds that may not follow) is
 * dropped.
 */
export function loosen(problem: Problem, requirement: Requirement): Problem {
  switch (requirement.kind) {
    case 'floor':
      return { ...problem, floors: lowerFloor(problem, requirement) };
    case 'ceiling':
      return {
        ...problem,
        ceilings: problem.ceilings.map((ceiling) =>
          ceiling.ceilingId === requirement.ceilingId && ceiling.dayIndex === requirement.dayIndex
            ? { ...ceiling, people: ceiling.people + 1 }
            : ceiling,
        ),
      };
    case 'limit':
      return { ...problem, rules: stepOf(problem.rules, requirement.limit) };
    case 'ownLimit':
      return change(problem, requirement.personId, (person) => ({
        rules: person.rules && stepOf(person.rules, requirement.limit),
      }));
    case 'leastHours':
      return change(problem, requirement.personId, (person) => ({
        minimumMinutes: Math.max(0, person.minimumMinutes - longestShift(problem)),
      }));
    case 'mostHours':
      return change(problem, requirement.personId, (person) => ({
        maximumMinutes: person.maximumMinutes + longestShift(problem),
      }));
    case 'kindLimit':
      return change(problem, requirement.personId, (person) => ({
        kindLimits: person.kindLimits.map((limit) =>
          limit.kindId === requirement.kindId ? { ...limit, most: limit.most + 1 } : limit,
        ),
      }));
    default:
      return without(problem, [requirement]);
  }
}

const lowerFloor = (
  { floors }: Problem,
  { floorId, dayIndex }: Extract<Requirement, { kind: 'floor' }>,
): Problem['floors'] =>
  floors.map((floor) =>
    floor.floorId === floorId && floor.dayIndex === dayIndex && floor.priceCentsPerHour === null
      ? { ...floor, people: Math.max(0, floor.people - 1) }
      : floor,
  );

const change = (
  problem: Problem,
  personId: string,
  part: (person: ProblemPerson) => Partial<ProblemPerson>,
): Problem => ({
  ...problem,
  people: problem.people.map((person) =>
    person.id === personId ? { ...person, ...part(person) } : person,
  ),
});

const longestShift = ({ shifts }: Problem): number =>
  Math.max(0, ...shifts.map(({ paidMinutes }) => paidMinutes));

function stepOf(rules: ProblemRules, limit: LimitName): ProblemRules {
  switch (limit) {
    case 'restMinutes':
      return { ...rules, restMinutes: Math.max(0, rules.restMinutes - 60) };
    case 'shortestRunDays':
    case 'shortestRunFreeDays': {
      const least = rules[limit];
      return { ...rules, [limit]: least === null || least <= 1 ? null : least - 1 };
    }
    case 'kindsThatMayNotFollow':
      return { ...rules, kindsThatMayNotFollow: [] };
    default: {
      const most = rules[limit];
      return { ...rules, [limit]: most === null ? null : most + 1 };
    }
  }
}
