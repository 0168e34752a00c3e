import { type MessagePort, receiveMessageOnPort } from 'node:worker_threads';
import type { BoundRecord } from '../../problem';

/** What two lanes of one run tell each other. */
export type PeerMessage =
  | { readonly kind: 'roster'; readonly columns: Int32Array }
  | { readonly kind: 'worth'; readonly worth: Float64Array }
  | { readonly kind: 'level-bound'; readonly level: number; readonly value: number }
  | {
      readonly kind: 'cost-bound';
      readonly bound: {
        readonly cents: number;
        readonly most: readonly number[];
        readonly record: BoundRecord | null;
      };
    };

/**
 * The line to the other lane. A lane computes without pause, so it fetches messages itself. By the clock
 * it takes what has come. By work it waits at each call until the other lane has made as many calls, so
 * that both see the same messages at the same steps of every repetition.
 */
export interface PeerLink {
  tell(message: PeerMessage): void;
  fetch(): PeerMessage[];
  end(): void;
}

/** A lane that runs alone. */
export const noPeer: PeerLink = {
  tell: () => undefined,
  fetch: () => [],
  end: () => undefined,
};

type Wire = PeerMessage | { readonly kind: 'step' };

/** Milliseconds between two looks at whether the run was stopped while waiting. */
const waitSlice = 20;

/**
 * Links two lanes by one port each and one shared counter array: how many steps each has made; -1 once it
 * has ended.
 */
export function linkPeer(
  port: MessagePort,
  steps: SharedArrayBuffer,
  lane: 0 | 1,
  isCounted: boolean,
  shouldStop: () => boolean,
): PeerLink {
  const counters = new Int32Array(steps);
  const other = 1 - lane;
  let own = 0;
  const drain = (untilStep: boolean): PeerMessage[] => {
    const messages: PeerMessage[] = [];
    for (;;) {
      const received: { message: Wire } | undefined = receiveMessageOnPort(port);
      if (!received) return messages;
      if (received.message.kind === 'step') {
        if (untilStep) return messages;
      } else messages.push(received.message);
    }
  };
  return {
    tell: (message) => port.postMessage(message),
    fetch: () => {
      if (!isCounted) return drain(false);
      own += 1;
      port.postMessage({ kind: 'step' });
      Atomics.store(counters, lane, own);
      Atomics.notify(counters, lane);
      for (;;) {
        const reached = Atomics.load(counters, other);
        if (reached < 0 || reached >= own || shouldStop()) return drain(true);
        Atomics.wait(counters, other, reached, waitSlice);
      }
    },
    end: () => {
      Atomics.store(counters, lane, -1);
      Atomics.notify(counters, lane);
      port.close();
    },
  };
}
