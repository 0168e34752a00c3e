import loadHighs, { type Highs } from 'highs';
import { workerData } from 'piscina';
import type { AnalysisAnswer } from './analysis-job';
import { solveLinearModel } from './highs-adapter';
import { openHighsSession } from './highs-session';
import type { LinearOutcome } from './linear-outcome';
import type { SolverMessage, SolverTask } from './messages';
import type { SolverThreadData } from './pool';
import type { RosterOutcome, SizingOutcome } from './roster-outcome';
import { runAnalysis } from './run-analysis';
import { linkPeer, noPeer } from './search/peer-link';
import { type Lane, type LinearTools, searchLane } from './search/search-lane';
import { searchSizing } from './search-sizing';

/** One instance for the life of the thread; dropped after a failure, which may have broken it. */
let loading: Promise<Highs> | null = null;

/** The compiled solver comes with the thread, so that it is compiled once a process. */
const load = (): Promise<Highs> => loadHighs(workerData as SolverThreadData);

/** The body of a solver thread: does one job and answers its outcome. */
export default async function work(
  task: SolverTask,
): Promise<RosterOutcome | SizingOutcome | LinearOutcome | AnalysisAnswer> {
  const send = (message: SolverMessage) => task.port.postMessage(message);
  try {
    loading ??= load();
    const highs = await loading;
    send({ kind: 'started' });
    const tools: LinearTools = {
      solve: (model, name, options) => solveLinearModel(highs, model, name, options),
      open: (model, name) => openHighsSession(highs, model, name),
    };
    return run(task, tools, send);
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
  tools: LinearTools,
  send: (message: SolverMessage) => void,
): RosterOutcome | SizingOutcome | LinearOutcome | AnalysisAnswer {
  const flag = new Int32Array(stopFlag);
  const isStopRequested = () => Atomics.load(flag, 0) === 1;
  const clock = () => performance.now();
  switch (job.kind) {
    case 'roster':
      return searchLane(tools, job.problem, job.options, laneOf(job, isStopRequested), {
        isStopRequested,
        clock,
        onProgress: (progress) => send({ kind: 'progress', progress }),
        onRoster: (solved) => send({ kind: 'roster', solved }),
      });
    case 'sizing':
      return searchSizing(
        tools.solve,
        job.problem,
        { limitSeconds: job.limitSeconds, isStopRequested },
        clock,
      );
    case 'linear':
      return tools.solve(job.model, job.objective, { ...job.options, shouldStop: isStopRequested });
    default:
      return runAnalysis({ ...tools, isStopRequested, clock }, job, send);
  }
}

function laneOf(
  { lane: { number, peer }, options }: Extract<SolverTask['job'], { kind: 'roster' }>,
  isStopRequested: () => boolean,
): Lane {
  if (!peer) return { number, isAlone: true, peer: noPeer };
  const isCounted = options.workSeconds !== null;
  return {
    number,
    isAlone: false,
    peer: linkPeer(peer.port, peer.steps, number, isCounted, isStopRequested),
  };
}
