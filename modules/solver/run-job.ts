import { MessageChannel, type MessagePort } from 'node:worker_threads';
import type { SolverJob, SolverMessage, ThreadTask } from './messages';
import { solverPool } from './pool';
import { workerFile } from './worker-file';

/** A thread that does not answer a stop is ended after this; its best roster is already here. */
const hardStopAfterMs = 2000;
/** And one that overruns its time limit, after this. */
const overrunMs = 3000;

export interface JobOptions {
  readonly limitSeconds: number;
  readonly stop?: AbortSignal | undefined;
  readonly onMessage?: (message: SolverMessage) => void;
  /** Ports of the job itself. */
  readonly ports?: readonly MessagePort[];
}

/** How a job ended on this side: with an answer, by force, or because its thread broke. */
export type JobEnd<T> =
  | { readonly kind: 'answered'; readonly answer: T }
  | { readonly kind: 'killed'; readonly wasStopped: boolean }
  | { readonly kind: 'broken'; readonly cause: unknown };

/** Runs a job in a solver thread. The event loop stays free; never rejects. */
export const runJob = <T>(job: SolverJob, options: JobOptions): Promise<JobEnd<T>> =>
  runInThread<T>('solver', job, options);

/**
 * Runs other heavy work in a solver thread, by the worker of that name: it is given a `ThreadTask`, posts
 * `started` on its port and returns the answer. It is ended soon after a stop or its limit, which counts
 * from its start. The event loop stays free; never rejects.
 */
export async function runInThread<T>(
  worker: string,
  job: unknown,
  options: JobOptions,
): Promise<JobEnd<T>> {
  const kill = new AbortController();
  const line = openLine(options, kill);
  try {
    const task: ThreadTask<unknown> = { job, port: line.port, stopFlag: line.stopFlag };
    const pool = await solverPool();
    const given = {
      filename: workerFile(worker),
      transferList: [line.port, ...(options.ports ?? [])],
      signal: kill.signal,
    };
    return { kind: 'answered', answer: await pool.run(task, given) };
  } catch (cause) {
    const [fault] = line.faults;
    if (fault || !kill.signal.aborted) return { kind: 'broken', cause: fault ?? cause };
    return { kind: 'killed', wasStopped: options.stop?.aborted ?? false };
  } finally {
    line.close();
  }
}

/** What connects a job with its thread: messages out, the stop flag in, and the time it is given. */
function openLine({ limitSeconds, stop, onMessage }: JobOptions, kill: AbortController) {
  const { port1, port2 } = new MessageChannel();
  const stopFlag = new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT);
  const timers: NodeJS.Timeout[] = [];
  const faults: unknown[] = [];
  const killAfter = (ms: number) => timers.push(setTimeout(() => kill.abort(), ms));
  const requestStop = () => {
    Atomics.store(new Int32Array(stopFlag), 0, 1);
    killAfter(hardStopAfterMs);
  };
  port1.on('message', (message: SolverMessage) => {
    if (message.kind === 'started') killAfter(limitSeconds * 1000 + overrunMs);
    try {
      onMessage?.(message);
    } catch (cause) {
      // A listener that throws here would end the whole process: it ends the job instead.
      faults.push(cause);
      kill.abort();
    }
  });
  if (stop?.aborted) requestStop();
  stop?.addEventListener('abort', requestStop, { once: true });
  const close = () => {
    stop?.removeEventListener('abort', requestStop);
    for (const timer of timers) clearTimeout(timer);
    port1.close();
  };
  return { port: port2, stopFlag, faults, close };
}
