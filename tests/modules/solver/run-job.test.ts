import type { MessagePort } from 'node:worker_threads';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { SolvedRoster } from '@/modules/solver';
import type { SolverMessage, SolverTask } from '@/modules/solver/messages';
import { solverPool } from '@/modules/solver/pool';
import { solveLinear, solveRoster, solveSizing } from '@/modules/solver/server';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildPlainModel, plainModels } from './plain-models';

/*
 * What this side of a thread does when the thread does not answer, in place of a real one: the pool is a
 * stand-in whose job ends only when it is killed, or breaks.
 */
vi.mock('@/modules/solver/pool', () => ({ solverPool: vi.fn(), closeSolver: vi.fn() }));

const best: SolvedRoster = {
  roster: [{ personId: 'person-0', shiftIndex: 0, postSkillId: 'vet' }],
  shortageMinutes: 480,
  shortageBoundMinutes: 0,
  costCents: 100,
  boundCents: 80,
  gap: 0.2,
  levels: [480],
  boundRecord: null,
  recordedBoundCents: null,
};

/** A pool whose thread sends some messages and then computes until it is killed. */
function deafThread(
  messages: readonly SolverMessage[],
  onRun: (task: SolverTask) => void = () => {},
) {
  const run = (task: SolverTask, { signal }: { signal: AbortSignal }) =>
    new Promise((_, reject) => {
      signal.addEventListener('abort', () => reject(new Error('aborted')));
      for (const message of messages) post(task.port, message);
      onRun(task);
    });
  vi.mocked(solverPool).mockResolvedValue({ run } as never);
}

const post = (port: MessagePort, message: SolverMessage) => port.postMessage(message);
const delivered = () => new Promise((resolve) => setImmediate(() => setImmediate(resolve)));

beforeEach(() => {
  vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] });
});
afterEach(() => {
  vi.useRealTimers();
});

describe('a thread that does not answer a stop', () => {
  it('is told through the flag first and ended two seconds later; the best roster is kept', async () => {
    let flag = new Int32Array(new SharedArrayBuffer(4));
    deafThread([{ kind: 'started' }, { kind: 'roster', solved: best }], (task) => {
      flag = new Int32Array(task.stopFlag);
    });
    const stop = new AbortController();
    const rosters: unknown[] = [];
    const outcome = solveRoster(demoSizedProblem(), {
      limitSeconds: 60,
      lanes: 1,
      stop: stop.signal,
      onRoster: (roster) => rosters.push(roster),
    });
    await delivered();
    expect(flag[0]).toBe(0);
    stop.abort();
    expect(flag[0]).toBe(1);
    await vi.advanceTimersByTimeAsync(2000);
    expect(await outcome).toEqual({ kind: 'stopped', best });
    expect(rosters).toEqual([best.roster]);
  });

  it('leaves nothing when it had found nothing', async () => {
    deafThread([{ kind: 'started' }]);
    const stop = AbortSignal.abort();
    const given = { limitSeconds: 60, stop };
    const [plain] = plainModels;
    if (!plain) throw new Error('no model');
    const outcomes = Promise.all([
      solveRoster(demoSizedProblem(), { ...given, lanes: 1 }),
      solveSizing(
        { version: 1, cycleMinutes: 1440, objective: 'people', floors: [], patterns: [], caps: [] },
        given,
      ),
      solveLinear(buildPlainModel(plain), 'value', given),
    ]);
    await vi.advanceTimersByTimeAsync(2000);
    expect(await outcomes).toEqual([
      { kind: 'stopped', best: null },
      { kind: 'stopped' },
      { kind: 'interrupted', solution: null, bound: Number.NEGATIVE_INFINITY },
    ]);
  });
});

describe('a thread that overruns its time', () => {
  it('is ended three seconds after the limit, counted from its start; the best roster is kept', async () => {
    deafThread([{ kind: 'started' }, { kind: 'roster', solved: best }]);
    const outcome = solveRoster(demoSizedProblem(), { limitSeconds: 10, lanes: 1 });
    await delivered();
    await vi.advanceTimersByTimeAsync(13_000);
    expect(await outcome).toEqual({ kind: 'out-of-time', ...best });
  });

  it('is a failure with a sentence when it had found nothing', async () => {
    deafThread([{ kind: 'started' }]);
    const outcome = solveRoster(demoSizedProblem(), { limitSeconds: 10, lanes: 1 });
    await delivered();
    await vi.advanceTimersByTimeAsync(13_000);
    expect(await outcome).toEqual({
      kind: 'failed',
      message: 'The time was over before a first roster was found.',
    });
  });
});

describe('a listener that throws', () => {
  it('ends its own run as failed, with its cause, and nothing else', async () => {
    deafThread([{ kind: 'started' }, { kind: 'roster', solved: best }]);
    const cause = new Error('the disk is full');
    const onRoster = () => {
      throw cause;
    };
    const outcome = await solveRoster(demoSizedProblem(), { limitSeconds: 10, lanes: 1, onRoster });
    expect(outcome).toMatchObject({ kind: 'failed', cause });
  });
});

describe('a thread that breaks', () => {
  it('is a failure with a sentence for people and the cause for the log', async () => {
    const cause = new Error('worker exited');
    const run = () => Promise.reject(cause);
    vi.mocked(solverPool).mockResolvedValue({ run } as never);
    expect(await solveRoster(demoSizedProblem(), { limitSeconds: 10, lanes: 1 })).toEqual({
      kind: 'failed',
      message:
        'The solver broke off; run again, and with fewer people or days if it happens again.',
      cause,
    });
  });

  it('leaves the run to the other thread, whose answer counts', async () => {
    const answer = { kind: 'optimal', ...best } as const;
    const run = ({ job }: SolverTask) =>
      job.kind === 'roster' && job.lane.number === 0
        ? Promise.reject(new Error('worker exited'))
        : Promise.resolve(answer);
    vi.mocked(solverPool).mockResolvedValue({ run } as never);
    const given = { limitSeconds: 10, lanes: 2 } as const;
    expect(await solveRoster(demoSizedProblem(), given)).toEqual(answer);
  });

  it('does not matter to the run when it was only the one that searches along', async () => {
    const answer = { kind: 'optimal', ...best } as const;
    const run = ({ job }: SolverTask) =>
      job.kind === 'roster' && job.lane.number === 1
        ? Promise.reject(new Error('worker exited'))
        : Promise.resolve(answer);
    vi.mocked(solverPool).mockResolvedValue({ run } as never);
    const given = { limitSeconds: 10, lanes: 2 } as const;
    expect(await solveRoster(demoSizedProblem(), given)).toEqual(answer);
  });
});
