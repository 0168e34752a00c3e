import { describe, expect, it } from 'vitest';
import { paceByClock, paceByWork } from '@/modules/solver/search/pace';

describe('the pace of a search', () => {
  it('by the clock: seconds since the search began, whatever is counted', () => {
    let now = 5000;
    const pace = paceByClock(() => now, 10);
    pace.countArcs(1e12);
    pace.countSolve(1e6, 1e6);
    now += 2500;
    expect([pace.elapsed(), pace.remaining(), pace.isCounted]).toEqual([2.5, 7.5, false]);
  });

  it('by work: the same for the same work, more for more of it', () => {
    const spend = (arcs: number, iterations: number) => {
      const pace = paceByWork(100);
      pace.countArcs(arcs);
      pace.countSolve(1000, iterations);
      expect(pace.elapsed() + pace.remaining()).toBeCloseTo(100, 9);
      return pace.elapsed();
    };
    expect(spend(1e8, 1e4)).toBe(spend(1e8, 1e4));
    expect(spend(2e8, 1e4)).toBeGreaterThan(spend(1e8, 1e4));
    expect(spend(1e8, 2e4)).toBeGreaterThan(spend(1e8, 1e4));
  });

  it('by work: goes on even when a step finds nothing to do', () => {
    const pace = paceByWork(1);
    for (let step = 0; step < 100_000 && pace.remaining() > 0; step += 1) {
      pace.countArcs(0);
      pace.countSolve(0, 0);
    }
    expect(pace.remaining()).toBeLessThanOrEqual(0);
  });
});
