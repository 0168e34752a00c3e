import { type LinearModel, relaxed, withRowBounds } from '../../model';
import type { LinearOutcome } from '../linear-outcome';
import type { LinearSolver } from '../linear-solver';
import type { Ground } from './first-roster';
import type { Pace } from './pace';
import type { SearchState } from './search-state';

export interface LevelProof {
  readonly ground: Ground;
  readonly state: SearchState;
  readonly solve: LinearSolver;
  readonly pace: Pace;
  readonly seed: number;
}

/** Share of what is left that the search tree of one level may take. */
const levelShare = 0.5;
const mostNodes = 2000;

/**
 * Stage one: for each level that the best roster does not keep at 0, its least value with the levels before
 * it kept, first by the linear relaxation, then by a search tree that starts from the best roster.
 * Answers a sentence when the solver contradicts itself.
 */
export function proveLevels(proof: LevelProof): string | null {
  const { ground, state } = proof;
  for (const level of ground.model.levels.keys()) {
    if (state.isProven(level) || state.isOver) continue;
    const linear = keepLevels(proof, (state.best?.levels ?? []).slice(0, level));
    const failure = boundLevel(proof, linear, level) ?? searchLevel(proof, linear, level);
    if (failure) return failure;
  }
  return null;
}

/** The model with at most these values on its first levels. */
export function keepLevels(
  { ground, state }: Pick<LevelProof, 'ground' | 'state'>,
  most: readonly number[],
): LinearModel {
  return most.reduce(
    (linear, value, level) =>
      withRowBounds(
        linear,
        ground.model.levels[level]?.row ?? -1,
        Number.NEGATIVE_INFINITY,
        value + state.levelSlack(level),
      ),
    ground.model.linear,
  );
}

function boundLevel(proof: LevelProof, linear: LinearModel, level: number): string | null {
  const { ground, state, solve, pace } = proof;
  const outcome = solve(relaxed(linear), ground.model.levels[level]?.objective ?? '', {
    limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : pace.remaining(),
    shouldStop: () => state.isOver,
    onIterations: (count) => pace.countSolve(linear.indices.length / 5, count),
  });
  if (outcome.kind === 'optimal') state.raiseLevelBound(level, outcome.bound);
  return contradiction(outcome);
}

function searchLevel(proof: LevelProof, linear: LinearModel, level: number): string | null {
  const { ground, state, solve, pace, seed } = proof;
  if (state.isProven(level)) return null;
  const outcome = solve(linear, ground.model.levels[level]?.objective ?? '', {
    limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : pace.remaining() * levelShare,
    ...(pace.isCounted ? { nodeLimit: mostNodes } : {}),
    seed,
    ...(state.best ? { start: state.best.values } : {}),
    // One step less than the best is the next value there is.
    absoluteGap: (ground.model.levels[level]?.step ?? 1) * 0.99,
    onSolution: (values) => state.offer(values),
    onBound: (bound) => state.raiseLevelBound(level, bound),
    shouldStop: () => {
      if (!pace.isCounted) state.fetchFromPeer();
      return state.isOver || state.isProven(level);
    },
    onIterations: (count) => pace.countSolve(linear.indices.length / 5, count),
  });
  if ('solution' in outcome && outcome.solution) state.offer(outcome.solution.values);
  if ('bound' in outcome) {
    state.raiseLevelBound(level, outcome.bound, outcome.kind === 'optimal');
  }
  return contradiction(outcome);
}

/** A sentence when an outcome cannot be: the model always has a solution. */
export function contradiction(outcome: LinearOutcome): string | null {
  switch (outcome.kind) {
    case 'failed':
      return outcome.message;
    case 'infeasible':
    case 'unbounded':
      return `The solver contradicts itself: ${outcome.kind}.`;
    default:
      return null;
  }
}
