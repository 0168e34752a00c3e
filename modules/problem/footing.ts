import { overtimeBound } from './overtime-bound';
import type { Problem, ProblemFloor, ProblemPerson, ProblemShift } from './problem';

/** Hours the firm floors take against hours the contracts give: necessary, not sufficient. */
export interface Footing {
  /** Least paid person-minutes that hold the firm seated floors. */
  readonly neededMinutes: number;
  /** Contract minutes less leave credit of everybody. */
  readonly availableMinutes: number;
  /** In the order of the skills; floors for anybody come last, with what they need beyond the others. */
  readonly bySkill: readonly {
    readonly skillId: string | null;
    readonly name: string;
    readonly neededMinutes: number;
    /** Available minutes of the people whose home skill it is. */
    readonly ownMinutes: number;
  }[];
  /** Overtime that no roster without firm shortage can do without. */
  readonly overtimeNeededMinutes: number;
  /** What is missing even with all the overtime that contracts allow: above 0 no roster holds the floors. */
  readonly lackMinutes: number;
}

/**
 * Sums up one period before any roster is made. Floors ask for people on duty, contracts count paid
 * time: a window is taken at the smallest paid share of the shifts that can serve it, so that unpaid
 * breaks never make the need look larger than it is. Wished and shared floors are left out, surplus
 * that whole shifts force is not seen: the truth may be worse, never better.
 */
export function footingOf(problem: Problem): Footing {
  const firm = problem.floors.filter(
    (floor) => floor.counting === 'seated' && floor.priceCentsPerHour === null,
  );
  const needs = problem.skills.map(({ id, name }) => ({
    skillId: id,
    name,
    neededMinutes: neededMinutes(
      problem.shifts,
      firm.filter(({ skillId }) => skillId === id),
    ),
    ownMinutes: sumMinutes(problem.people.filter((person) => person.skillIds[0] === id)),
  }));
  const anybody = firm.some(({ skillId }) => skillId === null)
    ? [
        {
          skillId: null,
          name: 'Any skill',
          neededMinutes: neededBeyond(problem.shifts, firm),
          ownMinutes: 0,
        },
      ]
    : [];
  const bySkill = [...needs, ...anybody];
  const neededInAll = bySkill.reduce((sum, line) => sum + line.neededMinutes, 0);
  const lackAt = (minutesOf: (person: ProblemPerson) => number): number =>
    overtimeBound(
      needs,
      neededInAll,
      problem.people.map((person) => ({
        skillIds: person.skillIds,
        minutes: minutesOf(person),
      })),
    );
  return {
    neededMinutes: neededInAll,
    availableMinutes: sumMinutes(problem.people),
    bySkill,
    overtimeNeededMinutes: lackAt(availableMinutes),
    lackMinutes: lackAt(mostMinutes),
  };
}

/** Minutes a person can work within the contract. */
const availableMinutes = (person: ProblemPerson): number =>
  Math.max(0, person.contractMinutes - person.creditMinutes);

/** Minutes a person can work with all the overtime that the contract allows. */
const mostMinutes = (person: ProblemPerson): number =>
  Math.max(0, person.maximumMinutes - person.creditMinutes);

const sumMinutes = (people: readonly ProblemPerson[]): number =>
  people.reduce((sum, person) => sum + availableMinutes(person), 0);

const neededMinutes = (shifts: readonly ProblemShift[], floors: readonly ProblemFloor[]): number =>
  floors.reduce(
    (sum, floor) => sum + paidNeed(shifts, floor, floor.startMinute, floor.endMinute, floor.people),
    0,
  );

/** What floors for anybody ask for beyond the floors of skills at the same time: those people count too. */
function neededBeyond(shifts: readonly ProblemShift[], firm: readonly ProblemFloor[]): number {
  const edges = [...new Set(firm.flatMap((floor) => [floor.startMinute, floor.endMinute]))].sort(
    (one, other) => one - other,
  );
  return edges.reduce((sum, from, position) => {
    const to = edges[position + 1] ?? from;
    const asking = firm.filter((floor) => floor.startMinute <= from && from < floor.endMinute);
    const anybody = asking.filter(({ skillId }) => skillId === null);
    const [floor] = anybody;
    if (!floor) return sum;
    const extra = 2 * peopleOf(anybody) - peopleOf(asking);
    return sum + paidNeed(shifts, floor, from, to, Math.max(0, extra));
  }, 0);
}

const peopleOf = (floors: readonly ProblemFloor[]): number =>
  floors.reduce((sum, { people }) => sum + people, 0);

/** Person-minutes of a stretch at the smallest paid share among the shifts that can serve it. */
function paidNeed(
  shifts: readonly ProblemShift[],
  { skillId }: ProblemFloor,
  from: number,
  to: number,
  people: number,
): number {
  const serving = shifts.filter(
    (shift) =>
      shift.startMinute < to &&
      from < shift.endMinute &&
      (skillId === null || !shift.postSkillIds || shift.postSkillIds.includes(skillId)),
  );
  const share = Math.min(
    1,
    ...serving.map((shift) => shift.paidMinutes / (shift.endMinute - shift.startMinute)),
  );
  return Math.floor((to - from) * people * share);
}
