import { beforeAll, describe, expect, it } from 'vitest';
import type { Floor, ShiftKind } from '@/modules/coverage';
import type { SizingInput, SizingLine } from '@/modules/sizing';
import { countPeople, line, openTeam, paid, peopleByDay, type SizedTeam } from './sized-team';

/**
 * Winston, Operations Research: Applications and Algorithms, 4th ed. 2004, section 3.5, "post office":
 * full-timers work five days in a row and then have two off; needs for Monday to Sunday. The values
 * below were recomputed with GLPK 5.0 and CBC 2.10.8.
 */
const postOffice = [17, 13, 15, 19, 14, 16, 11];
const shiftMinutes = 480;

let team: SizedTeam;
let day: ShiftKind;
let floor: Floor;
let fullTime: SizingLine;

beforeAll(() => {
  team = openTeam();
  day = team.addKind('Day', 8, 16);
  floor = team.addFloor(8, 16, postOffice);
  fullTime = line(day, { name: 'Full time' });
});

async function size(
  needs: readonly number[],
  lines: readonly SizingLine[],
  changes: Partial<SizingInput> = {},
) {
  team.setNeeds(floor, needs);
  return team.size(lines, changes);
}

const meets = (cover: readonly number[], needs: readonly number[]) =>
  needs.every((people, weekday) => (cover[weekday] ?? 0) >= people);

describe('the post-office week (Winston, section 3.5)', () => {
  it('takes 23 people, 67/3 when people could be split', async () => {
    const sizing = await size(postOffice, [fullTime]);
    expect(sizing.answer).toMatchObject({ floorsHold: true, objective: 23, isProven: true });
    expect(sizing.answer.linearBound).toBeCloseTo(67 / 3, 6);
    expect(countPeople(sizing)).toBe(23);
    expect(meets(peopleByDay(sizing), postOffice)).toBe(true);
  });

  it('has floor prices that prove the bound: needs times prices make 67/3', async () => {
    const { answer, problem } = await size(postOffice, [fullTime]);
    const proved = answer.floorPrices.reduce((sum, { weekday, price }) => {
      const people = problem.floors.find((one) => one.weekday === weekday)?.people ?? 0;
      return sum + people * price;
    }, 0);
    expect(proved).toBeCloseTo(67 / 3, 6);
  });

  it.each([
    ['Mon', 0, 68 / 3],
    ['Tue', 1, 67 / 3],
    ['Wed', 2, 68 / 3],
    ['Thu', 3, 68 / 3],
    ['Fri', 4, 67 / 3],
    ['Sat', 5, 68 / 3],
    ['Sun', 6, 67 / 3],
  ])('still takes 23 with one more on %s', async (_, weekday, linearBound) => {
    const needs = postOffice.map((people, index) => people + (index === weekday ? 1 : 0));
    const { answer } = await size(needs, [fullTime]);
    expect(answer.objective).toBe(23);
    expect(answer.linearBound).toBeCloseTo(linearBound, 6);
  });

  it.each([
    [22, 1],
    [21, 4],
    [20, 7],
  ])('cannot be held by %i people: %i person-days are short at least', async (cap, days) => {
    const sizing = await size(postOffice, [fullTime], { mostPeople: cap });
    expect(sizing.answer.floorsHold).toBe(false);
    expect(sizing.answer.shortageMinutes).toBe(days * shiftMinutes);
    expect(countPeople(sizing)).toBeLessThanOrEqual(cap);
    const named = sizing.answer.shortages.reduce((sum, { minutes }) => sum + minutes, 0);
    expect(named).toBe(days * shiftMinutes);
  });

  /** Exercise of the same section: 25 people, most weekend days off; 23 of 50 (recomputed). */
  it.each([
    [25, 50 - 23],
    [23, 46 - 19],
  ])('keeps most weekend days off with %i people: %i are worked', async (cap, worked) => {
    const lines = [line(day, { name: 'Full time', saturdayCents: 1, sundayCents: 1 })];
    const { answer } = await size(postOffice, lines, { objective: 'pay', mostPeople: cap });
    expect(answer).toMatchObject({ floorsHold: true, objective: worked });
  });

  /** Exercise: $50 a day, and $62 for one optional day beyond the five. */
  it('costs $5,370 when a sixth day may be worked at $62', async () => {
    const lines = [
      line(day, { name: 'Full time', ...paid(5_000) }),
      line(day, { name: 'Six days', daysOn: 6, ...paid(5_000), extraDayCents: 6_200 }),
    ];
    const { answer } = await size(postOffice, lines, { objective: 'pay' });
    expect(answer).toMatchObject({ objective: 537_000, isProven: true });
    expect(answer.linearBound).toBeCloseTo(537_000, 4);
  });

  /** Exercise: regular $80 a weekday and $100 a weekend day; day temps $90; Thursday needs 18. */
  it('costs $8,700 with regular people and day temps', async () => {
    const lines = [
      line(day, {
        name: 'Regular',
        weekdayCents: 8_000,
        saturdayCents: 10_000,
        sundayCents: 10_000,
      }),
      line(day, { name: 'Temp', daysOn: 1, ...paid(9_000) }),
    ];
    const { answer } = await size([17, 13, 15, 18, 14, 16, 11], lines, { objective: 'pay' });
    expect(answer).toMatchObject({ objective: 870_000, isProven: true });
    expect(answer.linearBound).toBeCloseTo(870_000, 4);
  });
});

describe('the post-office week with dearer weekends (own instance, GLPK and CBC)', () => {
  it('costs 12,850, which is not the bound of 12,516.67 rounded up to the next pattern', async () => {
    const lines = [
      line(day, {
        name: 'Full time',
        weekdayCents: 10_000,
        saturdayCents: 15_000,
        sundayCents: 15_000,
      }),
    ];
    const { answer, problem } = await size(postOffice, lines, { objective: 'pay' });
    expect(problem.patterns.map(({ costCents }) => costCents / 100)).toEqual([
      500, 550, 600, 600, 600, 600, 550,
    ]);
    expect(answer.linearBound).toBeCloseTo(1_251_666.6667, 3);
    expect(answer).toMatchObject({ objective: 1_285_000, provenBound: 1_285_000 });
    expect(Math.ceil(answer.linearBound / 5_000) * 5_000).toBeLessThan(answer.objective);
  });
});

describe('the workforce week (M. A. Trick, OR course notes, Carnegie Mellon, 1998)', () => {
  it('takes 22 people, split or whole', async () => {
    const needs = [14, 13, 15, 16, 19, 18, 11];
    const { answer } = await size(needs, [fullTime]);
    expect(answer.objective).toBe(22);
    expect(answer.linearBound).toBeCloseTo(22, 6);
  });
});
