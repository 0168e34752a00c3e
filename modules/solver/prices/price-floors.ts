import type { Problem } from '../../problem';
import { type AnalysisTools, countDown } from '../analysis-tools';
import type {
  CurvePoint,
  EstimatedChange,
  FloorPrice,
  PriceOptions,
  PriceQuestion,
} from './floor-price';
import { type LeastValues, type LevelSession, openLevels } from './level-session';
import { type RaisedModel, type RaisedRow, raiseFloors } from './raised-floors';

/**
 * What one person more and one less on a floor costs, by finite differences of the linear relaxation, each a
 * warm re-solve with another right-hand side. The price of a constraint as the change of the optimum:
 * Gale, Kuhn and Tucker in Koopmans, Activity Analysis, 1951. Differences and not prices of rows, because at
 * a corner one more and one less are not the same. null: out of time, or somebody has no lawful line.
 */
export function priceFloors(
  tools: AnalysisTools,
  problem: Problem,
  questions: readonly PriceQuestion[],
  options: PriceOptions,
): FloorPrice[] | null {
  return withFloors(tools, problem, questions, 1, options.limitSeconds, (raised, session, base) => {
    const gap =
      options.bestCostCents === null ? null : Math.max(0, options.bestCostCents - base.costCents);
    const prices: FloorPrice[] = [];
    for (const question of questions) {
      const rows = raised.rowsOf(question);
      const [more, less] = ([1, -1] as const).map((step) => leastAt(session, rows, step, base));
      setRows(session, rows, 0);
      if (!more || !less) return null;
      prices.push({
        ...question,
        oneMore: changeFrom(base, more, gap, 1),
        oneLess: changeFrom(base, less, gap, -1),
      });
    }
    return prices;
  });
}

/** Least cost and shortage against people on a family of floors, today's `changes` of all at once. */
export function curveOfFloors(
  tools: AnalysisTools,
  problem: Problem,
  family: readonly PriceQuestion[],
  changes: readonly number[],
  limitSeconds: number,
): CurvePoint[] | null {
  const most = Math.max(0, ...changes);
  return withFloors(tools, problem, family, most, limitSeconds, (raised, session, base) => {
    const points: CurvePoint[] = [];
    for (const change of changes) {
      const least = leastAt(session, raised.rows, change, base);
      if (!least) return null;
      points.push(pointOf(change, least));
    }
    return points;
  });
}

function withFloors<T>(
  tools: AnalysisTools,
  problem: Problem,
  questions: readonly PriceQuestion[],
  most: number,
  limitSeconds: number,
  ask: (raised: RaisedModel, session: LevelSession, base: LeastValues) => T | null,
): T | null {
  const time = countDown(tools, limitSeconds);
  const raised = raiseFloors(problem, questions, most);
  const session = openLevels(tools, raised.model, time);
  try {
    setRows(session, raised.rows, 0);
    const base = session.least(null);
    return base && ask(raised, session, base);
  } finally {
    session.close();
  }
}

function leastAt(
  session: LevelSession,
  rows: readonly RaisedRow[],
  change: number,
  base: LeastValues,
): LeastValues | null {
  setRows(session, rows, change);
  return session.least(base);
}

function setRows(session: LevelSession, rows: readonly RaisedRow[], change: number): void {
  for (const { row, people, floors } of rows) {
    session.changeRow(row, Math.max(0, people + change * floors), Number.POSITIVE_INFINITY);
  }
}

function changeFrom(
  base: LeastValues,
  { costCents, shortageMinutes }: LeastValues,
  gap: number | null,
  step: 1 | -1,
): EstimatedChange {
  const cents = Math.round(costCents - base.costCents);
  const minutes = Math.round(shortageMinutes - base.shortageMinutes);
  // One more never saves and one less never costs, as long as the shortage stays what it is.
  const [least, most] =
    minutes !== 0 ? [-Infinity, Infinity] : step > 0 ? [0, Infinity] : [-Infinity, 0];
  const bracket =
    gap === null
      ? null
      : {
          leastCents: Math.max(least, Math.floor(cents - gap)),
          mostCents: Math.min(most, Math.ceil(cents + gap)),
        };
  return { costCents: cents, bracket, shortageMinutes: minutes };
}

/** The arithmetic of the solver is trusted so far, in cents and minutes. */
const tolerance = 0.01;

/** Bounds are told in whole cents and minutes, on the safe side. */
export const pointOf = (
  change: number,
  { costCents, shortageMinutes }: LeastValues,
): CurvePoint => ({
  change,
  leastCostCents: Math.floor(costCents + tolerance),
  leastShortageMinutes: Math.floor(shortageMinutes + tolerance),
});
