import { describe, expect, it } from 'vitest';
import { buildRosterModel } from '@/modules/model';
import type { Problem } from '@/modules/problem';
import { findKnots } from '@/modules/solver/knots/find-knots';
import { loosened } from '@/modules/solver/knots/plan-ways';
import type { WayOut, WaysOutOptions } from '@/modules/solver/knots/way-out';
import { waysOut } from '@/modules/solver/knots/ways-out';
import { searchWith } from '@/modules/solver/run-analysis';
import { solveLevels } from '@/tests/support/level-by-level';
import { buildProblem } from '@/tests/support/problem-builder';
import { realTools } from './analysis-solver';

/** Least shortage and cost in whole shifts, by another way than the search. */
function exact(problem: Problem): { shortage: number; cost: number } {
  const model = buildRosterModel(problem);
  const values = solveLevels(model, (linear, name) => {
    const outcome = realTools.solve(linear, name, { limitSeconds: 30 });
    return outcome.kind === 'optimal' ? outcome.solution.objective : null;
  });
  if (!values) throw new Error('nobody has a line');
  const shortage = model.levels.length > 0 ? (values[0] ?? 0) : 0;
  return { shortage, cost: values.at(-1) ?? 0 };
}

function ways(problem: Problem, options: Partial<WaysOutOptions> = {}) {
  const { knots } = findKnots(realTools, problem, {
    limitSeconds: 20,
    mostKnots: 3,
    shortAtMinutes: [],
  });
  const { shortage, cost } = exact(problem);
  const today = { roster: [], shortageMinutes: shortage, costCents: cost };
  const given = { limitSeconds: 12, today, mostWays: 12, triesLawBased: false, ...options };
  const found = waysOut(realTools, searchWith(realTools), problem, knots[0]?.members ?? [], given);
  return { knots, found, today };
}

const at = (day: number, start: number, floorId: string, people = 1) => ({
  floorId,
  dayIndex: day,
  startMinute: day * 1440 + start,
  endMinute: day * 1440 + start + 480,
  people,
});

/** Two nurses for a Late of two and an Early of one on the day after; the second is away then. */
const tight = buildProblem({
  people: [
    { paidBy: 'hours' },
    {
      paidBy: 'hours',
      payCentsPerHour: 3000,
      absences: [{ startMinute: 2880, endMinute: 4320, reason: 'Leave' }],
    },
  ],
  floors: [at(1, 900, 'late'), at(2, 420, 'early', 2)],
});

function expectExact(
  problem: Problem,
  way: WayOut,
  today: { shortageMinutes: number; costCents: number },
) {
  const { effect } = way;
  if (!effect) throw new Error('not tried');
  const { shortage, cost } = exact(loosened(problem, way));
  expect(effect.isProven).toBe(true);
  expect(effect.shortageMinutes).toEqual({ least: shortage, most: shortage });
  expect(effect.costCents.most).toBeCloseTo(cost, 0);
  expect(effect.shortageChangeMinutes.most).toBe(shortage - today.shortageMinutes);
  expect(effect.costChangeCents.most).toBeCloseTo(cost - today.costCents, 0);
}

describe('ways out', () => {
  it('are solved anew, each to the same figures as the loosened problem by itself', () => {
    const { found, today } = ways(tight);
    expect(found.length).toBeGreaterThan(1);
    for (const way of found) expectExact(tight, way, today);
  });

  it('mark what asks a person, and leave law-based limits alone unless told', () => {
    const { found } = ways(tight);
    const leave = found.find(({ changes }) => changes[0]?.kind === 'absence');
    expect(leave).toMatchObject({ asksPerson: true, words: ["Person 2's leave 3 Feb"] });
    expect(found.every(({ changes }) => changes.every((one) => one.kind !== 'limit'))).toBe(true);
    const late = buildProblem({ floors: [at(0, 900, 'late'), at(1, 420, 'early')] });
    const isRest = ({ changes }: WayOut) => changes.some(({ kind }) => kind === 'limit');
    expect(ways(late).found.some(isRest)).toBe(false);
    expect(ways(late, { triesLawBased: true }).found.some(isRest)).toBe(true);
  });

  it('come in pairs when no single step undoes the knot, beside whole floors', () => {
    // Three Lates and then two Earlies for three nurses: two people too many, wherever they are taken off.
    const person = { paidBy: 'hours' as const };
    const problem = buildProblem({
      people: [person, person, person],
      floors: [at(0, 900, 'late', 3), at(1, 420, 'early', 2)],
    });
    const { found, today } = ways(problem);
    const told = found.map(({ words, size, undoesKnot }) => [
      words.join(' and '),
      size,
      undoesKnot,
    ]);
    const [late, early] = ['Nurse Late on Mon 1 Feb needs 3', 'Nurse Early on Tue 2 Feb needs 2'];
    expect(told).toEqual([
      [late, 'dropped', true],
      [early, 'dropped', true],
      [`${late} and ${early}`, 'step', true],
      [late, 'step', false],
      [early, 'step', false],
    ]);
    for (const way of found) expectExact(problem, way, today);
  });

  it('say so when there was no time to try them', () => {
    const { found } = ways(tight, { limitSeconds: 0 });
    expect(found.every(({ effect, undoesKnot }) => effect === null && undoesKnot === null)).toBe(
      true,
    );
  });
});
