import type { LinearSolver } from '../linear-solver';
import type { ColumnGenerationResult } from '../lines/column-generation';
import type { Pattern } from '../lines/pattern-master';
import type { Ground } from './first-roster';
import type { Pace } from './pace';
import type { SearchState } from './search-state';

export interface PatternSearch {
  readonly ground: Ground;
  readonly state: SearchState;
  readonly solve: LinearSolver;
  readonly pace: Pace;
  readonly seed: number;
  readonly limitSeconds: number;
  readonly nodeLimit: number;
}

/** Patterns at most: beyond this the whole-number master takes too long to be of use. */
const mostPatterns = 4000;

/**
 * The best roster made of the generated patterns, by a search tree over the master that starts from the
 * roster in the ground's lines. A pattern whose reduced cost is above the gap between that roster and the
 * master's value is in no better roster and is left out.
 */
export function searchPatterns(search: PatternSearch, found: ColumnGenerationResult): void {
  const { ground, state, solve, pace, seed, limitSeconds, nodeLimit } = search;
  const gapCents = ground.lines.total - found.value;
  const duals = found.rowDuals;
  if (!duals) return;
  const patterns = usefulPatterns(ground, found, duals, gapCents);
  const linear = found.master.withPatterns(patterns);
  const first = found.master.linear.columnNames.length;
  const outcome = solve(linear, 'cost', {
    limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : limitSeconds,
    nodeLimit,
    seed,
    absoluteGap: 0.9,
    startPart: {
      columns: Int32Array.from(patterns, (_, index) => first + index),
      values: Float64Array.from(patterns, (pattern) => (isInRoster(ground, pattern) ? 1 : 0)),
    },
    onSolution: (values) => state.offerCells(cellsOf(ground, values, patterns, first)),
    shouldStop: () => state.isOver,
    onIterations: (count) => pace.countSolve(linear.indices.length / 5, count),
  });
  if ('solution' in outcome && outcome.solution) {
    state.offerCells(cellsOf(ground, outcome.solution.values, patterns, first));
  }
}

/** Patterns in the roster, then the others by their reduced cost. */
function usefulPatterns(
  ground: Ground,
  { patterns, master }: ColumnGenerationResult,
  duals: Float64Array,
  gapCents: number,
): Pattern[] {
  const ranked = patterns.map((pattern) => ({
    pattern,
    reduced: isInRoster(ground, pattern)
      ? Number.NEGATIVE_INFINITY
      : master.reducedCost(pattern, duals),
  }));
  return ranked
    .filter(({ reduced }) => reduced <= Math.max(1, gapCents))
    .sort((one, other) => one.reduced - other.reduced)
    .slice(0, mostPatterns)
    .map(({ pattern }) => pattern);
}

function isInRoster({ lines }: Ground, { person, cells }: Pattern): boolean {
  const at = person * lines.days;
  return cells.every((column, day) => lines.cells[at + day] === column);
}

function cellsOf(
  { lines }: Ground,
  values: ArrayLike<number>,
  patterns: readonly Pattern[],
  first: number,
): Int32Array {
  const cells = lines.cells.slice();
  patterns.forEach((pattern, index) => {
    if ((values[first + index] ?? 0) > 0.5) cells.set(pattern.cells, pattern.person * lines.days);
  });
  return cells;
}
