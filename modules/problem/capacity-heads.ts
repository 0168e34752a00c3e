import type { CapacityLack } from './capacity';
import { listed, setsOf } from './capacity-words';
import { isBarred, isOver, isPostable } from './duty-bars';
import type { Problem, ProblemFloor, ProblemPerson } from './problem';
import { dayOf, windowWords } from './problem-words';
import type { Requirement } from './requirement';

/**
 * Stretches of time at which firm floors ask for more people than can be on duty then, by skill, absences
 * and Nights: seated floors of a set of skills together, every other floor alone. Hall's condition for heads
 * instead of hours (P. Hall, J. London Math. Soc. 10, 1935, 26-30). One lack for each set of floors, smaller
 * sets of skills first.
 */
export function headLacks(problem: Problem): CapacityLack[] {
  const firm = problem.floors.filter(
    ({ priceCentsPerHour, people }) => priceCentsPerHour === null && people > 0,
  );
  const seated = firm.filter(({ counting, skillId }) => counting === 'seated' && skillId !== null);
  const alone = firm
    .filter((floor) => !seated.includes(floor))
    .flatMap((floor) => lackOf(problem, [floor], floor, skillsOf(problem, floor)) ?? []);
  return [
    ...stretchesOf(seated).flatMap((stretch) => seatedLacks(problem, seated, stretch)),
    ...alone,
  ];
}

interface Stretch {
  readonly startMinute: number;
  readonly endMinute: number;
}

const skillsOf = ({ skills }: Problem, { skillId }: ProblemFloor): string[] =>
  skillId === null ? skills.map(({ id }) => id) : [skillId];

/** The time of the floors, cut wherever one of them begins or ends. */
function stretchesOf(floors: readonly ProblemFloor[]): Stretch[] {
  const edges = floors.flatMap(({ startMinute, endMinute }) => [startMinute, endMinute]);
  const sorted = [...new Set(edges)].sort((one, other) => one - other);
  return sorted
    .slice(1)
    .map((endMinute, index) => ({ startMinute: sorted[index] ?? endMinute, endMinute }));
}

function seatedLacks(
  problem: Problem,
  seated: readonly ProblemFloor[],
  stretch: Stretch,
): CapacityLack[] {
  const asking = seated.filter((floor) => isOver(floor, stretch));
  const skills = problem.skills
    .map(({ id }) => id)
    .filter((id) => asking.some(({ skillId }) => skillId === id));
  const lacks: CapacityLack[] = [];
  for (const skillIds of setsOf(skills)) {
    if (lacks.some((lack) => lack.skillIds.every((id) => skillIds.includes(id)))) continue;
    const floors = asking.filter(({ skillId }) => skillId !== null && skillIds.includes(skillId));
    const lack = lackOf(problem, floors, stretch, skillIds);
    if (lack) lacks.push(lack);
  }
  return lacks;
}

function lackOf(
  problem: Problem,
  floors: readonly ProblemFloor[],
  stretch: Stretch,
  skillIds: readonly string[],
): CapacityLack | null {
  const needed = floors.reduce((sum, { people }) => sum + people, 0);
  const shifts = problem.shifts.filter((shift) => isOver(shift, stretch));
  const holders = problem.people.filter((person) =>
    shifts.some((shift) => isPostable(person, shift, skillIds)),
  );
  const able = holders.filter((person) =>
    shifts.some((shift) => isPostable(person, shift, skillIds) && !isBarred(person, shift)),
  );
  if (needed <= able.length) return null;
  const minutes = stretch.endMinute - stretch.startMinute;
  const days = floors.map(({ dayIndex }) => dayIndex);
  return {
    sentence: sentenceOf(problem, floors, stretch, [needed, able.length]),
    skillIds,
    firstDay: Math.min(...days),
    lastDay: Math.max(...days),
    neededMinutes: needed * minutes,
    mostMinutes: able.length * minutes,
    requirements: [
      ...floors.map(({ floorId, dayIndex }): Requirement => ({ kind: 'floor', floorId, dayIndex })),
      ...holders
        .filter((person) => !able.includes(person))
        .flatMap((person) => barsOf(person, stretch)),
    ],
  };
}

function barsOf({ id: personId, absences, mayWorkNights }: ProblemPerson, stretch: Stretch) {
  const away = absences
    .filter((absence) => isOver(absence, stretch))
    .map(({ startMinute, endMinute }): Requirement => {
      return { kind: 'absence', personId, startMinute, endMinute };
    });
  return mayWorkNights ? away : [...away, { kind: 'noNights', personId } as const];
}

function sentenceOf(
  problem: Problem,
  floors: readonly ProblemFloor[],
  stretch: Stretch,
  [needed, able]: readonly [number, number],
): string {
  const nameOf = (skillId: string | null): string =>
    problem.skills.find(({ id }) => id === skillId)?.name ?? 'general';
  const names = [...new Set(floors.map(({ skillId }) => nameOf(skillId)))];
  const day = dayOf(problem, floors[0]?.dayIndex ?? 0);
  const who = `${able} can be there at most`;
  return `On ${day}, ${windowWords(problem, stretch)}, the ${listed(names, 'and')} floors need ${needed} ${needed === 1 ? 'person' : 'people'}; ${who}.`;
}
