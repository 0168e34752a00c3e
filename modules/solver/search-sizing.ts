import { buildSizingModel, readSizing, relaxed, type SizingModel, withRowBounds } from '../model';
import type { SizingProblem } from '../problem';
import type { LinearSolution } from './linear-outcome';
import type { LinearOptions, LinearSolver } from './linear-solver';
import type { SizingOutcome } from './roster-outcome';

/** Least shortage counts whole person-minutes: a bound less than one below it proves it. */
const wholeMinuteGap = 0.9;
/** People and cents are whole. */
const wholeUnitGap = 0.9;
/** Solver bounds are trusted to this much of a unit. */
const boundTolerance = 1e-6;

interface Answer {
  readonly solution: LinearSolution;
  readonly bound: number;
  readonly isProven: boolean;
}

/**
 * Sizes a team: the least shortage the limits on people allow, then the fewest people or the least pay
 * with it, in whole people. The linear relaxation of stage two gives the bound and the floor prices.
 */
export function searchSizing(
  solve: LinearSolver,
  problem: SizingProblem,
  options: { readonly limitSeconds: number; readonly isStopRequested: () => boolean },
  clock: () => number,
): SizingOutcome {
  const model = buildSizingModel(problem);
  const endsAt = clock() + options.limitSeconds * 1000;
  const given = (): LinearOptions => ({
    limitSeconds: (endsAt - clock()) / 1000,
    shouldStop: options.isStopRequested,
  });
  const ended = (): SizingOutcome => ({
    kind: options.isStopRequested() ? 'stopped' : 'out-of-time',
  });

  const shortage = { ...given(), absoluteGap: wholeMinuteGap };
  const stageOne = answerOf(solve, model, 'shortage', shortage);
  if (!stageOne) return ended();
  const least = Math.round(stageOne.solution.objective);
  const linear = withRowBounds(model.linear, model.shortageRow, Number.NEGATIVE_INFINITY, least);
  const relaxation = solve(relaxed(linear), 'size', given());
  if (relaxation.kind !== 'optimal') return ended();
  const start = stageOne.solution.values;
  const stageTwo = answerOf(solve, { ...model, linear }, 'size', {
    ...given(),
    absoluteGap: wholeUnitGap,
    start,
  });
  return {
    kind: 'answered',
    answer: readSizing(model, {
      values: stageTwo?.solution.values ?? start,
      rowDuals: relaxation.duals?.rowDuals ?? null,
      linearBound: relaxation.bound,
      provenBound: Math.ceil((stageTwo?.bound ?? relaxation.bound) - boundTolerance),
      isProven: stageOne.isProven && (stageTwo?.isProven ?? false),
    }),
  };
}

/** The best solution found, or null when there was no time for any. Stage one always has one. */
function answerOf(
  solve: LinearSolver,
  model: SizingModel,
  objective: string,
  options: LinearOptions,
): Answer | null {
  const outcome = solve(model.linear, objective, options);
  switch (outcome.kind) {
    case 'optimal':
      return { solution: outcome.solution, bound: outcome.bound, isProven: true };
    case 'good-enough':
      return { solution: outcome.solution, bound: outcome.bound, isProven: false };
    case 'out-of-time':
    case 'interrupted':
      return outcome.solution
        ? { solution: outcome.solution, bound: outcome.bound, isProven: false }
        : null;
    default:
      throw new Error(`A sizing always has a solution, but the solver says ${outcome.kind}.`);
  }
}
