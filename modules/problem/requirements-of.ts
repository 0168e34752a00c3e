import type { Problem, ProblemPerson } from './problem';
import type { ProblemRules } from './problem-rules';
import { limitNames, type Requirement, requirementKey } from './requirement';

/**
 * Everything in a problem that may stand in the way of something else, without repetition: floors and
 * ceilings by day, team rules, limits, then what binds each person. What is switched off is left out.
 */
export function requirementsOf(problem: Problem): Requirement[] {
  const { floors, ceilings, teamRules, people, rules } = problem;
  const isTeamBound = people.some((person) => person.rules === null);
  return unique([
    ...floors
      .filter((floor) => floor.priceCentsPerHour === null && floor.people > 0)
      .map(({ floorId, dayIndex }): Requirement => ({ kind: 'floor', floorId, dayIndex })),
    ...ceilings
      .filter(({ priceCentsPerHour }) => priceCentsPerHour === null)
      .map(({ ceilingId, dayIndex }): Requirement => ({ kind: 'ceiling', ceilingId, dayIndex })),
    ...teamRules
      .filter(({ priceCents }) => priceCents === null)
      .map(({ id }): Requirement => ({ kind: 'teamRule', ruleId: id })),
    ...(isTeamBound ? limitsIn(rules).map((limit) => ({ kind: 'limit', limit }) as const) : []),
    ...people.flatMap(requirementsOfPerson),
  ]);
}

function requirementsOfPerson(person: ProblemPerson): Requirement[] {
  const { id: personId, rules, minimumMinutes, creditMinutes, mayWorkNights } = person;
  return [
    ...(rules ? limitsIn(rules) : []).map(
      (limit) => ({ kind: 'ownLimit', personId, limit }) as const,
    ),
    ...(minimumMinutes > creditMinutes ? [{ kind: 'leastHours', personId } as const] : []),
    { kind: 'mostHours', personId },
    ...(mayWorkNights ? [] : [{ kind: 'noNights', personId } as const]),
    ...person.kindLimits.map(({ kindId }) => ({ kind: 'kindLimit', personId, kindId }) as const),
    ...person.absences.map(
      ({ startMinute, endMinute }) =>
        ({ kind: 'absence', personId, startMinute, endMinute }) as const,
    ),
    ...person.pins.map(({ dayIndex }) => ({ kind: 'pin', personId, dayIndex }) as const),
  ];
}

const limitsIn = (rules: ProblemRules) =>
  limitNames.filter((name) => {
    const limit = rules[name];
    return Array.isArray(limit) ? limit.length > 0 : limit !== null && limit !== 0;
  });

const unique = (requirements: readonly Requirement[]): Requirement[] => [
  ...new Map(requirements.map((one) => [requirementKey(one), one])).values(),
];
