import { buildRosterModel } from '@/modules/model';
import { brokenFamilies } from '@/tests/support/broken-rows';
import { assign, buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';

/** Shifts of one person by day of the period and kind. */
export type Plan = readonly (readonly [dayIndex: number, kindId: string])[];

/** Families of rows that this plan of the only person breaks. */
export function broken(sketch: ProblemSketch, plan: Plan): string[] {
  const problem = buildProblem(sketch);
  return brokenFamilies(
    buildRosterModel(problem),
    plan.map(([day, kind]) => assign(problem, 'ione', day, kind)),
  );
}

/** The same kind on each day from one to another, both included. */
export const days = (from: number, to: number, kind = 'Early'): Plan =>
  Array.from({ length: to - from + 1 }, (_, index) => [from + index, kind] as const);

/** A shift before the period, with a negative day index, or after it. */
export const past = (
  dayIndex: number,
  startMinute: number,
  endMinute: number,
  isNight = false,
) => ({
  dayIndex,
  startMinute: dayIndex * 1440 + startMinute,
  endMinute: dayIndex * 1440 + endMinute,
  isNight,
});
