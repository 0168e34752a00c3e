import fc from 'fast-check';
import { blendObjective, completeValues, objectiveOf, type WorkColumn } from '@/modules/model';
import type { PlannedRoster, Problem, ProblemPerson } from '@/modules/problem';
import { anneal, layAll } from '@/modules/solver/lines/anneal';
import { seededRandom } from '@/modules/solver/lines/random';
import { dayOff, RosterLines } from '@/modules/solver/lines/roster-lines';
import { findClashes, type Ground, prepareGround } from '@/modules/solver/search/first-roster';
import { temperatures } from '@/modules/solver/search/temperatures';
import { smallProblem } from '@/tests/support/random-problems';

/** Pins, leave and limits of kinds that are too large for the nets to count. */
const more: fc.Arbitrary<Partial<ProblemPerson>> = fc.oneof(
  { weight: 3, arbitrary: fc.constant({}) },
  fc.record({ day: fc.nat(3), kind: fc.constantFrom(null, 0, 1, 2) }).map(({ day, kind }) => ({
    pins: [{ dayIndex: day, shiftIndex: kind === null ? null : 3 * day + kind, postSkillId: null }],
  })),
  fc.nat(3).map((day) => ({
    absences: [{ startMinute: day * 1440, endMinute: day * 1440 + 1440, reason: 'leave' }],
  })),
  fc.constant({
    kindLimits: ['Early', 'Late', 'Night'].map((kindId) => ({ kindId, most: 3 })),
  }),
);

/** Small problems with everything that a problem can say in them. */
export const anyProblem: fc.Arbitrary<Problem> = fc
  .tuple(smallProblem, fc.array(more, { minLength: 3, maxLength: 3 }))
  .map(([problem, extras]) => ({
    ...problem,
    people: problem.people.map((person, index) => ({ ...person, ...extras[index] })),
  }));

/** The problem without what only the compact model can say: budgets and the spread of wishes not granted. */
export const withoutWideRows = (problem: Problem): Problem => ({
  ...problem,
  teamRules: problem.teamRules.filter(({ kind }) => kind !== 'budget'),
  fairness: problem.fairness.filter(({ measure }) => measure !== 'refusedWishes'),
});

/**
 * A ground on which everybody's line is laid; null when somebody has no lawful line or none is found. A poor
 * one is laid with a view to cover that nobody asked for.
 */
export function layGround(problem: Problem, seed: number, isPoor = false): Ground | null {
  const ground = prepareGround(problem);
  if (findClashes(ground).length > 0) return null;
  const random = seededRandom(seed);
  const { count } = ground.space.rows;
  const worth = isPoor ? Float64Array.from({ length: count }, () => (random() - 0.5) * 1e12) : null;
  const left = layAll(ground.lines, ground.refill, { random, worth });
  return left.length === 0 ? ground : null;
}

/** Anneals for so many batches of moves; `look` is called after each, while the search is under way. */
export function annealFor(
  ground: Ground,
  batches: number,
  seed: number,
  look: () => void = () => undefined,
) {
  let done = -1;
  return anneal(ground.lines, ground.refill, {
    progress: () => {
      done += 1;
      if (done > 0) look();
      return done / batches;
    },
    ...temperatures(ground),
    random: seededRandom(seed),
    worth: null,
    onBest: look,
  });
}

/** The lines as a point of the model with only the shifts in it. */
export function valuesOf({ model, lines }: Ground): Float64Array {
  const values = new Float64Array(model.linear.columnNames.length);
  for (const column of lines.cells) if (column !== dayOff) values[column] = 1;
  return values;
}

/** The lines as a roster, read off the work columns. */
export function rosterOf({ model, lines }: Ground): PlannedRoster {
  const works = new Map<number, WorkColumn>(
    model.works.flatMap(({ columns }) => columns.map((work) => [work.column, work] as const)),
  );
  return Array.from(lines.cells).flatMap((column, cell) => {
    const work = works.get(column);
    const person = model.problem.people[Math.floor(cell / lines.days)];
    return work && person
      ? [{ personId: person.id, shiftIndex: work.shift.index, postSkillId: work.postSkillId }]
      : [];
  });
}

/** The blend of the model at the lines, without what only the model can say (see `withoutWideRows`). */
export function blendAt(ground: Ground): number {
  const { costs, offset } = objectiveOf(ground.model.linear, blendObjective);
  const whole = completeValues(ground.model, valuesOf(ground));
  for (const column of leftToTheModel(ground)) whole[column] = 0;
  return costs.reduce((sum, cost, column) => sum + cost * (whole[column] ?? 0), offset);
}

function leftToTheModel({ model, space }: Ground): number[] {
  const known = new Set(space.rows.modelRows);
  const broken = model.teamRows
    .filter(({ row }) => !known.has(row))
    .flatMap(({ underColumn, overColumn }) => [underColumn, overColumn])
    .filter((column) => column !== null);
  const spreads = model.spreads
    .filter(({ termIndex }) => !space.spreads.some((spread) => spread.termIndex === termIndex))
    .flatMap(({ mostColumn, leastColumn }) => [mostColumn, leastColumn]);
  return [...broken, ...spreads];
}

/** The same lines in another object, reckoned from nothing. */
export function recounted({ space, lines }: Ground): RosterLines {
  const fresh = new RosterLines(space);
  fresh.cells.set(lines.cells);
  fresh.isIn.set(lines.isIn);
  for (let person = 0; person < fresh.people; person += 1) {
    if (!fresh.trace(person)) throw new Error(`The line of person ${person} is not lawful.`);
  }
  fresh.recount();
  return fresh;
}

/** Room for floating-point sums: levels weigh up to a million million cents. */
export const roomFor = (...amounts: readonly number[]): number =>
  amounts.reduce((room, amount) => Math.max(room, Math.abs(amount) * 1e-11), 1e-6);
