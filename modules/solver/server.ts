import type { LinearModel } from '../model';
import type { PlannedRoster, Problem, SizingProblem } from '../problem';
import type { LinearOutcome } from './linear-outcome';
import type {
  RosterOutcome,
  RosterProgress,
  SizingOutcome,
  SolvedRoster,
  SolverFailure,
} from './roster-outcome';
import { type JobEnd, runJob } from './run-job';

export { closeSolver } from './pool';

export interface SolveRosterOptions {
  readonly limitSeconds: number;
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

/** Computes a roster in a solver thread: least shortage, then least cost. Never rejects. */
export async function solveRoster(
  problem: Problem,
  options: SolveRosterOptions,
): Promise<RosterOutcome> {
  const { limitSeconds, targetGap = 0, seed = 0, start = null, stop } = options;
  let best: SolvedRoster | null = null;
  const end = await runJob<RosterOutcome>(
    { kind: 'roster', problem, options: { limitSeconds, targetGap, seed, start } },
    {
      limitSeconds,
      stop,
      onMessage: (message) => {
        if (message.kind === 'progress') options.onProgress?.(message.progress);
        if (message.kind !== 'roster') return;
        best = message.solved;
        options.onRoster?.(message.solved.roster);
      },
    },
  );
  return end.kind === 'killed' ? keepBest(best, end.wasStopped) : settle(end);
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

function settle<T>(end: Exclude<JobEnd<T>, { kind: 'killed' }>): T | SolverFailure {
  if (end.kind === 'answered') return end.answer;
  return {
    kind: 'failed',
    message: 'The solver broke off; run again, and with fewer people or days if it happens again.',
    cause: end.cause,
  };
}
