import { afterAll, describe, expect, it } from 'vitest';
import {
  closeSolver,
  estimateFloorCurve,
  estimatePeopleCurve,
  estimatePrices,
  solveKnots,
  solveMending,
  solveWaysOut,
} from '@/modules/solver/server';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildProblem } from '@/tests/support/problem-builder';

afterAll(closeSolver);

const small = buildProblem({
  people: [{}, {}],
  floors: [{ floorId: 'early' }, { floorId: 'two', people: 2, startMinute: 900, endMinute: 1380 }],
});
const roster = [
  { personId: 'ione', shiftIndex: 0, postSkillId: 'nurse' },
  { personId: 'person-2', shiftIndex: 2, postSkillId: 'nurse' },
];
const knotOptions = { limitSeconds: 20, mostKnots: 3, shortAtMinutes: [] };

describe('analyses in a solver thread', () => {
  it('find knots and ways out of them, told one by one', async () => {
    const knots = await solveKnots(small, knotOptions);
    if (knots.kind !== 'answered') throw new Error(knots.kind);
    const [knot] = knots.answer.knots;
    expect(knot).toMatchObject({ isMinimal: true });
    const told: string[][] = [];
    const ways = await solveWaysOut(small, knot?.members ?? [], {
      limitSeconds: 20,
      today: { roster, shortageMinutes: 480, costCents: 160_000 },
      mostWays: 5,
      triesLawBased: false,
      onWayOut: ({ words }) => told.push([...words]),
    });
    if (ways.kind !== 'answered') throw new Error(ways.kind);
    expect(ways.answer.map(({ words }) => words)).toEqual(told);
    expect(ways.answer[0]?.effect).toMatchObject({
      shortageChangeMinutes: { least: -480, most: -480 },
    });
  });

  it('estimate prices and curves', async () => {
    const question = { floorId: 'early', dayIndex: 0 };
    const prices = await estimatePrices(small, [question], {
      limitSeconds: 20,
      bestCostCents: null,
    });
    expect(prices).toMatchObject({ kind: 'answered', answer: [{ oneLess: { costCents: 0 } }] });
    const options = { limitSeconds: 20 };
    const floors = await estimateFloorCurve(small, [question], [0, 1], options);
    expect(floors).toMatchObject({
      answer: [{ leastShortageMinutes: 480 }, { leastShortageMinutes: 960 }],
    });
    const people = await estimatePeopleCurve(small, 'ione', 1, options);
    expect(people).toMatchObject({
      answer: [{ change: -1 }, { change: 0 }, { change: 1, leastShortageMinutes: 0 }],
    });
  });

  it('mend, and tell take-overs first', async () => {
    const problem = buildProblem({ people: [{}, {}], floors: [{}] });
    let told = 0;
    const mended = await solveMending(problem, roster.slice(0, 1), {
      fromMinute: 0,
      untilMinute: 1440,
      absences: [{ personId: 'ione', startMinute: 0, endMinute: 1440, reason: 'ill' }],
      limitSeconds: 20,
      seed: 1,
      onTakeOvers: (found) => {
        told = found.length;
      },
    });
    expect(mended).toMatchObject({ answer: { kind: 'mended', touched: ['person-2'] } });
    expect(told).toBe(1);
  });

  it('end within two seconds when they are stopped', async () => {
    const stop = new AbortController();
    const demo = demoSizedProblem();
    const problem = { ...demo, people: demo.people.slice(2) };
    setTimeout(() => stop.abort(), 300);
    const startedAt = performance.now();
    const outcome = await solveKnots(problem, { ...knotOptions, stop: stop.signal });
    expect(performance.now() - startedAt).toBeLessThan(5000);
    if (outcome.kind === 'answered') expect(outcome.answer.isComplete).toBe(false);
    else expect(outcome).toEqual({ kind: 'ended', wasStopped: true });
  });
});
