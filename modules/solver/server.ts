import { env } from '../../db/env';
import type { LinearModel } from '../model';
import type { PlannedRoster, Problem, SizingProblem } from '../problem';
import { BestOfLanes } from './best-of-lanes';
import type { LinearOutcome } from './linear-outcome';
import type { RosterOutcome, RosterProgress, SizingOutcome, SolvedRoster } from './roster-outcome';
import { runJob } from './run-job';
import { runLanes } from './run-lanes';
import { settle } from './settle';

export * from './analyse';
export { loosened } from './knots/plan-ways';
export { withAbsences } from './mend/with-absences';
export { closeSolver } from './pool';
export { runInThread } from './run-job';

export interface SolveRosterOptions {
  readonly limitSeconds: number;
  /**
   * Nominal seconds of counted work instead of the clock: the same problem, seed, threads and budget then
   * give the same roster. `limitSeconds` is of no account.
   */
  readonly workSeconds?: number;
  /** Threads the run may use; left out: as many as there are, at most two. */
  readonly lanes?: 1 | 2;
  /** Relative gap of the cost at which to stop; left out: search to the end. */
  readonly targetGap?: number;
  readonly seed?: number;
  /** A roster that breaks no rule, e.g. the draft: the run never ends with a worse one. */
  readonly start?: PlannedRoster | null;
  readonly onProgress?: (progress: RosterProgress) => void;
  /** Each roster that is better than all before it. */
  readonly onRoster?: (roster: PlannedRoster) => void;
  /** Aborting it ends the run within about two seconds and keeps the best roster. */
  readonly stop?: AbortSignal;
}

/** Computes a roster in solver threads: least shortage, then least cost. Never rejects. */
export async function solveRoster(
  problem: Problem,
  options: SolveRosterOptions,
): Promise<RosterOutcome> {
  const { limitSeconds, workSeconds = null, targetGap = 0, seed = 0, start = null } = options;
  const best = new BestOfLanes();
  const end = await runLanes({
    problem,
    options: { limitSeconds, workSeconds, targetGap, seed, start },
    // A second lane that waits for a thread would hold up the first.
    lanes: env().SOLVER_THREADS > 1 ? (options.lanes ?? 2) : 1,
    stop: options.stop,
    onMessage: (message, lane) => {
      if (message.kind === 'roster' && best.take(message.solved)) {
        options.onRoster?.(message.solved.roster);
      }
      if (message.kind === 'progress' && lane === 0) {
        options.onProgress?.(best.tell(message.progress));
      }
    },
  });
  if (end.kind === 'killed') return keepBest(best.solved, end.wasStopped);
  const outcome = settle(end);
  // When the other lane tells of its last rosters is a matter of the clock: a repetition leaves them out.
  return workSeconds === null ? best.complete(outcome) : outcome;
}

function keepBest(best: SolvedRoster | null, wasStopped: boolean): RosterOutcome {
  if (wasStopped) return { kind: 'stopped', best };
  if (best) return { kind: 'out-of-time', ...best };
  return { kind: 'failed', message: 'The time was over before a first roster was found.' };
}

export interface SolveOptions {
  readonly limitSeconds: number;
  readonly stop?: AbortSignal;
}

/** Sizes a team in a solver thread. Never rejects. */
export async function solveSizing(
  problem: SizingProblem,
  { limitSeconds, stop }: SolveOptions,
): Promise<SizingOutcome> {
  const end = await runJob<SizingOutcome>(
    { kind: 'sizing', problem, limitSeconds },
    { limitSeconds, stop },
  );
  return end.kind === 'killed' ? { kind: end.wasStopped ? 'stopped' : 'out-of-time' } : settle(end);
}

/** Solves a linear model for one of its objectives in a solver thread. Never rejects. */
export async function solveLinear(
  model: LinearModel,
  objective: string,
  options: SolveOptions & { readonly targetGap?: number; readonly seed?: number },
): Promise<LinearOutcome> {
  const { limitSeconds, targetGap = 0, seed = 0, stop } = options;
  const end = await runJob<LinearOutcome>(
    { kind: 'linear', model, objective, options: { limitSeconds, targetGap, seed } },
    { limitSeconds, stop },
  );
  if (end.kind !== 'killed') return settle(end);
  const bound = Number.NEGATIVE_INFINITY;
  return { kind: end.wasStopped ? 'interrupted' : 'out-of-time', solution: null, bound };
}
