import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { proveRoster } from '@/modules/proof';
import type { Ground } from '@/modules/solver/search/first-roster';
import { buildProblem, houseKinds } from '@/tests/support/problem-builder';
import {
  annealFor,
  anyProblem,
  blendAt,
  layGround,
  recounted,
  roomFor,
  rosterOf,
} from './any-ground';

/** The running figures against those of the same lines reckoned from nothing, and against the model. */
function compareFigures(ground: Ground) {
  const { lines, offset } = ground;
  const fresh = recounted(ground);
  expect(lines.values).toEqual(fresh.values);
  expect(lines.nodes).toEqual(fresh.nodes);
  const room = roomFor(lines.total, fresh.total);
  expect(Math.abs(lines.total - fresh.total)).toBeLessThanOrEqual(room);
  lines.gains.forEach((gain, row) => {
    expect(Math.abs(gain - (fresh.gains[row] ?? 0))).toBeLessThanOrEqual(room);
  });
  const blend = blendAt(ground);
  expect(Math.abs(lines.total + offset - blend)).toBeLessThanOrEqual(roomFor(blend));
}

const anySeed = fc.nat(1_000_000);

describe('lines that are annealed', () => {
  it('count what they cost as the model does, after hundreds of moves', () => {
    let laid = 0;
    let bests = 0;
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        laid += 1;
        compareFigures(ground);
        const report = annealFor(ground, 4, seed, () => {
          bests += 1;
          compareFigures(ground);
        });
        expect(report.moves).toBe(4 * 64);
        compareFigures(ground);
        expect(Math.abs(ground.lines.total - report.best)).toBeLessThanOrEqual(
          roomFor(report.best),
        );
      }),
      { numRuns: 60 },
    );
    expect(laid).toBeGreaterThan(20);
    expect(bests).toBeGreaterThan(laid);
  });

  it('leave a budget to the model where overtime is paid out of it', () => {
    // Contract pay of 40.00 an hour: overtime is one whole coin a minute, and no shift has a price.
    const problem = buildProblem({
      kinds: houseKinds.slice(0, 1),
      people: [{ payCentsPerHour: 4000, contractMinutes: 960 }],
      pay: { overtimeSteps: [{ overMinutes: 0, percent: 150 }] },
      floors: [0, 1, 2, 3].map((day) => ({
        startMinute: day * 1440 + 420,
        endMinute: day * 1440 + 900,
      })),
      teamRules: [{ id: 'b', name: 'Budget', kind: 'budget', priceCents: 1, mostCents: 70_000 }],
    });
    const ground = layGround(problem, 1);
    if (!ground) throw new Error('nobody is laid');
    compareFigures(ground);
    annealFor(ground, 2, 1);
    compareFigures(ground);
    expect(proveRoster(problem, rosterOf(ground)).overtimeMinutes).toBeGreaterThan(0);
  });

  it('break no rule of any person, whatever the moves', () => {
    let laid = 0;
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        laid += 1;
        const prove = () => {
          const { breaches } = proveRoster(problem, rosterOf(ground));
          expect(breaches.filter(({ rule }) => rule !== 'teamRules')).toEqual([]);
        };
        prove();
        annealFor(ground, 4, seed, prove);
        prove();
      }),
      { numRuns: 60 },
    );
    expect(laid).toBeGreaterThan(20);
  });

  it('end with the best roster there was, and never with a worse one than the first', () => {
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        let best = ground.lines.total;
        annealFor(ground, 6, seed, () => {
          best = Math.min(best, ground.lines.total);
        });
        expect(ground.lines.total).toBeLessThanOrEqual(best + roomFor(best));
      }),
      { numRuns: 40 },
    );
  });

  it('are the same for the same seed', () => {
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const [one, other] = [layGround(problem, seed), layGround(problem, seed)];
        if (!one || !other) return;
        annealFor(one, 3, seed);
        annealFor(other, 3, seed);
        expect(one.lines.cells).toEqual(other.lines.cells);
        expect(one.refill.work).toBe(other.refill.work);
      }),
      { numRuns: 20 },
    );
  });
});
