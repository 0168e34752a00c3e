import { describe, expect, it } from 'vitest';
import { niceTicks, plotGeometry } from '@/app/(supervisor)/runs/[runId]/plot-geometry';
import { gapOf, gapText } from '@/app/(supervisor)/runs/gap';
import type { RunEvent } from '@/modules/roster';

const frame = { width: 100, height: 100, left: 0, bottom: 0 };

function event(
  elapsedMs: number,
  bestCostCents: number | null,
  boundCents: number | null,
): RunEvent {
  return {
    sequence: elapsedMs,
    elapsedMs,
    stage: 2,
    shortageMinutes: 0,
    shortageBoundMinutes: 0,
    bestCostCents,
    boundCents,
  };
}

describe('the plot of a run', () => {
  it('is left out until both figures are there', () => {
    expect(plotGeometry([], frame)).toBeNull();
    expect(plotGeometry([event(1000, null, 900)], frame)).toBeNull();
  });

  it('runs each line on to the last report', () => {
    const plot = plotGeometry([event(1000, 2000, 1000), event(4000, 1500, 1000)], frame);
    expect(plot?.best).toMatch(/^M25\.0,8\.0 L100\.0,8\.0 L100\.0,54\.0/);
    expect(plot?.bound).toBe('M25.0,100.0 L100.0,100.0');
  });

  it('keeps every figure between the first and the last tick', () => {
    const plot = plotGeometry(
      [event(0, 10_342_000, 10_305_000), event(9000, 10_310_000, 10_306_000)],
      frame,
    );
    const cents = plot?.costTicks.map((tick) => tick.cents) ?? [];
    expect(cents[0]).toBeLessThanOrEqual(10_305_000);
    expect(cents.at(-1)).toBeGreaterThanOrEqual(10_342_000);
  });

  it.each([
    [0, 60, [0, 20, 40, 60]],
    [10_305, 10_342, [10_300, 10_310, 10_320, 10_330, 10_340, 10_350]],
    [5, 5, [5, 6]],
  ])('has round ticks from %i to %i', (from, to, ticks) => {
    expect(niceTicks(from, to)).toEqual(ticks);
  });
});

describe('the proven gap', () => {
  it('is the share of the cost that waiting can still save', () => {
    expect(gapOf({ bestCostCents: 10_342_000, boundCents: 10_305_000 })).toBeCloseTo(0.00358, 5);
    expect(gapOf({ bestCostCents: null, boundCents: 1 })).toBeNull();
    expect(gapOf({ bestCostCents: 100, boundCents: 101 })).toBe(0);
  });

  it('never reads as nothing while there is one', () => {
    expect(gapText(0)).toBe('0 %');
    expect(gapText(0.00358)).toBe('0.36 %');
    expect(gapText(0.00001)).toBe('under 0.01 %');
  });
});
