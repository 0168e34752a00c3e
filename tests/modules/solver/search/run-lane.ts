import type { Problem } from '@/modules/problem';
import type { RosterOutcome, RosterProgress, SolvedRoster } from '@/modules/solver';
import { noPeer } from '@/modules/solver/search/peer-link';
import {
  type LinearTools,
  type RosterOptions,
  searchLane,
} from '@/modules/solver/search/search-lane';
import { realTools } from '../analysis-solver';

interface Watch {
  readonly tools?: Partial<LinearTools>;
  readonly options?: Partial<RosterOptions>;
  readonly isStopRequested?: () => boolean;
  /** Milliseconds by which the clock goes on each time it is read; left out: the real clock. */
  readonly tick?: number;
  /** How much faster than the real clock; searches that end by proof then anneal for less time. */
  readonly haste?: number;
  /** Whether lane 0 leaves the search for better rosters to a lane that is not there. */
  readonly onlyProves?: boolean;
}

export interface LaneRun {
  readonly outcome: RosterOutcome;
  readonly progress: readonly RosterProgress[];
  readonly rosters: readonly SolvedRoster[];
}

/** Runs a search alone in this thread. */
export function runLane(problem: Problem, watch: Watch = {}): LaneRun {
  const progress: RosterProgress[] = [];
  const rosters: SolvedRoster[] = [];
  let milliseconds = 0;
  const ticking = (tick: number) => () => {
    milliseconds += tick;
    return milliseconds;
  };
  const hasty = () => realTools.clock() * (watch.haste ?? 1);
  const options: RosterOptions = {
    limitSeconds: 30,
    workSeconds: null,
    targetGap: 0,
    seed: 1,
    start: null,
    ...watch.options,
  };
  const outcome = searchLane(
    { ...realTools, ...watch.tools },
    problem,
    options,
    { number: 0, isAlone: watch.onlyProves !== true, peer: noPeer },
    {
      clock: watch.tick === undefined ? hasty : ticking(watch.tick),
      isStopRequested: watch.isStopRequested ?? (() => false),
      onProgress: (report) => progress.push(report),
      onRoster: (solved) => rosters.push(solved),
    },
  );
  return { outcome, progress, rosters };
}

/** The roster of a run that has ended with one. */
export function solvedOf({ outcome }: LaneRun): SolvedRoster {
  switch (outcome.kind) {
    case 'optimal':
    case 'good-enough':
    case 'out-of-time':
      return outcome;
    default:
      throw new Error(`ended as ${JSON.stringify(outcome)}`);
  }
}

/** The roster of a run that is proven best. */
export function optimalOf(run: LaneRun): SolvedRoster {
  if (run.outcome.kind !== 'optimal') throw new Error(`ended as ${JSON.stringify(run.outcome)}`);
  return run.outcome;
}
