import { assertNever, formatDay, formatHours } from '../units';
import type { Problem, ProblemPerson } from './problem';
import type { ProblemRules } from './problem-rules';
import { dayOf, daysWords, windowWords } from './problem-words';
import type { LimitName, Requirement } from './requirement';

/** A requirement as one clause in the words of whoever entered it, e.g. `Vet Night on Thu 11 Feb needs 1`. */
export function describeRequirement(problem: Problem, requirement: Requirement): string {
  if ('personId' in requirement) return describePersonal(problem, requirement);
  switch (requirement.kind) {
    case 'floor':
      return describeFloor(problem, requirement);
    case 'ceiling':
      return describeCeiling(problem, requirement);
    case 'teamRule':
      return problem.teamRules.find(({ id }) => id === requirement.ruleId)?.name ?? 'a team rule';
    case 'limit':
      return limitWords(problem.rules, requirement.limit);
    default:
      return assertNever(requirement);
  }
}

type Personal = Extract<Requirement, { personId: string }>;

function describePersonal(problem: Problem, requirement: Personal): string {
  const person = problem.people.find(({ id }) => id === requirement.personId);
  if (!person) return 'a person who is not planned';
  const { name } = person;
  switch (requirement.kind) {
    case 'ownLimit':
      return `${name}: ${limitWords(person.rules ?? problem.rules, requirement.limit)}`;
    case 'leastHours':
      return `${name}'s contract of at least ${formatHours(person.minimumMinutes)} h`;
    case 'mostHours':
      return `${name}'s contract of at most ${formatHours(person.maximumMinutes)} h`;
    case 'noNights':
      return `${name} works no Nights`;
    case 'kindLimit': {
      const { kindId } = requirement;
      const kind = problem.shifts.find((shift) => shift.kindId === kindId)?.kindName ?? kindId;
      const most = Math.min(
        ...person.kindLimits.filter((one) => one.kindId === kindId).map((one) => one.most),
      );
      return `${name} works at most ${most} ${kind}`;
    }
    case 'absence':
      return `${name}'s ${absenceReason(person, requirement)} ${daysWords(problem, requirement)}`;
    case 'pin':
      return describePin(problem, person, requirement.dayIndex);
    default:
      return assertNever(requirement);
  }
}

function describeFloor(
  problem: Problem,
  { floorId, dayIndex }: Extract<Requirement, { kind: 'floor' }>,
): string {
  const pieces = problem.floors.filter(
    (floor) => floor.floorId === floorId && floor.dayIndex === dayIndex,
  );
  const [first] = pieces;
  if (!first) return 'a floor that is not asked for';
  const endMinute = Math.max(...pieces.map((piece) => piece.endMinute));
  const people = Math.max(...pieces.map((piece) => piece.people));
  const window = windowWords(problem, { ...first, endMinute });
  return `${skillName(problem, first.skillId)} ${window} on ${dayOf(problem, dayIndex)} needs ${people}`;
}

function describeCeiling(
  problem: Problem,
  { ceilingId, dayIndex }: Extract<Requirement, { kind: 'ceiling' }>,
): string {
  const ceiling = problem.ceilings.find(
    (one) => one.ceilingId === ceilingId && one.dayIndex === dayIndex,
  );
  if (!ceiling) return 'a ceiling that is not set';
  return `${skillName(problem, ceiling.skillId)} ${windowWords(problem, ceiling)} on ${dayOf(problem, dayIndex)} takes at most ${ceiling.people}`;
}

const skillName = ({ skills }: Problem, skillId: string | null): string =>
  skillId === null ? 'Anybody on' : (skills.find(({ id }) => id === skillId)?.name ?? skillId);

const absenceReason = (
  { absences }: ProblemPerson,
  { startMinute, endMinute }: { readonly startMinute: number; readonly endMinute: number },
): string => {
  const reason = absences.find(
    (one) => one.startMinute === startMinute && one.endMinute === endMinute,
  )?.reason;
  return reason ? reason.charAt(0).toLowerCase() + reason.slice(1) : 'absence';
};

function describePin(problem: Problem, person: ProblemPerson, dayIndex: number): string {
  const pin = person.pins.find((one) => one.dayIndex === dayIndex);
  const shift = problem.shifts.find(({ index }) => index === pin?.shiftIndex);
  const date = problem.days[dayIndex]?.date;
  const day = date === undefined ? '' : ` on ${formatDay(date)}`;
  return shift
    ? `${person.name} pinned to ${shift.kindName}${day}`
    : `${person.name} pinned off${day}`;
}

function limitWords(rules: ProblemRules, limit: LimitName): string {
  switch (limit) {
    case 'restMinutes':
      return `rest of ${formatHours(rules.restMinutes)} h`;
    case 'longestRunDays':
      return `at most ${counted(rules.longestRunDays, 'day')} in a row`;
    case 'longestRunNights':
      return `at most ${counted(rules.longestRunNights, 'Night')} in a row`;
    case 'nightsPerPeriod':
      return `at most ${counted(rules.nightsPerPeriod, 'Night')} in the period`;
    case 'weekendsPerPeriod':
      return `at most ${counted(rules.weekendsPerPeriod, 'weekend')} in the period`;
    case 'shortestRunDays':
      return `at least ${counted(rules.shortestRunDays, 'day')} in a row`;
    case 'shortestRunFreeDays':
      return `at least ${counted(rules.shortestRunFreeDays, 'day')} off in a row`;
    case 'kindsThatMayNotFollow':
      return 'shift kinds that may not follow each other';
    default:
      return assertNever(limit);
  }
}

const counted = (count: number | null, noun: string): string =>
  `${count ?? 0} ${noun}${count === 1 ? '' : 's'}`;
