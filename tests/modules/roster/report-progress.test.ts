import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { RunEvent } from '@/modules/roster';
import { reportProgress } from '@/modules/roster/report-progress';

const kept = vi.hoisted(() => ({ events: [] as RunEvent[] }));
vi.mock('@/modules/roster/store', () => ({
  findNewestRunEvent: () => kept.events.at(-1) ?? null,
  insertRunEvent: (_: string, event: RunEvent) => void kept.events.push(event),
}));

beforeEach(() => {
  kept.events = [];
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

const event = (bestCostCents: number) => ({
  elapsedMs: 0,
  stage: 2 as const,
  shortageMinutes: 0,
  shortageBoundMinutes: 0,
  bestCostCents,
  boundCents: null,
});
const costs = () => kept.events.map(({ bestCostCents }) => bestCostCents);

test('the first report goes through at once, of a burst only the newest follows', () => {
  const { report, flush } = reportProgress('run_1', () => {});
  for (let cost = 100; cost > 0; cost -= 1) report(event(cost));
  expect(costs()).toEqual([100]);
  vi.advanceTimersByTime(200);
  expect(costs()).toEqual([100, 1]);
  flush();
  expect(costs()).toEqual([100, 1]);
});

test('at most five reports a second are stored', () => {
  const { report, flush } = reportProgress('run_1', () => {});
  for (let step = 0; step < 300; step += 1) {
    report(event(1000 - step));
    vi.advanceTimersByTime(10);
  }
  flush();
  // Three seconds: one at once and one every 200 ms.
  expect(kept.events.length).toBeLessThanOrEqual(16);
  expect(kept.events.length).toBeGreaterThan(13);
});

test('what was held back is stored at the end and nothing comes after', () => {
  const told: number[] = [];
  const { report, flush } = reportProgress('run_1', ({ sequence }) => void told.push(sequence));
  report(event(2));
  report(event(1));
  flush();
  expect(costs()).toEqual([2, 1]);
  expect(told).toEqual([1, 2]);
  expect(vi.getTimerCount()).toBe(0);
});
