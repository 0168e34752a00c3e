import { describe, expect, it } from 'vitest';
import { buildRosterModel, levelSlacks, placeRoster, weighRoster } from '@/modules/model';
import type { Problem, TeamRule } from '@/modules/problem';
import { assign, buildProblem } from '@/tests/support/problem-builder';

type Body = TeamRule extends infer R
  ? R extends TeamRule
    ? Omit<R, 'id' | 'name' | 'priceCents'>
    : never
  : never;
type Planned = readonly (readonly [personId: string, dayIndex: number, kindId: string])[];

const free = { contractMinutes: 0, paidBy: 'hours' as const, payCentsPerHour: 0 };
const build = (body: Body, priceCents: number | null, sketch = {}) =>
  buildProblem({
    dayCount: 3,
    people: [free, free, free],
    ...sketch,
    teamRules: [{ ...body, id: 'rule', name: 'Rule', priceCents } as TeamRule],
  });

function weigh(problem: Problem, planned: Planned) {
  const model = buildRosterModel(problem);
  const roster = planned.map(([person, day, kind]) => assign(problem, person, day, kind));
  return weighRoster(model, placeRoster(model, roster));
}

/** Units by which a firm rule is broken; the same rule with a price must cost as much. */
function units(body: Body, planned: Planned): number {
  const firm = weigh(build(body, null), planned);
  const priced = weigh(build(body, 7), planned);
  const [broken = 0] = firm.levels;
  expect(priced).toMatchObject({ levels: [], costCents: 7 * broken });
  return broken;
}

describe('rules that join people', () => {
  it('together: one unit for each shift on which only one of the two is', () => {
    const pair: Body = { kind: 'together', personIds: ['ione', 'person-2'] };
    expect(
      units(pair, [
        ['ione', 0, 'Early'],
        ['person-2', 0, 'Early'],
      ]),
    ).toBe(0);
    expect(
      units(pair, [
        ['ione', 0, 'Early'],
        ['person-2', 0, 'Day'],
      ]),
    ).toBe(2);
    expect(
      units(pair, [
        ['person-2', 1, 'Late'],
        ['person-3', 0, 'Late'],
      ]),
    ).toBe(1);
  });

  it('apart: one unit for each person beyond the first, at each start of a shift', () => {
    const trio: Body = { kind: 'apart', personIds: ['ione', 'person-2', 'person-3'] };
    expect(
      units(trio, [
        ['ione', 0, 'Early'],
        ['person-2', 0, 'Late'],
      ]),
    ).toBe(0);
    // Early 07-15 and Day 09-17 meet at 09:00, two Earlies at 07:00 and 09:00.
    expect(
      units(trio, [
        ['ione', 0, 'Early'],
        ['person-2', 0, 'Day'],
      ]),
    ).toBe(1);
    expect(
      units(trio, [
        ['ione', 0, 'Early'],
        ['person-2', 0, 'Early'],
      ]),
    ).toBe(2);
    // A Night that runs to 07:00 is over when the Early starts.
    expect(
      units(trio, [
        ['ione', 0, 'Night'],
        ['person-2', 1, 'Early'],
      ]),
    ).toBe(0);
    const three: Planned = [
      ['ione', 0, 'Late'],
      ['person-2', 0, 'Late'],
      ['person-3', 0, 'Late'],
    ];
    expect(units(trio, three)).toBe(2);
  });

  it('mostFree: one unit for each person too many who starts no shift, leave included', () => {
    const duo: Body = { kind: 'mostFree', personIds: ['ione', 'person-2'], most: 1 };
    expect(units(duo, [])).toBe(3);
    expect(
      units(duo, [
        ['ione', 0, 'Early'],
        ['person-2', 1, 'Late'],
      ]),
    ).toBe(1);
    const away = { ...free, absences: [{ startMinute: 0, endMinute: 4320, reason: 'leave' }] };
    expect(weigh(build(duo, null, { people: [away, free] }), []).levels).toEqual([3]);
  });

  it('linear: the distance of the sum from its range, in any post', () => {
    const sum = (least: number | null, most: number | null): Body => ({
      kind: 'linear',
      terms: [
        { personId: 'ione', shiftIndex: 0, coefficient: 2 },
        { personId: 'ione', shiftIndex: 0, coefficient: 1 },
        { personId: 'person-2', shiftIndex: 4, coefficient: -1 },
      ],
      least,
      most,
    });
    expect(units(sum(1, null), [])).toBe(1);
    expect(units(sum(null, 1), [['ione', 0, 'Early']])).toBe(2);
    expect(units(sum(0, 3), [['ione', 0, 'Early']])).toBe(0);
    expect(units(sum(0, 3), [['person-2', 1, 'Early']])).toBe(1);
  });

  it('budget: whole cents of pay beyond it, overtime included', () => {
    const budget: Body = { kind: 'budget', mostCents: 30_000 };
    const person = { contractMinutes: 480, paidBy: 'hours' as const, payCentsPerHour: 2000 };
    const one = (priceCents: number | null) => build(budget, priceCents, { people: [person] });
    expect(weigh(one(null), [['ione', 0, 'Early']]).levels).toEqual([0]);
    // 160.00 and 240.00 of overtime: 100.00 beyond 300.00.
    const both: Planned = [
      ['ione', 0, 'Early'],
      ['ione', 1, 'Early'],
    ];
    expect(weigh(one(null), both).levels).toEqual([10_000]);
    expect(weigh(one(3), both)).toMatchObject({ levels: [], costCents: 40_000 + 30_000 });
    expect(levelSlacks(buildRosterModel(one(null)))).toEqual([0]);
    const odd = { ...person, payCentsPerHour: 1933, contractMinutes: 479 };
    expect(levelSlacks(buildRosterModel(build(budget, null, { people: [odd] })))).toEqual([1]);
  });
});
