import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { Floor, ShiftKind } from '@/modules/coverage';
import { countPeople, line, openTeam, type SizedTeam } from './sized-team';

/** Repeatable random numbers: the minimal standard generator of Park and Miller, CACM 31(10), 1988. */
function randomWeeks(count: number, length: number, most: number): number[][] {
  let state = 20_270_201;
  const next = () => {
    state = (state * 48_271) % 2_147_483_647;
    return state % (most + 1);
  };
  return Array.from({ length: count }, () => Array.from({ length }, next));
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

/** Many sizings in one test: room for a busy machine. */
vi.setConfig({ testTimeout: 240_000 });

let team: SizedTeam;
let day: ShiftKind;
let floor: Floor;

beforeAll(() => {
  team = openTeam();
  day = team.addKind('Day', 8, 16);
  floor = team.addFloor(8, 16, [1, 1, 1, 1, 1, 1, 1]);
});

async function answerOf(needs: readonly number[], daysOn: number) {
  team.setNeeds(floor, needs);
  return (await team.size([line(day, { daysOn })])).answer;
}

/** Rounding in the solver's floating-point bound. */
const roundedUp = (bound: number) => Math.ceil(bound - 1e-6);

describe('five days on and two off', () => {
  /**
   * Closed form, found by enumerating the vertices of the dual exactly and checked on 300 instances.
   * Relatives in print: Tibrewala, Philippe & Browne, Management Science 19(1), 1972; Baker,
   * Operational Research Quarterly 27(1), 1976; Alfares, OR Spektrum 23, 2001.
   */
  function closedForm(needs: readonly number[]): number {
    const on = (weekday: number) => needs[weekday % 7] ?? 0;
    const thirds = needs.map((_, d) => (on(d) + on(d + 2) + on(d + 4) + on(d + 5)) / 3);
    return Math.max(...needs, sum(needs) / 5, ...thirds);
  }

  it('takes the closed form, rounded up to whole people, on 60 random weeks', async () => {
    for (const needs of randomWeeks(60, 7, 20).filter((week) => sum(week) > 0)) {
      const answer = await answerOf(needs, 5);
      expect(answer.linearBound, needs.join(' ')).toBeCloseTo(closedForm(needs), 6);
      expect(answer.objective, needs.join(' ')).toBe(roundedUp(closedForm(needs)));
    }
  });

  it('never takes fewer people when a need rises', async () => {
    for (const [index, needs] of randomWeeks(12, 7, 15).entries()) {
      const before = await answerOf(needs, 5);
      const raised = needs.map((people, weekday) => people + (weekday === index % 7 ? 2 : 0));
      const after = await answerOf(raised, 5);
      expect(after.objective).toBeGreaterThanOrEqual(before.objective);
      expect(after.linearBound).toBeGreaterThanOrEqual(before.linearBound - 1e-6);
    }
  });
});

describe('k days on of seven', () => {
  /** Bartholdi, Orlin & Ratliff, Operations Research 28(5), 1980: the bound rounded up is the answer. */
  it.each([3, 4, 6])('takes the linear bound rounded up for %i days on', async (daysOn) => {
    for (const needs of randomWeeks(12, 7, 20)) {
      const answer = await answerOf(needs, daysOn);
      expect(answer.objective, needs.join(' ')).toBe(roundedUp(answer.linearBound));
    }
  });
});

describe('k hours on of a day', () => {
  /** The same rule on a circle of hours: 4 of 12 two-hour periods and 8 of 24 hours. */
  it.each([
    [2, 8],
    [1, 8],
  ])(
    'takes the linear bound rounded up for periods of %i h and shifts of %i h',
    async (period, hours) => {
      const around = openTeam();
      const starts = Array.from({ length: 24 / period }, (_, index) => index * period);
      const lines = starts.map((hour) =>
        line(around.addKind(`From ${hour}`, hour, hour + hours), { daysOn: 1 }),
      );
      const floors = starts.map((hour) =>
        around.addFloor(hour, hour + period, [1, 0, 0, 0, 0, 0, 0]),
      );
      for (const needs of randomWeeks(6, starts.length, 12)) {
        floors.forEach((one, index) => {
          around.setNeeds(one, [needs[index] ?? 0]);
        });
        const sizing = await around.size(lines, { span: 0 });
        expect(sizing.answer.objective).toBe(roundedUp(sizing.answer.linearBound));
        expect(countPeople(sizing)).toBe(sizing.answer.objective);
      }
    },
  );
});
