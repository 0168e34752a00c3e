import { afterAll, describe, expect, it } from 'vitest';
import type { SizingCap, SizingFloor, SizingPattern, SizingProblem } from '@/modules/problem';
import { proveSizing } from '@/modules/proof';
import { closeSolver, solveSizing } from '@/modules/solver/server';

afterAll(closeSolver);

const day = 1440;

async function size(problem: SizingProblem) {
  const outcome = await solveSizing(problem, { limitSeconds: 30 });
  if (outcome.kind !== 'answered') throw new Error(`ended as ${outcome.kind}`);
  const { objective, shortageMinutes, shortages } = outcome.answer;
  const proof = proveSizing(problem, outcome.answer.people);
  expect(proof).toEqual({ objective, shortageMinutes, shortages, capsHold: true });
  return outcome.answer;
}

const floorOf = (
  index: number,
  startMinute: number,
  endMinute: number,
  people: number,
): SizingFloor => ({
  floorId: `floor-${index}`,
  weekday: Math.floor(startMinute / day),
  label: `Floor ${index}`,
  skillId: null,
  startMinute,
  endMinute,
  people,
});

const patternOf = (
  index: number,
  costCents: number,
  duties: SizingPattern['duties'],
): SizingPattern => ({
  id: `pattern-${index}`,
  lineId: 'all',
  label: `Pattern ${index}`,
  skillId: null,
  duties,
  costCents,
});

/** Winston, Operations Research, 4th ed., 3.5 "post office": five days on, two off, 9 to 17 o'clock. */
const postOffice = (needs: readonly number[], caps: SizingCap[] = []): SizingProblem => ({
  version: 1,
  cycleMinutes: 10080,
  objective: 'people',
  floors: needs.map((people, index) =>
    floorOf(index, index * day + 540, index * day + 1020, people),
  ),
  patterns: needs.map((_, first) =>
    patternOf(
      first,
      0,
      [0, 1, 2, 3, 4].map((step) => {
        const startMinute = ((first + step) % 7) * day + 540;
        return { startMinute, endMinute: startMinute + 480 };
      }),
    ),
  ),
  caps,
});

const needs = [17, 13, 15, 19, 14, 16, 11];
const atMost = (people: number): SizingCap[] => [
  { label: `At most ${people}`, lineIds: ['all'], limit: { people } },
];

describe('five days on and two off', () => {
  it('takes 23 people for the post office, and the relaxation 22 1/3', async () => {
    const answer = await size(postOffice(needs));
    expect(answer).toMatchObject({
      objective: 23,
      provenBound: 23,
      isProven: true,
      floorsHold: true,
    });
    expect(answer.linearBound).toBeCloseTo(67 / 3, 6);
    // The dual solution 1/3 on Mon, Wed, Thu and Sat proves 67/3.
    const prices = answer.floorPrices.map(({ price }) => price);
    expect(prices.reduce((sum, price, index) => sum + price * (needs[index] ?? 0), 0)).toBeCloseTo(
      67 / 3,
      6,
    );
  });

  it.each([
    [23, 0],
    [22, 1],
    [21, 4],
    [20, 7],
  ])('with at most %d people is short of %d person-days at least', async (people, missing) => {
    const answer = await size(postOffice(needs, atMost(people)));
    expect(answer).toMatchObject({
      floorsHold: missing === 0,
      shortageMinutes: missing * 480,
      objective: people,
      isProven: true,
    });
  });

  it('keeps a limit in percent of everybody', async () => {
    const problem = postOffice(needs);
    const patterns = problem.patterns.map((pattern, index) =>
      index === 0 ? { ...pattern, lineId: 'monday' } : pattern,
    );
    const caps = [{ label: 'Mondays', lineIds: ['monday'], limit: { percentOfAll: 0 } }];
    const answer = await size({ ...problem, patterns, caps });
    expect(answer.people.some(({ patternId }) => patternId === 'pattern-0')).toBe(false);
    expect(answer.floorsHold).toBe(true);
  });
});

