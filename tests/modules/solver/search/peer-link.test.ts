import { MessageChannel, Worker } from 'node:worker_threads';
import { afterEach, describe, expect, it } from 'vitest';
import { linkPeer, type PeerMessage } from '@/modules/solver/search/peer-link';

/**
 * The other lane, as a thread that speaks the same protocol: before each of its steps it waits a moment and
 * tells the bounds of that step. Then it ends.
 */
const otherLane = `
const { workerData } = require('node:worker_threads');
const { port, steps, told, wait } = workerData;
const counters = new Int32Array(steps);
told.forEach((values, index) => {
  Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, wait);
  for (const value of values) port.postMessage({ kind: 'level-bound', level: 0, value });
  port.postMessage({ kind: 'step' });
  Atomics.store(counters, 1, index + 1);
  Atomics.notify(counters, 1);
});
for (const value of workerData.last) port.postMessage({ kind: 'level-bound', level: 0, value });
Atomics.store(counters, 1, -1);
Atomics.notify(counters, 1);
setInterval(() => undefined, 1000);
`;

const workers: Worker[] = [];
afterEach(async () => {
  await Promise.all(workers.splice(0).map((worker) => worker.terminate()));
});

interface Other {
  readonly told: readonly (readonly number[])[];
  readonly last?: readonly number[];
  readonly wait: number;
}

/** This side of a link to such a lane. */
function linkTo({ told, last = [], wait }: Other, isCounted: boolean, shouldStop = () => false) {
  const { port1, port2 } = new MessageChannel();
  const steps = new SharedArrayBuffer(2 * Int32Array.BYTES_PER_ELEMENT);
  const workerData = { port: port2, steps, told, last, wait };
  workers.push(new Worker(otherLane, { eval: true, workerData, transferList: [port2] }));
  return { link: linkPeer(port1, steps, 0, isCounted, shouldStop), steps };
}

const boundsIn = (messages: readonly PeerMessage[]): number[] =>
  messages.map((message) => (message.kind === 'level-bound' ? message.value : Number.NaN));

describe('a link that counts steps', () => {
  it.each([0, 60])(
    'gives at each step what the other lane told before that step, %i ms each',
    (wait) => {
      const { link } = linkTo({ told: [[1], [], [2, 3]], last: [4], wait }, true);
      const steps = [link.fetch(), link.fetch(), link.fetch(), link.fetch(), link.fetch()];
      expect(steps.map(boundsIn)).toEqual([[1], [], [2, 3], [4], []]);
      link.end();
    },
  );

  it('does not wait for a lane that ends, nor once it is to stop', () => {
    const stopped = linkTo({ told: [[1]], wait: 5000 }, true, () => true);
    const startedAt = performance.now();
    expect(boundsIn(stopped.link.fetch())).toEqual([]);
    expect(performance.now() - startedAt).toBeLessThan(2000);
    stopped.link.end();
    expect(new Int32Array(stopped.steps)[0]).toBe(-1);
  });
});

describe('a link that goes by the clock', () => {
  it('gives what has come by then, and never waits', async () => {
    const { link } = linkTo({ told: [[1], [2]], wait: 0 }, false);
    const found: number[] = [];
    const until = performance.now() + 10_000;
    while (found.length < 2 && performance.now() < until) {
      found.push(...boundsIn(link.fetch()));
      await new Promise((resolve) => setTimeout(resolve, 5));
    }
    expect(found).toEqual([1, 2]);
    expect(link.fetch()).toEqual([]);
    link.end();
  });
});
