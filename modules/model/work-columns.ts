import { type Problem, type ProblemPerson, type ProblemShift, rulesOf } from '../problem';
import type { ModelBuilder } from './model-builder';
import { shiftPay } from './pay';
import { overlaps } from './time-slices';
import { wishCostOn } from './wishes';

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
  | { readonly kind: 'kind-limit' }
  | { readonly kind: 'rest-after-history' }
  | { readonly kind: 'rest-before-following' };

/**
 * The first thing that keeps a person off a shift: an absence that overlaps it, a contract without
 * Nights, no skill the shift kind takes, a limit of none of its kind, or too little rest after a shift
 * before the period or before one that is published after it.
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
  const isBarred = person.kindLimits.some(
    ({ kindId, most }) => most === 0 && kindId === shift.kindId,
  );
  if (isBarred) return { kind: 'kind-limit' };
  const { restMinutes } = rulesOf(problem, person);
  const isTired = person.history.some((past) => shift.startMinute < past.endMinute + restMinutes);
  if (isTired) return { kind: 'rest-after-history' };
  const isTooLate = person.following.some(
    (next) => next.startMinute < shift.endMinute + restMinutes,
  );
  return isTooLate ? { kind: 'rest-before-following' } : null;
}

/** Skills of the person that the shift kind takes, home skill first. */
const allowedPosts = (person: ProblemPerson, shift: ProblemShift): readonly string[] =>
  person.skillIds.filter((skill) => shift.postSkillIds?.includes(skill) ?? true);

/**
 * Columns work(person, shift, post), whole numbers 0 or 1. They cost the pay of the shift (`shiftPay`) and
 * the wishes it refuses, less those it grants. A column exists only where nothing stands in the way
 * (`findObstacle`). Posts that no seated floor asks for during the shift are left out when another post is
 * asked for: they cost the same and cover less. Seated ceilings make every post worth having.
 */
export function addWorkColumns(builder: ModelBuilder, problem: Problem): PersonWork[] {
  const asked = problem.shifts.map((shift) => findSeatedSkills(problem, shift));
  const hasCeiling = problem.shifts.map((shift) => hasSeatedCeiling(problem, shift));
  const skillIndex = new Map(problem.skills.map(({ id }, index) => [id, index]));
  return problem.people.map((person, personIndex) => {
    const columns = problem.shifts.flatMap((shift) => {
      if (findObstacle(problem, person, shift)) return [];
      const cost = shiftPay(problem, person, shift) + wishCostOn(person, shift);
      const posts = hasCeiling[shift.index]
        ? allowedPosts(person, shift)
        : usefulPosts(person, shift, asked[shift.index] ?? new Set());
      return posts.map((postSkillId) => {
        const column = builder.addColumn({
          name: `work(p${personIndex},s${shift.index},k${skillIndex.get(postSkillId)})`,
          upper: 1,
          isInteger: true,
          costs: { cost },
        });
        return { column, personIndex, shift, postSkillId };
      });
    });
    return { person, personIndex, columns, byDay: groupByDay(problem, columns) };
  });
}

function findSeatedSkills(problem: Problem, shift: ProblemShift): Set<string | null> {
  const asking = problem.floors.filter(
    (floor) => floor.counting === 'seated' && floor.people > 0 && overlaps(floor, shift),
  );
  return new Set(asking.map(({ skillId }) => skillId));
}

const hasSeatedCeiling = (problem: Problem, shift: ProblemShift): boolean =>
  problem.ceilings.some(
    (ceiling) =>
      ceiling.counting === 'seated' && ceiling.skillId !== null && overlaps(ceiling, shift),
  );

function usefulPosts(
  person: ProblemPerson,
  shift: ProblemShift,
  seatedSkills: ReadonlySet<string | null>,
): readonly string[] {
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