describe('a day of overlapping shifts', () => {
  /** Hillier & Lieberman, Introduction to Operations Research, 3.4 "Union Airways"; its duals are unique. */
  it('costs 30,610 at the airline desk, with its five counts and ten floor prices', async () => {
    const hours = [
      [6, 8],
      [8, 10],
      [10, 12],
      [12, 14],
      [14, 16],
      [16, 18],
      [18, 20],
      [20, 22],
      [22, 24],
      [0, 6],
    ];
    const asked = [48, 79, 65, 87, 64, 73, 82, 43, 52, 15];
    const shifts = [
      [6, 14, 170],
      [8, 16, 160],
      [12, 20, 175],
      [16, 24, 180],
      [22, 30, 195],
    ];
    const answer = await size({
      version: 1,
      cycleMinutes: 1440,
      objective: 'pay',
      floors: hours.map(([from = 0, to = 0], index) =>
        floorOf(index, from * 60, to * 60, asked[index] ?? 0),
      ),
      patterns: shifts.map(([from = 0, to = 0, cost = 0], index) =>
        patternOf(index, cost, [{ startMinute: from * 60, endMinute: to * 60 }]),
      ),
      caps: [],
    });
    expect(answer).toMatchObject({ objective: 30_610, provenBound: 30_610, isProven: true });
    expect(answer.people.map(({ count }) => count)).toEqual([48, 31, 39, 43, 15]);
    const prices = answer.floorPrices.map(({ price }) => Math.round(price * 1e6) / 1e6);
    expect(prices).toEqual([10, 160, 0, 0, 0, 0, 175, 5, 0, 195]);
  });

  /** Taha, Operations Research: An Introduction, "bus scheduling": runs of 8 h that begin every 4 h. */
  it('takes 26 buses, at prices 1 0 1 0 1 0', async () => {
    const asked = [4, 8, 10, 7, 12, 4];
    const starts = asked.map((_, index) => index * 240);
    const answer = await size({
      version: 1,
      cycleMinutes: 1440,
      objective: 'people',
      floors: starts.map((start, index) => floorOf(index, start, start + 240, asked[index] ?? 0)),
      patterns: starts.map((start, index) =>
        patternOf(index, 0, [{ startMinute: start, endMinute: start + 480 }]),
      ),
      caps: [],
    });
    expect(answer).toMatchObject({ objective: 26, linearBound: 26, isProven: true });
    expect(answer.floorPrices.map(({ price }) => price)).toEqual([1, 0, 1, 0, 1, 0]);
  });

  it('counts only the skill a floor asks for, anybody where it asks for none, and round midnight', async () => {
    const night = [{ startMinute: 1320, endMinute: 1800 }];
    const answer = await size({
      version: 1,
      cycleMinutes: 1440,
      objective: 'pay',
      floors: [
        { ...floorOf(0, 1320, 1800, 1), skillId: 'nurse' },
        floorOf(1, 0, 360, 3),
        floorOf(2, 600, 700, 0),
      ],
      patterns: [
        { ...patternOf(0, 100, night), skillId: 'nurse' },
        { ...patternOf(1, 60, night), skillId: 'desk' },
      ],
      caps: [],
    });
    expect(answer.people).toEqual([
      { patternId: 'pattern-0', count: 1 },
      { patternId: 'pattern-1', count: 2 },
    ]);
    expect(answer.floorPrices.map(({ price }) => price)).toEqual([40, 60, 0]);
  });

  it('says where nobody can cover: people missing at once, and their minutes', async () => {
    const answer = await size({
      version: 1,
      cycleMinutes: 1440,
      objective: 'people',
      floors: [floorOf(0, 420, 1020, 2)],
      patterns: [patternOf(0, 0, [{ startMinute: 420, endMinute: 900 }])],
      caps: [],
    });
    expect(answer).toMatchObject({ floorsHold: false, shortageMinutes: 240, objective: 2 });
    expect(answer.shortages).toMatchObject([{ floorId: 'floor-0', people: 2, minutes: 240 }]);
  });
});

it('ends out of time without an answer when there is no time', async () => {
  expect(await solveSizing(postOffice(needs), { limitSeconds: 0 })).toEqual({
    kind: 'out-of-time',
  });
});
