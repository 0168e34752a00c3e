import type { UtcMilliseconds } from '../units';

/** After so many tries a mail is given up and kept as failed. */
export const mostTries = 8;

const firstWaitMs = 60_000;
const longestWaitMs = 24 * 3_600_000;

/**
 * When to try again after `tries` failed tries (1 or more): one minute, then four times as long each
 * time, at most a day. The eight tries span about two days, so that a weekend without a mail server
 * is mostly bridged. `nextTryAt(3, 0)` is 960000, 16 minutes.
 */
export function nextTryAt(tries: number, atUtc: UtcMilliseconds): UtcMilliseconds {
  return atUtc + Math.min(longestWaitMs, firstWaitMs * 4 ** (tries - 1));
}
