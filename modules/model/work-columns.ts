import type { Problem, ProblemPerson, ProblemShift } from '../problem';
import type { ModelBuilder } from './model-builder';
import { centsPerMinute, premiumPay } from './pay';
import { overlaps } from './time-slices';

/** One person on one shift in one post: 1 when so planned. */
export interface WorkColumn {
  readonly column: number;
  readonly personIndex: number;
  readonly shift: ProblemShift;
  readonly postSkillId: string;
}

/** All columns of one person, also by the day on which the shift starts. */
export interface PersonWork {
  readonly person: ProblemPerson;
  readonly personIndex: number;
  readonly columns: readonly WorkColumn[];
  readonly byDay: readonly (readonly WorkColumn[])[];
}

/** Why a person cannot be on a shift at all, whatever the rest of the roster is. */
export type Obstacle =
  | { readonly kind: 'absent'; readonly reason: string }
  | { readonly kind: 'no-nights' }
  | { readonly kind: 'no-skill' }
  | { readonly kind: 'rest-after-history' };

/**
 * The first thing that keeps a person off a shift: an absence that overlaps it, a contract without
 * Nights, no skill the shift kind takes, or too little rest after a shift before the period.
 */
export function findObstacle(
  problem: Problem,
  person: ProblemPerson,
  shift: ProblemShift,
): Obstacle | null {
  const absence = person.absences.find((stretch) => overlaps(stretch, shift));
  if (absence) return { kind: 'absent', reason: absence.reason };
  if (shift.isNight && !person.mayWorkNights) return { kind: 'no-nights' };
  if (allowedPosts(person, shift).length === 0) return { kind: 'no-skill' };
  const free = (endMinute: number) => endMinute + problem.rules.restMinutes;
  const isTired = person.history.some(({ endMinute }) => shift.startMinute < free(endMinute));
  return isTired ? { kind: 'rest-after-history' } : null;
}

/** Skills of the person that the shift kind takes, home skill first. */
const allowedPosts = (person: ProblemPerson, shift: ProblemShift): readonly string[] =>
  person.skillIds.filter((skill) => shift.postSkillIds?.includes(skill) ?? true);

/**
 * Columns work(person, shift, post), whole numbers 0 or 1. They cost the premiums of the shift and, for
 * people paid by hours, its ordinary pay. A column exists only where nothing stands in the way (`findObstacle`). Posts that no seated floor asks
 * for during the shift are left out when another post is asked for: they cost the same and cover less.
 */
export function addWorkColumns(builder: ModelBuilder, problem: Problem): PersonWork[] {
  const seatedSkills = problem.shifts.map((shift) => findSeatedSkills(problem, shift));
  return problem.people.map((person, personIndex) => {
    const columns = problem.shifts.flatMap((shift) => {
      if (findObstacle(problem, person, shift)) return [];
      const cost = premiumPay(problem, person, shift) + hourlyPay(person, shift);
      return usefulPosts(person, shift, seatedSkills[shift.index] ?? new Set()).map(
        (postSkillId) => {
          const skillIndex = problem.skills.findIndex(({ id }) => id === postSkillId);
          const column = builder.addColumn({
            name: `work(p${personIndex},s${shift.index},k${skillIndex})`,
            upper: 1,
            isInteger: true,
            costs: { cost },
          });
          return { column, personIndex, shift, postSkillId };
        },
      );
    });
    return { person, personIndex, columns, byDay: groupByDay(problem, columns) };
  });
}

const hourlyPay = (person: ProblemPerson, shift: ProblemShift): number =>
  person.paidBy === 'hours' ? centsPerMinute(person.payCentsPerHour) * shift.paidMinutes : 0;

function findSeatedSkills(problem: Problem, shift: ProblemShift): Set<string | null> {
  const asking = problem.floors.filter(
    (floor) => floor.counting === 'seated' && floor.people > 0 && overlaps(floor, shift),
  );
  return new Set(asking.map(({ skillId }) => skillId));
}

function usefulPosts(
  person: ProblemPerson,
  shift: ProblemShift,
  seatedSkills: ReadonlySet<string | null>,
): string[] {
  const allowed = allowedPosts(person, shift);
  const pinned = person.pins
    .filter(({ shiftIndex }) => shiftIndex === shift.index)
    .map(({ postSkillId }) => postSkillId);
  const asked = allowed.filter((skill) => seatedSkills.has(skill) || pinned.includes(skill));
  return asked.length > 0 ? asked : allowed.slice(0, 1);
}

function groupByDay(problem: Problem, columns: readonly WorkColumn[]): WorkColumn[][] {
  const byDay: WorkColumn[][] = problem.days.map(() => []);
  for (const work of columns) byDay[work.shift.dayIndex]?.push(work);
  return byDay;
}
