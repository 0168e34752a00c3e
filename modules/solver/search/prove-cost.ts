import { writeBoundRecord } from '../lines/bound-record';
import { generateColumns } from '../lines/column-generation';
import type { LinePool } from '../lines/line-pool';
import { wholeOf } from '../lines/part';
import { dive } from './dive';
import { type Ground, linesOf, putRoster } from './first-roster';
import { levelCents } from './level-cents';
import { masterWork } from './pace';
import { contradiction, keepLevels, type LevelProof } from './prove-levels';
import type { LinearTools } from './search-lane';
import { searchPatterns } from './search-patterns';

export interface CostProof extends LevelProof, LinearTools {
  readonly pool: LinePool;
  readonly random: () => number;
}

/** A compact relaxation this close leaves little to gain for column generation. */
const closeGap = 0.03;
/** Compact models up to this many columns are small enough for a search tree in any case. */
const fewColumns = 1200;
const patternShare = 0.15;
const mostNodes = 100_000;

/** Whether a search tree may solve the compact model although its relaxation is weak. */
export const isSmall = ({ model }: Ground): boolean =>
  model.linear.columnNames.length <= fewColumns;

/** Whether the bound is so near the best roster that column generation has little to gain. */
export function isClose({ state, ground }: Pick<CostProof, 'state' | 'ground'>): boolean {
  const solved = state.solved();
  if (!solved) return false;
  // Fixed pay would make every gap look small: the gap counts against what a roster can change.
  const changeable = Math.max(1, Math.abs(solved.costCents - Math.max(0, ground.offset)));
  return (solved.costCents - solved.boundCents) / changeable <= closeGap;
}

/**
 * The relaxation over whole-period patterns: its bound, a dive into it and, where it converged, a search
 * tree over the patterns that a better roster can be made of.
 */
export function boundByPatterns(proof: CostProof, shareOfRest: number): void {
  const { ground, state, open, pace } = proof;
  if (!state.best || putRoster(ground, state.best.roster).length > 0) return;
  const startedAt = pace.elapsed();
  const share = pace.remaining() * shareOfRest;
  const found = generateColumns(ground.lines, ground.refill, open, {
    part: wholeOf(ground.space),
    patterns: [...linesOf(ground, wholeOf(ground.space)), ...proof.pool.patterns()],
    mostRounds: 400,
    limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : share,
    shouldStop: () => {
      if (!pace.isCounted) state.fetchFromPeer();
      return state.isOver || pace.elapsed() - startedAt > share;
    },
    onIterations: (count) => pace.countSolve(masterWork, count),
    onBound: (bound, prices) => {
      const most = state.best?.levels ?? [];
      state.raiseCostBound(
        bound + ground.offset - levelCents(ground.model, most),
        most,
        writeBoundRecord(ground.space, prices),
      );
    },
    isEnough: () => state.isSolved,
  });
  if (found.prices) state.shareWorth(found.prices.rows);
  proof.pool.add(found.patterns);
  if (state.isOver || !found.isConverged) return;
  dive(proof, found);
  if (state.isOver) return;
  putRoster(ground, state.best.roster);
  const limitSeconds = pace.remaining() * patternShare;
  searchPatterns({ ...proof, limitSeconds, nodeLimit: pace.isCounted ? 200 : mostNodes }, found);
}

/**
 * A search tree over the whole compact model, with the levels kept at those of the best roster. Answers a
 * sentence when the solver breaks.
 */
export function searchTree(proof: CostProof, share: number): string | null {
  const { state, solve, pace, seed } = proof;
  const best = state.best;
  if (!best) return null;
  const linear = keepLevels(proof, best.levels);
  const outcome = solve(linear, 'cost', {
    limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : pace.remaining() * share,
    ...(pace.isCounted ? { nodeLimit: 300 } : {}),
    seed,
    start: best.values,
    absoluteGap: 0.9,
    onSolution: (values) => state.offer(values),
    onBound: (bound) => state.raiseCostBound(bound, best.levels),
    shouldStop: () => {
      if (!pace.isCounted) state.fetchFromPeer();
      return state.isOver;
    },
    onIterations: (count) => pace.countSolve(linear.indices.length / 5, count),
  });
  if ('bound' in outcome) state.raiseCostBound(outcome.bound, best.levels);
  if ('solution' in outcome && outcome.solution) state.offer(outcome.solution.values);
  return contradiction(outcome);
}
