import { beforeEach, describe, expect, it } from 'vitest';
import type { ShiftKind } from '@/modules/coverage';
import type { Sizing, SizingLine } from '@/modules/sizing';
import { line, openTeam, paid, type SizedTeam } from './sized-team';

/* Days that repeat: one weekday, lines of one day. Values recomputed with GLPK 5.0 and CBC 2.10.8. */

let team: SizedTeam;

beforeEach(() => {
  team = openTeam();
});

/** Floors of equal length that follow each other from midnight on. */
function addFloors(hours: number, needs: readonly number[]) {
  needs.forEach((people, index) => {
    team.addFloor(index * hours, (index + 1) * hours, [people, 0, 0, 0, 0, 0, 0]);
  });
}

const oneDay = (kind: ShiftKind, changes: Partial<SizingLine> = {}) =>
  line(kind, { daysOn: 1, startWeekdays: [0], ...changes });

/** Shift kinds of one length that begin every few hours around the day. */
const addKinds = (every: number, hours: number) =>
  Array.from({ length: 24 / every }, (_, index) =>
    team.addKind(`From ${index * every}`, index * every, index * every + hours),
  );

const countByLine = ({ problem, answer }: Sizing) =>
  Object.fromEntries(
    answer.people.map(({ patternId, count }) => [
      problem.patterns.find(({ id }) => id === patternId)?.lineId,
      count,
    ]),
  );

describe('the airline-desk day', () => {
  /** Hillier & Lieberman, Introduction to Operations Research, section 3.4, "Union Airways". */
  const windows: readonly (readonly [from: number, to: number, people: number])[] = [
    [6, 8, 48],
    [8, 10, 79],
    [10, 12, 65],
    [12, 14, 87],
    [14, 16, 64],
    [16, 18, 73],
    [18, 20, 82],
    [20, 22, 43],
    [22, 24, 52],
    [0, 6, 15],
  ];

  it('costs $30,610 a day with 48, 31, 39, 43 and 15 people, and has these floor prices', async () => {
    for (const [from, to, people] of windows) team.addFloor(from, to, [people, 0, 0, 0, 0, 0, 0]);
    const shifts = [
      ['one', 6, 14, 170],
      ['two', 8, 16, 160],
      ['three', 12, 20, 175],
      ['four', 16, 24, 180],
      ['five', 22, 30, 195],
    ] as const;
    const lines = shifts.map(([name, from, to, dollars]) =>
      oneDay(team.addKind(name, from, to), { id: name, ...paid(dollars * 100) }),
    );
    const sizing = await team.size(lines, { span: 0, objective: 'pay' });
    const { answer, problem } = sizing;
    expect(answer).toMatchObject({ objective: 3_061_000, isProven: true, floorsHold: true });
    expect(answer.linearBound).toBeCloseTo(3_061_000, 4);
    expect(countByLine(sizing)).toEqual({ one: 48, two: 31, three: 39, four: 43, five: 15 });
    const prices = windows.map(([from]) => {
      const floor = problem.floors.find(({ startMinute }) => startMinute === from * 60);
      return answer.floorPrices.find(({ floorId }) => floorId === floor?.floorId)?.price ?? NaN;
    });
    const dollars = [10, 160, 0, 0, 0, 0, 175, 5, 0, 195];
    prices.forEach((price, index) => {
      expect(price).toBeCloseTo((dollars[index] ?? NaN) * 100, 4);
    });
  });
});

describe('the bus day (Taha, Operations Research: An Introduction, "bus scheduling")', () => {
  const needs = [4, 8, 10, 7, 12, 4];

  it('takes 26 buses on eight-hour runs that begin every four hours', async () => {
    addFloors(4, needs);
    const lines = addKinds(4, 8).map((kind) => oneDay(kind));
    const { answer } = await team.size(lines, { span: 0 });
    expect(answer.objective).toBe(26);
    expect(answer.linearBound).toBeCloseTo(26, 6);
    answer.floorPrices.forEach(({ price }, index) => {
      expect(price).toBeCloseTo(index % 2 === 0 ? 1 : 0, 6);
    });
  });

  it('takes 30 on three fixed runs', async () => {
    addFloors(4, needs);
    const lines = addKinds(8, 8).map((kind) => oneDay(kind));
    const { answer } = await team.size(lines, { span: 0 });
    expect(answer.objective).toBe(30);
  });
});

describe('the bus-crew day (textbook example, four-hour blocks, eight hours of work)', () => {
  it('takes 150 people', async () => {
    addFloors(4, [60, 70, 60, 50, 20, 30]);
    const lines = addKinds(4, 8).map((kind) => oneDay(kind));
    const { answer } = await team.size(lines, { span: 0 });
    expect(answer.objective).toBe(150);
    expect(answer.linearBound).toBeCloseTo(150, 6);
  });
});

describe('the smallest day on which whole people take more', () => {
  it('takes 2 people where parts of people would be 1.5: two of three periods, one needed in each', async () => {
    addFloors(8, [1, 1, 1]);
    const lines = addKinds(8, 16).map((kind) => oneDay(kind));
    const { answer } = await team.size(lines, { span: 0 });
    expect(answer.objective).toBe(2);
    expect(answer.linearBound).toBeCloseTo(1.5, 6);
  });
});
