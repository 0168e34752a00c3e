import type { AnalysisTools, TimeLeft } from '../analysis-tools';
import type { BoundPart, KnotModel, KnotRow } from './knot-model';

/** What the relaxation says of a set of requirements. */
export interface ProbeAnswer {
  /** Whether the relaxation already proves that they clash. */
  readonly clashes: boolean;
  /** If so: those that this proof uses. They clash by themselves. */
  readonly used: ReadonlySet<number>;
}

/** Tests sets of requirements in one linear program that stays in the solver. */
export interface RelaxationProbe {
  /** null: out of time. */
  readonly test: (kept: ReadonlySet<number>) => ProbeAnswer | null;
  readonly close: () => void;
}

/** Rows bent by less, in shifts, hold. */
const bentTolerance = 1e-6;
/** Prices of rows below this are arithmetic. */
const dualTolerance = 1e-9;

/**
 * Opens the elastic relaxation. When its least bend is above 0, the rows with a price are a proof of the
 * clash (J. Farkas, J. reine angew. Math. 124, 1902, 1-27): with all other rows switched off the same prices
 * still prove it. Candidates by non-zero prices: Chinneck and Dravnieks, ORSA J. Computing 3, 1991.
 */
export function openProbe(
  tools: AnalysisTools,
  { linear, rows, requirements }: KnotModel,
  time: TimeLeft,
): RelaxationProbe {
  const session = tools.open(linear, 'bent');
  const inForce = new Set(requirements.keys());
  const setBounds = (kept: ReadonlySet<number>): void => {
    for (const row of rows) {
      const isOther = [...row.lower, ...row.upper].some(
        ({ requirement }) => kept.has(requirement) !== inForce.has(requirement),
      );
      if (isOther) session.changeRowBounds(row.row, ...boundsOf(row, kept));
    }
    inForce.clear();
    for (const requirement of kept) inForce.add(requirement);
  };
  return {
    test(kept) {
      setBounds(kept);
      const outcome = session.solve({
        limitSeconds: time.seconds(),
        method: 'dual',
        shouldStop: tools.isStopRequested,
      });
      if (outcome.kind !== 'optimal') return null;
      if (outcome.bound <= bentTolerance) return { clashes: false, used: new Set() };
      const duals = outcome.duals?.rowDuals ?? new Float64Array();
      return { clashes: true, used: usedIn(rows, kept, duals) };
    },
    close: () => session.close(),
  };
}

function usedIn(
  rows: readonly KnotRow[],
  kept: ReadonlySet<number>,
  duals: Float64Array,
): Set<number> {
  const used = new Set<number>();
  for (const { row, lower, upper } of rows) {
    const price = duals[row] ?? 0;
    if (Math.abs(price) <= dualTolerance) continue;
    // The price of a row that is met from below is positive, from above negative.
    for (const { requirement } of price > 0 ? lower : upper) {
      if (kept.has(requirement)) used.add(requirement);
    }
  }
  return used;
}

function boundsOf({ lower, upper }: KnotRow, kept: ReadonlySet<number>): [number, number] {
  return [
    sumOf(lower, kept) ?? Number.NEGATIVE_INFINITY,
    sumOf(upper, kept) ?? Number.POSITIVE_INFINITY,
  ];
}

function sumOf(parts: readonly BoundPart[], kept: ReadonlySet<number>): number | null {
  const held = parts.filter(({ requirement }) => kept.has(requirement));
  if (!held.some(({ isBinding }) => isBinding)) return null;
  return held.reduce((sum, { amount }) => sum + amount, 0);
}
