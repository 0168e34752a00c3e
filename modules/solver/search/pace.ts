/**
 * How long each part of a search lasts. By the clock: nominal seconds are seconds, and the run ends at its
 * limit. By work: nominal seconds are counted work, so that the same problem, seed and budget take the
 * same steps on any machine; the clock then ends nothing but a run that is far over its limit.
 */
export interface Pace {
  /** Whether steps are counted: nothing may then depend on the clock. */
  readonly isCounted: boolean;
  /** Nominal seconds since the search began. */
  elapsed(): number;
  /** Nominal seconds that are left. */
  remaining(): number;
  /** Counts work: arcs of nets looked at. */
  countArcs(arcs: number): void;
  /** Counts a solve of the linear solver by the size of its model and its iterations. */
  countSolve(nonzeros: number, iterations: number): void;
}

/** Arcs looked at in a nominal second. */
const arcsASecond = 60e6;
/** Nonzeros x iterations of a linear solve in a nominal second, by measurement of many. */
const solverWorkASecond = 8e6;
/** Every step counts for at least so many nominal seconds, or a search without people would never end. */
const leastSeconds = 1e-4;

/** The pace of the wall clock; `clock` gives milliseconds. */
export function paceByClock(clock: () => number, limitSeconds: number): Pace {
  const startedAt = clock();
  const elapsed = () => (clock() - startedAt) / 1000;
  return {
    isCounted: false,
    elapsed,
    remaining: () => limitSeconds - elapsed(),
    countArcs: () => undefined,
    countSolve: () => undefined,
  };
}

/** The pace of counted work, for a budget of nominal seconds. */
export function paceByWork(budgetSeconds: number): Pace {
  let done = 0;
  return {
    isCounted: true,
    elapsed: () => done,
    remaining: () => budgetSeconds - done,
    countArcs: (arcs) => {
      done += Math.max(leastSeconds, arcs / arcsASecond);
    },
    countSolve: (nonzeros, iterations) => {
      done += Math.max(leastSeconds, (nonzeros * iterations) / solverWorkASecond);
    },
  };
}

/** Nonzeros that stand for an iteration on a master over patterns, whose columns come and go. */
export const masterWork = 2000;
