import { writeBoundRecord } from '../lines/bound-record';
import { generateColumns } from '../lines/column-generation';
import type { LinePool } from '../lines/line-pool';
import { wholeOf } from '../lines/part';
import type { MasterPrices } from '../lines/pattern-master';
import { dive } from './dive';
import { linesOf, putRoster } from './first-roster';
import { levelCents } from './level-cents';
import { contradiction, keepLevels, type LevelProof } from './prove-levels';
import { raiseByPrices } from './relax';
import type { LinearTools } from './search-lane';
import { searchPatterns } from './search-patterns';

export interface CostProof extends LevelProof, LinearTools {
  readonly isAlone: boolean;
  readonly pool: LinePool;
  readonly random: () => number;
  readonly prices: MasterPrices | null;
}

/** A compact relaxation this close leaves little to gain for column generation. */
const closeGap = 0.03;
/** Compact models up to this many columns go to the solver as a whole, the small ones in any case. */
const mostColumns = 6000;
const fewColumns = 1200;
const columnShare = 0.35;
const tryShare = 0.12;
const patternShare = 0.15;
const mostNodes = 100_000;
const treeShare = { alone: 0.6, accompanied: 1 };

/**
 * Stage two, the bound: by whole-period patterns. Where the compact relaxation is close already they get a
 * short try only: on loose problems with many overlapping floors they converge too slowly.
 */
export function boundCost(proof: CostProof): void {
  const { state, ground, prices } = proof;
  if (prices) raiseByPrices(ground, state, prices);
  if (!state.best || state.isOver) return;
  boundByPatterns(proof, prices && isClose(proof) ? tryShare : columnShare);
}

/**
 * Stage two, the search: a search tree over the compact model where that is small or its relaxation close.
 * Answers a sentence when the solver breaks.
 */
export function searchCost(proof: CostProof): string | null {
  const columns = proof.ground.model.linear.columnNames.length;
  const most = proof.prices && isClose(proof) ? mostColumns : fewColumns;
  return columns <= most ? searchTree(proof) : null;
}

/** Whether the bound is so near the best roster that column generation has little to gain. */
export function isClose({ state, ground }: Pick<CostProof, 'state' | 'ground'>): boolean {
  const solved = state.solved();
  if (!solved) return false;
  // Fixed pay would make every gap look small: the gap counts against what a roster can change.
  const changeable = Math.max(1, Math.abs(solved.costCents - Math.max(0, ground.offset)));
  return (solved.costCents - solved.boundCents) / changeable <= closeGap;
}

function boundByPatterns(proof: CostProof, shareOfRest: number): void {
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
    onIterations: (count) => pace.countSolve(ground.space.columns.rows.length / 50, count),
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

function searchTree(proof: CostProof): string | null {
  const { state, solve, pace, seed, isAlone } = proof;
  const best = state.best;
  if (!best) return null;
  const share = isAlone ? treeShare.alone : treeShare.accompanied;
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
    onIterations: (count) => pace.countSolve(linear.indices.length / 50, count),
  });
  if ('bound' in outcome) state.raiseCostBound(outcome.bound, best.levels);
  if ('solution' in outcome && outcome.solution) state.offer(outcome.solution.values);
  return contradiction(outcome);
}
