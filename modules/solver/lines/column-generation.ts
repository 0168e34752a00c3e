import type { LinearSession } from '../linear-session';
import { lagrangianBound } from './lagrangian-bound';
import { costOf, costWithin } from './line-cost';
import { isWholePart, type Part } from './part';
import { type MasterPrices, type OpenSession, type Pattern, PatternMaster } from './pattern-master';
import type { Pricing, Refill } from './refill';
import type { RosterLines } from './roster-lines';
import type { SearchSpace } from './search-space';

export interface ColumnGenerationPlan {
  /** What is laid anew; a bound of the whole cost comes only of everybody and all days. */
  readonly part: Part;
  /** At least one pattern for each person. */
  readonly patterns: readonly Pattern[];
  readonly mostRounds: number;
  readonly limitSeconds: number;
  readonly shouldStop: () => boolean;
  /** Each time a better bound is proven. */
  readonly onBound: (bound: number, prices: MasterPrices) => void;
  /** Ends it early: no roster costs less than `bound` and that is good enough. */
  readonly isEnough: (bound: number) => boolean;
  readonly onIterations?: (iterations: number) => void;
}

export interface ColumnGenerationResult {
  readonly bound: number;
  /** The prices that prove the bound; null before a first round. */
  readonly prices: MasterPrices | null;
  readonly patterns: readonly Pattern[];
  readonly part: Part;
  readonly master: PatternMaster;
  /** By pattern: its value in the last master; none for those added after it, empty before a first. */
  readonly values: Float64Array;
  /** Value of the last master with the rest of the roster as it is, in the terms of `RosterLines.total`. */
  readonly value: number;
  /** Duals of the last master, by its rows. */
  readonly rowDuals: Float64Array | null;
  readonly isConverged: boolean;
}

/** Patterns of each person that a round may add. */
const patternsARound = 4;
/** Relative distance of master value and bound at which it has converged. */
const convergence = 1e-6;
/** Rows x people beyond which the first solve goes by the interior point method. */
const wideMaster = 24_000;

/**
 * The linear relaxation over whole-period patterns by column generation (Gilmore and Gomory, Operations
 * Research 9, 1961, 849-859): solve the master, price every person's cheapest line by its duals, add what
 * is worth it, until nothing is. Each round's duals give a lower bound of every roster's cost.
 */
export function generateColumns(
  roster: RosterLines,
  refill: Refill,
  open: OpenSession,
  plan: ColumnGenerationPlan,
): ColumnGenerationResult {
  const { space } = roster;
  const master = new PatternMaster(roster, plan.part);
  const session = open(master.linear, 'cost');
  const outside = roster.total - master.valueOf(roster);
  const isWhole = isWholePart(space, plan.part);
  const seen = new Set<string>();
  const patterns = plan.patterns.filter((pattern) => {
    const isNew = !seen.has(keyOf(pattern));
    seen.add(keyOf(pattern));
    return isNew;
  });
  let best: { bound: number; prices: MasterPrices | null } = {
    bound: Number.NEGATIVE_INFINITY,
    prices: null,
  };
  let isConverged = false;
  let round = 0;
  let rowDuals: Float64Array | null = null;
  let value = Number.NEGATIVE_INFINITY;
  let values = new Float64Array(0);
  const firstPattern = master.linear.columnNames.length;
  try {
    master.add(session, patterns);
    for (; round < plan.mostRounds && !plan.shouldStop() && !isConverged; round += 1) {
      const solved = solveMaster(session, plan, round === 0, space);
      if (!solved) break;
      rowDuals = solved.rowDuals;
      value = solved.value + outside;
      values = solved.values.slice(firstPattern);
      const prices = master.readPrices(solved.rowDuals);
      const priced = priceAll(space, refill, prices, plan.part);
      if (isWhole) {
        const bound = lagrangianBound(space, prices, priced.least);
        if (bound > best.bound) {
          best = { bound, prices };
          plan.onBound(bound, prices);
        }
      }
      const added = priced.patterns.filter((pattern) => !seen.has(keyOf(pattern)));
      for (const pattern of added) seen.add(keyOf(pattern));
      patterns.push(...added);
      master.add(session, added);
      const isReached = isWhole && value - best.bound <= convergence * Math.max(1, Math.abs(value));
      isConverged = added.length === 0 || isReached || plan.isEnough(best.bound);
    }
  } finally {
    session.close();
  }
  return {
    ...best,
    part: plan.part,
    patterns,
    master,
    value,
    values,
    rowDuals,
    isConverged,
  };
}

const keyOf = ({ person, cells }: Pattern): string => `${person}:${cells.join()}`;

function solveMaster(
  session: LinearSession,
  { limitSeconds, shouldStop, onIterations, part }: ColumnGenerationPlan,
  isFirst: boolean,
  { rows }: SearchSpace,
): {
  readonly value: number;
  readonly values: Float64Array;
  readonly rowDuals: Float64Array;
} | null {
  const isWide = rows.count * part.people.length > wideMaster;
  const method = isWide ? 'interior' : isFirst ? 'dual' : 'primal';
  const outcome = session.solve({
    limitSeconds,
    shouldStop,
    method,
    ...(onIterations ? { onIterations } : {}),
  });
  if (outcome.kind !== 'optimal' || !outcome.duals) return null;
  const { objective: value, values } = outcome.solution;
  return { value, values, rowDuals: outcome.duals.rowDuals };
}

interface PricedAll {
  /** Sum of everybody's cheapest line by the prices. */
  readonly least: number;
  /** Lines that would make the master cheaper. */
  readonly patterns: Pattern[];
}

function priceAll(space: SearchSpace, refill: Refill, prices: MasterPrices, part: Part): PricedAll {
  const pricing = pricingBy(space, prices);
  const patterns: Pattern[] = [];
  let least = 0;
  for (const person of part.people) {
    const found = refill.cheapestLines(person, pricing, patternsARound, part);
    least += found.least;
    for (const { cells, end, price } of found.lines) {
      const cost = costOf(space, person, cells, end);
      // The price counts the days of the part only; the line's cost counts the days around it too.
      const around = cost - costWithin(space, person, cells, end, part);
      if (price + around - (prices.people[person] ?? 0) > -reducedCostTolerance) continue;
      patterns.push({ person, cells, end, cost });
    }
  }
  return { least, patterns };
}

/** Cents below which a reduced cost is arithmetic. */
const reducedCostTolerance = 1e-6;

/** Shifts earn what their cover is worth; counts pay their share of the spreads. */
export function pricingBy(space: SearchSpace, prices: MasterPrices): Pricing {
  const { starts, rows, coefficients } = space.columns;
  const people = space.lines.length;
  return {
    coverPrice: (column) => {
      let sum = 0;
      for (let at = starts[column] as number; at < (starts[column + 1] as number); at += 1) {
        sum -= (coefficients[at] as number) * (prices.rows[rows[at] as number] as number);
      }
      return sum;
    },
    noise: () => 0,
    endPrice: (person, end) =>
      space.spreads.reduce((sum, term, index) => {
        const count = space.lines[person]?.net.ends[term.measure][end] ?? 0;
        const at = index * people + person;
        return sum + count * ((prices.most[at] ?? 0) - (prices.least[at] ?? 0));
      }, 0),
  };
}
