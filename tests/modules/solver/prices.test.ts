import { describe, expect, it } from 'vitest';
import { buildRosterModel } from '@/modules/model';
import type { Problem } from '@/modules/problem';
import { curveOfPeople } from '@/modules/solver/prices/curve-of-people';
import { curveOfFloors, priceFloors } from '@/modules/solver/prices/price-floors';
import { solveLevels } from '@/tests/support/level-by-level';
import { buildProblem } from '@/tests/support/problem-builder';
import { realTools } from './analysis-solver';

/** Least shortage and cost in whole shifts. */
function exact(problem: Problem): { shortage: number; cost: number } {
  const values = solveLevels(buildRosterModel(problem), (model, name) => {
    const outcome = realTools.solve(model, name, { limitSeconds: 30 });
    return outcome.kind === 'optimal' ? outcome.solution.objective : null;
  });
  if (!values) throw new Error('nobody has a line');
  return { shortage: values.length > 1 ? (values[0] ?? 0) : 0, cost: values.at(-1) ?? 0 };
}

const raised = (problem: Problem, floorId: string, dayIndex: number, by: number): Problem => ({
  ...problem,
  floors: problem.floors.map((floor) =>
    floor.floorId === floorId && floor.dayIndex === dayIndex
      ? { ...floor, people: Math.max(0, floor.people + by) }
      : floor,
  ),
});

/** Four nurses of whom two are dear, two shifts a day for five days; Nights carry a premium. */
const ward = buildProblem({
  dayCount: 5,
  kinds: [
    { id: 'Early', startMinute: 420, endMinute: 900 },
    { id: 'Night', startMinute: 1380, endMinute: 1860, isNight: true, nightMinutes: 420 },
  ],
  people: [
    { paidBy: 'hours', contractMinutes: 960, payCentsPerHour: 2000, maximumMinutes: 1920 },
    { paidBy: 'hours', contractMinutes: 960, payCentsPerHour: 2000, maximumMinutes: 1440 },
    { paidBy: 'hours', contractMinutes: 1440, payCentsPerHour: 3000, maximumMinutes: 2400 },
    { paidBy: 'hours', contractMinutes: 1440, payCentsPerHour: 3100, maximumMinutes: 2400 },
  ],
  rules: { longestRunDays: 3, longestRunNights: 2 },
  floors: [0, 1, 2, 3, 4].flatMap((day) => [
    { floorId: 'early', dayIndex: day, startMinute: day * 1440 + 420, endMinute: day * 1440 + 900 },
    {
      floorId: 'night',
      dayIndex: day,
      startMinute: day * 1440 + 1380,
      endMinute: day * 1440 + 1860,
    },
  ]),
});

describe('prices of floors', () => {
  it('equal the differences of whole rosters where the relaxation is exact', () => {
    const base = exact(ward);
    const questions = [0, 2, 4].flatMap((dayIndex) => [
      { floorId: 'early', dayIndex },
      { floorId: 'night', dayIndex },
    ]);
    const options = { limitSeconds: 30, bestCostCents: Math.round(base.cost) };
    const prices = priceFloors(realTools, ward, questions, options);
    expect(prices).toHaveLength(questions.length);
    for (const { floorId, dayIndex, oneMore, oneLess } of prices ?? []) {
      for (const [change, by] of [
        [oneMore, 1],
        [oneLess, -1],
      ] as const) {
        const other = exact(raised(ward, floorId, dayIndex ?? 0, by));
        expect(change.shortageMinutes).toBe(0);
        expect(change.costCents).toBeCloseTo(other.cost - base.cost, 0);
        expect(change.bracket?.leastCents).toBeLessThanOrEqual(change.costCents);
        expect(change.bracket?.mostCents).toBeGreaterThanOrEqual(change.costCents);
      }
    }
  });

  it('tell the shortage apart from the cost where one more cannot be there', () => {
    const problem = buildProblem({ floors: [{}] });
    const [price] =
      priceFloors(realTools, problem, [{ floorId: 'floor-1', dayIndex: 0 }], {
        limitSeconds: 30,
        bestCostCents: null,
      }) ?? [];
    expect(price?.oneMore).toEqual({ costCents: 0, bracket: null, shortageMinutes: 480 });
    expect(price?.oneLess).toMatchObject({ costCents: 0, shortageMinutes: 0 });
  });

  it('widen to the gap between the best roster and the relaxation', () => {
    const question = [{ floorId: 'early', dayIndex: 0 }];
    const best = Math.round(exact(ward).cost);
    const priced = (bestCostCents: number) =>
      priceFloors(realTools, ward, question, { limitSeconds: 30, bestCostCents })?.[0]?.oneMore;
    const [narrow, wide] = [priced(best), priced(best + 500)];
    expect(wide?.costCents).toBe(narrow?.costCents);
    expect((wide?.bracket?.mostCents ?? 0) - (narrow?.bracket?.mostCents ?? 0)).toBe(500);
  });
});

describe('staffing curves', () => {
  const family = [
    { floorId: 'early', dayIndex: null },
    { floorId: 'night', dayIndex: null },
  ];

  it('rise with the level of a family of floors and bound whole rosters', () => {
    const points = curveOfFloors(realTools, ward, family, [-1, 0, 1], 30) ?? [];
    expect(points.map(({ change }) => change)).toEqual([-1, 0, 1]);
    for (const { change, leastCostCents, leastShortageMinutes } of points) {
      const problem = {
        ...ward,
        floors: ward.floors.map((floor) => ({ ...floor, people: floor.people + change })),
      };
      const whole = exact(problem);
      expect(leastShortageMinutes).toBeLessThanOrEqual(whole.shortage);
      if (whole.shortage === leastShortageMinutes) {
        expect(leastCostCents).toBeLessThanOrEqual(whole.cost + 1e-6);
      }
    }
    expect(points[0]?.leastCostCents).toBe(0);
    expect(points[1]?.leastCostCents).toBeLessThan(points[2]?.leastCostCents ?? 0);
  });

  it('fall in shortage with every person more, and count no contract of those who are not there', () => {
    const lone = buildProblem({
      people: [{ contractMinutes: 480, maximumMinutes: 480, minimumMinutes: 480 }],
      floors: [{}, {}],
    });
    // Contracts of 200.00 each: nobody, one, two and three of them.
    expect(curveOfPeople(realTools, lone, 'ione', 2, 30)).toEqual([
      { change: -1, leastCostCents: 0, leastShortageMinutes: 960 },
      { change: 0, leastCostCents: 20_000, leastShortageMinutes: 480 },
      { change: 1, leastCostCents: 40_000, leastShortageMinutes: 0 },
      { change: 2, leastCostCents: 60_000, leastShortageMinutes: 0 },
    ]);
  });
});
