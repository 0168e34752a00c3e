import loadHighs, { type Highs } from 'highs';
import { solveLinearModel } from './highs-adapter';
import type { LinearOutcome } from './linear-outcome';
import type { LinearSolver } from './linear-solver';
import type { SolverMessage, SolverTask } from './messages';
import type { RosterOutcome, SizingOutcome } from './roster-outcome';
import { searchRoster } from './search-roster';
import { searchSizing } from './search-sizing';

/** One instance for the life of the thread; dropped after a failure, which may have broken it. */
let loading: Promise<Highs> | null = null;

/** The body of a solver thread: does one job and answers its outcome. */
export default async function work(
  task: SolverTask,
): Promise<RosterOutcome | SizingOutcome | LinearOutcome> {
  loading ??= loadHighs();
  const highs = await loading;
  const send = (message: SolverMessage) => task.port.postMessage(message);
  try {
    send({ kind: 'started' });
    return run(task, (model, name, options) => solveLinearModel(highs, model, name, options), send);
  } catch (cause) {
    loading = null;
    // The message alone: the stack of the bundled solver prints its whole source line.
    throw new Error(cause instanceof Error ? cause.message : String(cause));
  } finally {
    task.port.close();
  }
}

function run(
  { job, stopFlag }: SolverTask,
  solve: LinearSolver,
  send: (message: SolverMessage) => void,
): RosterOutcome | SizingOutcome | LinearOutcome {
  const flag = new Int32Array(stopFlag);
  const isStopRequested = () => Atomics.load(flag, 0) === 1;
  const clock = () => performance.now();
  switch (job.kind) {
    case 'roster':
      return searchRoster(solve, job.problem, job.options, {
        isStopRequested,
        clock,
        onProgress: (progress) => send({ kind: 'progress', progress }),
        onRoster: (solved) => send({ kind: 'roster', solved }),
      });
    case 'sizing':
      return searchSizing(
        solve,
        job.problem,
        { limitSeconds: job.limitSeconds, isStopRequested },
        clock,
      );
    case 'linear':
      return solve(job.model, job.objective, { ...job.options, shouldStop: isStopRequested });
  }
}
