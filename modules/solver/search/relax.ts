import { blendObjective, type LinearModel, type RosterModel, relaxed } from '../../model';
import type { LinearSolver } from '../linear-solver';
import { writeBoundRecord } from '../lines/bound-record';
import { pricingBy } from '../lines/column-generation';
import { lagrangianBound } from '../lines/lagrangian-bound';
import type { MasterPrices } from '../lines/pattern-master';
import type { SearchSpace } from '../lines/search-space';
import type { Ground } from './first-roster';
import { levelCents } from './level-cents';
import type { Pace } from './pace';
import type { SearchState } from './search-state';

/** Larger compact models are not relaxed: whole-period patterns bound them sooner and closer. */
const mostColumns = 8000;
/** Nominal seconds, share of the run and simplex iterations that the relaxation may take. */
const mostSeconds = 4;
const mostShare = 0.15;
const mostIterations = 30_000;

/**
 * The linear relaxation of the compact model: its duals guide the search, and give a first bound of the
 * cost by everybody's cheapest line. Null when it is too large to be of use, or ended before it was solved.
 */
export function relaxCompact(
  ground: Ground,
  state: SearchState,
  solve: LinearSolver,
  pace: Pace,
): MasterPrices | null {
  const { linear } = ground.model;
  if (linear.columnNames.length > mostColumns) return null;
  const outcome = solve(unbounded(relaxed(linear), ground.space), blendObjective, {
    limitSeconds: pace.isCounted
      ? Number.POSITIVE_INFINITY
      : Math.min(mostSeconds, pace.remaining() * mostShare),
    iterationLimit: mostIterations,
    shouldStop: () => state.isOver,
    onIterations: (count) => pace.countSolve(linear.indices.length / 5, count),
  });
  if (outcome.kind !== 'optimal' || !outcome.duals) return null;
  const prices = readCompactPrices(ground, outcome.duals.rowDuals);
  state.shareWorth(prices.rows);
  raiseByPrices(ground, state, prices);
  return prices;
}

const unbounded = (linear: LinearModel, { rows }: SearchSpace): LinearModel => ({
  ...linear,
  columnUpper: linear.columnUpper.map((upper, column) =>
    rows.isUnbounded[column] ? Number.POSITIVE_INFINITY : upper,
  ),
});

/** Raises the bound of the cost by the Lagrangian bound of some prices. */
export function raiseByPrices(ground: Ground, state: SearchState, prices: MasterPrices): void {
  const pricing = pricingBy(ground.space, prices);
  let least = 0;
  for (let person = 0; person < ground.space.lines.length; person += 1) {
    least += ground.refill.cheapestLines(person, pricing, 0).least;
  }
  const bound = lagrangianBound(ground.space, prices, least) + ground.offset;
  const most = state.best?.levels ?? ground.model.levels.map(() => 0);
  state.raiseCostBound(
    bound - levelCents(ground.model, most),
    most,
    writeBoundRecord(ground.space, prices),
  );
}

function readCompactPrices({ space, model }: Ground, rowDuals: Float64Array): MasterPrices {
  const people = model.works.length;
  const most = new Float64Array(space.spreads.length * people);
  const least = new Float64Array(space.spreads.length * people);
  space.spreads.forEach(({ termIndex }, index) => {
    const rows = spreadRowsOf(model, termIndex);
    rows.forEach(({ personIndex, mostRow, leastRow }) => {
      most[index * people + personIndex] = Math.abs(rowDuals[mostRow] ?? 0);
      least[index * people + personIndex] = Math.abs(rowDuals[leastRow] ?? 0);
    });
  });
  return {
    rows: Float64Array.from(space.rows.modelRows, (row) => rowDuals[row] ?? 0),
    people: new Float64Array(people),
    most,
    least,
  };
}

const spreadRowsOf = ({ spreads }: RosterModel, termIndex: number) =>
  spreads.find((spread) => spread.termIndex === termIndex)?.people ?? [];
