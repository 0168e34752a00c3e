import { describe, expect, it } from 'vitest';
import { buildRosterModel, placeRoster, weighRoster } from '@/modules/model';
import type { ProblemFloor } from '@/modules/problem';
import { assign, buildProblem } from '@/tests/support/problem-builder';

const people = [
  { skillIds: ['nurse'] },
  { skillIds: ['nurse', 'vet'] },
  { skillIds: ['vet', 'nurse'] },
];

/** Slices of the floors as [start, end, people asked for, columns that cover]. */
function rowsOf(floors: readonly Partial<ProblemFloor>[]) {
  const model = buildRosterModel(buildProblem({ dayCount: 1, people, floors }));
  return model.floors.map(({ startMinute, endMinute, people: asked, covering }) => [
    startMinute,
    endMinute,
    asked,
    covering.length,
  ]);
}

describe('floors as rows', () => {
  it('cut a window where shifts come and go, and join slices in which nothing changes', () => {
    // Early 07-15, Day 09-17 and Late 15-23 overlap; nobody comes or goes between 01:00 and 07:00.
    expect(rowsOf([{ startMinute: 0, endMinute: 1020 }])).toEqual([
      [0, 420, 1, 0],
      [420, 540, 1, 3],
      [540, 900, 1, 6],
      [900, 1020, 1, 6],
    ]);
  });
  it('add up seated floors of one skill where their windows overlap', () => {
    const floors = [
      { startMinute: 420, endMinute: 900 },
      { startMinute: 540, endMinute: 1020, people: 2 },
    ];
    expect(rowsOf(floors).map(([start, end, asked]) => [start, end, asked])).toEqual([
      [420, 540, 1],
      [540, 900, 3],
      [900, 1020, 2],
    ]);
  });
  it('keep shared floors apart and count everybody who holds the skill, in any post', () => {
    const shared = { skillId: 'vet', counting: 'shared' as const, endMinute: 540 };
    // A seated floor of nurses gives both vets a second post, which counts as well.
    expect(rowsOf([shared, { ...shared, people: 2 }, { endMinute: 540 }])).toEqual([
      [420, 540, 1, 3],
      [420, 540, 1, 2],
      [420, 540, 2, 2],
    ]);
  });
  it('count everybody on duty for floors of no skill', () => {
    expect(rowsOf([{ skillId: null, endMinute: 540, people: 3 }])).toEqual([[420, 540, 3, 3]]);
  });
  it('leave out floors that ask for nobody', () => {
    expect(rowsOf([{ people: 0 }])).toEqual([]);
  });
});

describe('shortage', () => {
  const weigh = (floors: readonly Partial<ProblemFloor>[], plan: readonly [string, string][]) => {
    const problem = buildProblem({
      dayCount: 1,
      people: people.map((p) => ({ ...p, contractMinutes: 480 })),
      floors,
    });
    const model = buildRosterModel(problem);
    const roster = plan.map(([person, kind]) => assign(problem, person, 0, kind));
    const { shortageMinutes, costCents } = weighRoster(model, placeRoster(model, roster));
    return { shortageMinutes, wishedCents: costCents - 3 * 20_000 };
  };
  const wished = (price: number, count: number) => ({ people: count, priceCentsPerHour: price });

  it('counts missing person-minutes of firm floors', () => {
    expect(weigh([{ people: 3 }], [['ione', 'Early']])).toMatchObject({ shortageMinutes: 960 });
    expect(weigh([{ people: 2 }], [['ione', 'Day']])).toMatchObject({ shortageMinutes: 600 });
  });
  it('is a level for each priority of firm floors, and the first one is filled first', () => {
    const problem = buildProblem({
      dayCount: 1,
      people,
      floors: [{ priority: 4 }, { priority: 2, people: 2 }, wished(600, 1)],
    });
    const model = buildRosterModel(problem);
    expect(model.levels.map(({ objective, step }) => [objective, step])).toEqual([
      ['shortage2', 120],
      ['shortage4', 120],
    ]);
    const levels = ['ione', 'person-2', 'person-3'].map((_, index, ids) => {
      const roster = ids.slice(0, index + 1).map((id) => assign(problem, id, 0, 'Early'));
      return weighRoster(model, placeRoster(model, roster)).levels;
    });
    expect(levels).toEqual([
      [480, 480],
      [0, 480],
      [0, 0],
    ]);
  });
  it('of wished floors is rounded once for each floor and stretch', () => {
    // Two floors at 7 an hour over 10 minutes: 1.17 each; together they would be 2.33.
    const short = { ...wished(7, 1), endMinute: 430 };
    expect(weigh([short, short], []).wishedCents).toBe(2);
    // Person 1 comes at 09:00: 2 h missing 3.5, then 6 h of one missing where two are asked.
    const long = wished(1, 2);
    expect(weigh([long], [['ione', 'Day']]).wishedCents).toBe(4 + 6);
  });
  it('fills firm floors first, then the dearest wished ones', () => {
    const floors = [{ people: 1 }, wished(500, 1), wished(900, 1)];
    expect(weigh(floors, [])).toEqual({ shortageMinutes: 480, wishedCents: 8 * 1400 });
    expect(weigh(floors, [['ione', 'Early']])).toEqual({
      shortageMinutes: 0,
      wishedCents: 8 * 1400,
    });
    const two = weigh(floors, [
      ['ione', 'Early'],
      ['person-2', 'Early'],
    ]);
    expect(two).toEqual({ shortageMinutes: 0, wishedCents: 8 * 500 });
  });
});
