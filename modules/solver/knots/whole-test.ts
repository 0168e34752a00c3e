import { buildRosterModel, levelSlacks, withRowBounds } from '../../model';
import { type Problem, type Requirement, without } from '../../problem';
import type { AnalysisTools } from '../analysis-tools';

/** Whether some requirements can be held together; unknown: the time was over. */
export type Holdable = 'yes' | 'no' | 'unknown';

/**
 * Tests in whole shifts whether everything holds in a problem's firm part once `dropped` does not bind. This
 * solves the problem itself and shares nothing with the relaxation of the knots, so that it verifies them.
 */
export function isHoldable(
  { solve, isStopRequested }: Pick<AnalysisTools, 'solve' | 'isStopRequested'>,
  firm: Problem,
  dropped: readonly Requirement[],
  limitSeconds: number,
): Holdable {
  if (limitSeconds <= 0) return 'unknown';
  const model = buildRosterModel(without(firm, dropped));
  const slacks = levelSlacks(model);
  const held = model.levels.reduce(
    (linear, { row }, level) =>
      withRowBounds(linear, row, Number.NEGATIVE_INFINITY, slacks[level] ?? 0),
    model.linear,
  );
  const costs = new Float64Array(held.columnNames.length);
  const objectives = { any: { sense: 'minimise', offset: 0, costs } } as const;
  const outcome = solve({ ...held, objectives }, 'any', {
    limitSeconds,
    shouldStop: isStopRequested,
  });
  switch (outcome.kind) {
    case 'optimal':
    case 'good-enough':
      return 'yes';
    case 'infeasible':
      return 'no';
    case 'out-of-time':
    case 'interrupted':
      return outcome.solution ? 'yes' : 'unknown';
    default:
      throw new Error(`A test of requirements ended as ${outcome.kind}.`);
  }
}
