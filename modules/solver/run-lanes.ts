import { MessageChannel } from 'node:worker_threads';
import type { Problem } from '../problem';
import type { LaneLink, SolverMessage } from './messages';
import type { RosterOutcome } from './roster-outcome';
import { type JobEnd, runJob } from './run-job';
import type { RosterOptions } from './search/search-lane';

export interface RunLanes {
  readonly problem: Problem;
  readonly options: RosterOptions;
  readonly lanes: 1 | 2;
  readonly stop: AbortSignal | undefined;
  readonly onMessage: (message: SolverMessage, lane: 0 | 1) => void;
}

/** Wall-clock seconds after which a run that counts work is given up: its budget is no time. */
const countedLimitSeconds = 3600;

/**
 * Runs a search on one thread or on two that tell each other what they find. The answer is that of lane 0,
 * which proves; when its thread breaks, lane 1 goes on and answers with what it has. When lane 1 breaks,
 * lane 0 goes on alone.
 */
export async function runLanes(run: RunLanes): Promise<JobEnd<RosterOutcome>> {
  if (run.lanes === 1) return runLane(run, { number: 0, peer: null }, run.stop);
  const { port1, port2 } = new MessageChannel();
  const steps = new SharedArrayBuffer(2 * Int32Array.BYTES_PER_ELEMENT);
  const proverEnds = new AbortController();
  const stopSearcher = run.stop
    ? AbortSignal.any([run.stop, proverEnds.signal])
    : proverEnds.signal;
  const prover = runLane(run, { number: 0, peer: { port: port1, steps } }, run.stop);
  const searcher = runLane(run, { number: 1, peer: { port: port2, steps } }, stopSearcher);
  void searcher.then(() => markEnded(steps, 1));
  const end = await prover;
  markEnded(steps, 0);
  if (end.kind === 'broken') return searcher;
  proverEnds.abort();
  // The next run finds free threads only once this one has ended.
  await searcher;
  return end;
}

/** A lane that waits for the other learns that it is gone, however it ended. */
function markEnded(steps: SharedArrayBuffer, lane: 0 | 1): void {
  const counters = new Int32Array(steps);
  Atomics.store(counters, lane, -1);
  Atomics.notify(counters, lane);
}

function runLane(
  { problem, options, onMessage }: RunLanes,
  lane: LaneLink,
  stop: AbortSignal | undefined,
): Promise<JobEnd<RosterOutcome>> {
  const limitSeconds = options.workSeconds === null ? options.limitSeconds : countedLimitSeconds;
  return runJob<RosterOutcome>(
    { kind: 'roster', problem, options, lane },
    {
      limitSeconds,
      stop,
      onMessage: (message) => onMessage(message, lane.number),
      ports: lane.peer ? [lane.peer.port] : [],
    },
  );
}
