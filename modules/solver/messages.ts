import type { MessagePort } from 'node:worker_threads';
import type { LinearModel } from '../model';
import type { Problem, SizingProblem } from '../problem';
import type { AnalysisJob } from './analysis-job';
import type { WayOut } from './knots/way-out';
import type { TakeOver } from './mend/mending';
import type { RosterProgress, SolvedRoster } from './roster-outcome';
import type { RosterOptions } from './search/search-lane';

/** What a solver thread can be asked to do. */
export type SolverJob =
  | {
      readonly kind: 'roster';
      readonly problem: Problem;
      readonly options: RosterOptions;
      readonly lane: LaneLink;
    }
  | { readonly kind: 'sizing'; readonly problem: SizingProblem; readonly limitSeconds: number }
  | {
      readonly kind: 'linear';
      readonly model: LinearModel;
      readonly objective: string;
      readonly options: {
        readonly limitSeconds: number;
        readonly targetGap: number;
        readonly seed: number;
      };
    }
  | AnalysisJob;

/** Which part of a run a thread does, and the line to the other part. */
export interface LaneLink {
  readonly number: 0 | 1;
  /** null: the lane runs alone. `steps`: two Int32, see `linkPeer`. */
  readonly peer: { readonly port: MessagePort; readonly steps: SharedArrayBuffer } | null;
}

/** A job as it crosses to the thread. */
export interface ThreadTask<Job> {
  readonly job: Job;
  /** Carries `SolverMessage`s out while the thread computes. */
  readonly port: MessagePort;
  /** One Int32: 0, or 1 to stop. A message could not reach a thread that computes. */
  readonly stopFlag: SharedArrayBuffer;
}

export type SolverTask = ThreadTask<SolverJob>;

export type SolverMessage =
  | { readonly kind: 'started' }
  | { readonly kind: 'progress'; readonly progress: RosterProgress }
  | { readonly kind: 'roster'; readonly solved: SolvedRoster }
  | { readonly kind: 'wayOut'; readonly wayOut: WayOut }
  | { readonly kind: 'takeOvers'; readonly takeOvers: readonly TakeOver[] };
