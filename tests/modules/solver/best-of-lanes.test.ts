import { describe, expect, it } from 'vitest';
import type { RosterOutcome, SolvedRoster } from '@/modules/solver';
import { BestOfLanes } from '@/modules/solver/best-of-lanes';

/** A roster with these levels, cost and bound; its one shift tells it apart. */
function rosterOf(
  shiftIndex: number,
  levels: number[],
  costCents: number,
  boundCents = 0,
): SolvedRoster {
  return {
    roster: [{ personId: 'ione', shiftIndex, postSkillId: 'nurse' }],
    shortageMinutes: levels[0] ?? 0,
    shortageBoundMinutes: 0,
    costCents,
    boundCents,
    gap: (costCents - boundCents) / costCents,
    levels,
    boundRecord: null,
    recordedBoundCents: null,
  };
}

const bestOf = (...told: SolvedRoster[]): BestOfLanes => {
  const best = new BestOfLanes();
  for (const solved of told) best.take(solved);
  return best;
};

describe('the best roster of two lanes', () => {
  it('is the one with the better levels, then the lower cost; equal ones are not told twice', () => {
    const best = new BestOfLanes();
    const short = rosterOf(1, [480, 0], 100);
    const dear = rosterOf(2, [0, 60], 900);
    const cheap = rosterOf(3, [0, 60], 800);
    const told = [short, dear, short, cheap, cheap, dear].map((solved) => best.take(solved));
    expect(told).toEqual([true, true, false, true, false, false]);
    expect(best.solved).toBe(cheap);
  });

  it('takes the place of a worse one that the other lane ends with, whose bounds it keeps', () => {
    const best = bestOf(rosterOf(1, [0], 800, 100));
    const worse = rosterOf(2, [0], 1000, 700);
    const outcome: RosterOutcome = { kind: 'out-of-time', ...worse };
    const expected = { ...worse, roster: best.solved?.roster, costCents: 800, gap: 1 / 8 };
    expect(best.complete(outcome)).toEqual({ kind: 'out-of-time', ...expected });
    expect(best.complete({ kind: 'stopped', best: worse })).toEqual({
      kind: 'stopped',
      best: expected,
    });
    expect(best.complete({ kind: 'stopped', best: null })).toEqual({
      kind: 'stopped',
      best: best.solved,
    });
  });

  it('has no bound above its own cost, and none of a roster with other levels', () => {
    const best = bestOf(rosterOf(1, [0], 650, 100));
    const kept = best.complete({ kind: 'optimal', ...rosterOf(2, [0], 651, 651) });
    expect(kept).toMatchObject({ kind: 'optimal', costCents: 650, boundCents: 650, gap: 0 });
    const other = best.complete({ kind: 'out-of-time', ...rosterOf(2, [60], 400, 300) });
    expect(other).toEqual({ kind: 'out-of-time', ...best.solved });
  });

  it('changes nothing when the outcome is as good, or no roster at all', () => {
    const best = bestOf(rosterOf(1, [60], 800, 100));
    const better: RosterOutcome = { kind: 'good-enough', ...rosterOf(2, [0], 900, 800) };
    const failed: RosterOutcome = { kind: 'failed', message: 'no' };
    expect(best.complete(better)).toBe(better);
    expect(best.complete(failed)).toBe(failed);
    expect(bestOf().complete(better)).toBe(better);
  });
});
