import { formatHours, mondayOf } from '../units';
import { headLacks } from './capacity-heads';
import { dutyNeeded, mostDuty, needWindow } from './capacity-supply';
import { listed, setsOf } from './capacity-words';
import type { Problem, ProblemFloor } from './problem';
import { shortDay } from './problem-words';
import { type Requirement, requirementKey } from './requirement';

/** A proof that floors cannot be held, by counting hours or heads alone. */
export interface CapacityLack {
  /** One sentence that says it in hours or people. */
  readonly sentence: string;
  readonly skillIds: readonly string[];
  readonly firstDay: number;
  readonly lastDay: number;
  /** Person-minutes the floors need and the most that people can give; the difference is missing. */
  readonly neededMinutes: number;
  readonly mostMinutes: number;
  /** The floors that are added up, and what keeps their people from giving more. */
  readonly requirements: readonly Requirement[];
}

/**
 * Times at which firm floors need more people, and weeks (Monday to Sunday) or the whole period in which
 * seated firm floors of some skills need more person-hours than can be there by skill, leave, contract,
 * Nights and runs of days. A sum that lacks no more than those told before it, of parts of its floors, is
 * left out. Hall's condition (P. Hall, J. London Math. Soc. 10, 1935, 26-30): necessary, so that each lack
 * is a proof; not sufficient, so that none proves nothing.
 */
export function capacityLacks(problem: Problem): CapacityLack[] {
  const weeks = weeksOf(problem);
  const period: Days = [0, problem.days.length - 1];
  const hours = (weeks.length > 1 ? [...weeks, period] : weeks).flatMap((days) =>
    lacksIn(problem, days),
  );
  const told: CapacityLack[] = [];
  for (const lack of [...headLacks(problem), ...hours]) {
    const within = told.filter(({ requirements }) => isWithin(requirements, lack.requirements));
    if (lackOf(lack) > sum(within.map(lackOf))) told.push(lack);
  }
  return told;
}

type Days = readonly [first: number, last: number];

function lacksIn(problem: Problem, [firstDay, lastDay]: Days): CapacityLack[] {
  const asking = problem.floors.filter(
    (floor) =>
      floor.counting === 'seated' &&
      floor.priceCentsPerHour === null &&
      floor.skillId !== null &&
      floor.people > 0 &&
      floor.dayIndex >= firstDay &&
      floor.dayIndex <= lastDay,
  );
  const skills = problem.skills
    .map(({ id }) => id)
    .filter((id) => asking.some((floor) => floor.skillId === id));
  const lacks: CapacityLack[] = [];
  for (const skillIds of setsOf(skills)) {
    if (lacks.some((lack) => lack.skillIds.every((id) => skillIds.includes(id)))) continue;
    const floors = asking.filter(({ skillId }) => skillId !== null && skillIds.includes(skillId));
    const lack = weigh(problem, skillIds, floors, [firstDay, lastDay]);
    if (lack) lacks.push(lack);
  }
  return lacks;
}

function weigh(
  problem: Problem,
  skillIds: readonly string[],
  floors: readonly ProblemFloor[],
  [firstDay, lastDay]: Days,
): CapacityLack | null {
  const holders = problem.people.filter((person) =>
    person.skillIds.some((id) => skillIds.includes(id)),
  );
  const window = needWindow(problem, skillIds, floors, [firstDay, lastDay]);
  const duties = holders.map((person) => mostDuty(problem, person, window));
  const neededMinutes = dutyNeeded(floors);
  const mostMinutes = sum(duties.map(({ minutes }) => minutes));
  if (neededMinutes <= mostMinutes) return null;
  const requirements = [
    ...floors.map(({ floorId, dayIndex }): Requirement => ({ kind: 'floor', floorId, dayIndex })),
    ...duties.flatMap(({ limitedBy }) => limitedBy),
  ];
  return {
    sentence: sentenceOf(problem, skillIds, [firstDay, lastDay], neededMinutes, mostMinutes),
    skillIds,
    firstDay,
    lastDay,
    neededMinutes,
    mostMinutes,
    requirements: [...new Map(requirements.map((one) => [requirementKey(one), one])).values()],
  };
}

function sentenceOf(
  problem: Problem,
  skillIds: readonly string[],
  [first, last]: Days,
  needed: number,
  most: number,
): string {
  const names = skillIds.map((id) => problem.skills.find((skill) => skill.id === id)?.name ?? id);
  const day = (index: number): string => shortDay(problem.days[index]?.date ?? '');
  const isWeek = last - first < 7;
  const when = isWeek ? `In the week of ${day(first)}` : `From ${day(first)} to ${day(last)}`;
  return `${when} the ${listed(names, 'and')} floors need ${formatHours(needed)} h; people who hold ${listed(names, 'or')} can give ${formatHours(most)} h at most.`;
}

/** First and last day of each week that the period touches. */
function weeksOf({ days }: Problem): Days[] {
  const mondays = days.map(({ date }) => mondayOf(date));
  return [...new Set(mondays)].map((monday) => [
    mondays.indexOf(monday),
    mondays.lastIndexOf(monday),
  ]);
}

const lackOf = ({ neededMinutes, mostMinutes }: CapacityLack): number =>
  neededMinutes - mostMinutes;
/** Whether all floors of one list are in the other. */
function isWithin(part: readonly Requirement[], whole: readonly Requirement[]): boolean {
  const keys = new Set(whole.map(requirementKey));
  return part.every((one) => one.kind !== 'floor' || keys.has(requirementKey(one)));
}

const sum = (amounts: readonly number[]): number =>
  amounts.reduce((total, amount) => total + amount, 0);
