import { describe, expect, it } from 'vitest';
import {
  buildRosterModel,
  completeValues,
  leastCostCents,
  objectiveOf,
  openFloors,
  placeRoster,
  readRoster,
  roundingSlackCents,
  weighRoster,
} from '@/modules/model';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import {
  assign,
  buildFloor,
  buildProblem,
  type ProblemSketch,
} from '@/tests/support/problem-builder';

const days =
  (count: number, kind = 'Early') =>
  (sketch: ProblemSketch) => {
    const problem = buildProblem(sketch);
    const model = buildRosterModel(problem);
    const roster = Array.from({ length: count }, (_, day) => assign(problem, 'ione', day, kind));
    return { problem, model, roster, values: placeRoster(model, roster) };
  };

describe('rosters and values', () => {
  it('lead into each other', () => {
    const { model, roster, values } = days(3)({});
    expect(readRoster(model, values)).toEqual(roster);
  });
  it('forgive the small errors of the solver', () => {
    const { model, roster, values } = days(3)({});
    expect(
      readRoster(
        model,
        values.map((value) => Math.abs(value - 1e-6)),
      ),
    ).toEqual(roster);
  });
  it('move a post the model lacks to one it has, and leave out what cannot be worked', () => {
    const problem = buildProblem({
      dayCount: 2,
      people: [{ skillIds: ['nurse', 'vet'], mayWorkNights: false }],
      floors: [buildFloor({ skillId: 'vet' })],
    });
    const model = buildRosterModel(problem);
    const roster = [assign(problem, 'ione', 0, 'Early'), assign(problem, 'ione', 1, 'Night')];
    expect(readRoster(model, placeRoster(model, roster))).toEqual([
      assign(problem, 'ione', 0, 'Early', 'vet'),
    ]);
  });
});

describe('pay', () => {
  const weigh = (count: number, sketch: ProblemSketch, kind?: string) => {
    const { model, values } = days(count, kind)(sketch);
    const { costCents } = weighRoster(model, values);
    // What the solver sees is the same where nothing needs rounding.
    const { costs, offset } = objectiveOf(model.linear, 'cost');
    const whole = completeValues(model, values);
    expect(
      costs.reduce((sum, cost, column) => sum + cost * (whole[column] ?? 0), offset),
    ).toBeCloseTo(costCents, 6);
    return costCents;
  };
  const contract = { contractMinutes: 960 };

  it('is the contract for people paid by contract, and overtime at its percentage', () => {
    expect(weigh(1, { people: [contract] })).toBe(40_000);
    expect(weigh(2, { people: [contract] })).toBe(40_000);
    expect(weigh(4, { people: [contract] })).toBe(40_000 + 2 * 30_000);
  });
  it('counts credited leave towards the contract', () => {
    expect(weigh(2, { people: [{ ...contract, creditMinutes: 480 }] })).toBe(40_000 + 30_000);
  });
  it('is the worked hours for people paid by hours, and overtime beyond the contract', () => {
    const hourly = { ...contract, paidBy: 'hours' as const };
    expect(weigh(1, { people: [hourly] })).toBe(20_000);
    expect(weigh(4, { people: [hourly] })).toBe(40_000 + 2 * 30_000);
  });
  it('adds each premium for its minutes', () => {
    const kinds = [
      {
        id: 'Night',
        startMinute: 1380,
        endMinute: 1860,
        isNight: true,
        nightMinutes: 420,
        weekendMinutes: 60,
        holidayMinutes: 30,
      },
    ];
    const premiums = 7 * 625 + 500 + 1250;
    expect(weigh(1, { kinds, people: [contract] }, 'Night')).toBe(40_000 + premiums);
  });
  it('pays overtime by steps, the cheapest first', () => {
    const overtimeSteps = [
      { overMinutes: 0, percent: 125 },
      { overMinutes: 600, percent: 200 },
    ];
    // 16 h of overtime at 25.00: 10 h at 31.25 and 6 h at 50.00.
    const overtime = 10 * 3125 + 6 * 5000;
    expect(weigh(4, { people: [contract], pay: { overtimeSteps } })).toBe(40_000 + overtime);
    const hourly = { ...contract, paidBy: 'hours' as const };
    expect(weigh(4, { people: [hourly], pay: { overtimeSteps } })).toBe(40_000 + overtime);
  });
  it('leaves out steps that the contract never reaches', () => {
    const overtimeSteps = [
      { overMinutes: 0, percent: 125 },
      { overMinutes: 600, percent: 200 },
    ];
    const columns = (maximumMinutes: number) =>
      buildRosterModel(
        buildProblem({ people: [{ ...contract, maximumMinutes }], pay: { overtimeSteps } }),
      ).overtimes[0]?.map(({ mostMinutes }) => mostMinutes);
    expect([columns(960), columns(1200), columns(1800)]).toEqual([[], [240], [600, 240]]);
  });
  it('counts the wishes that are refused', () => {
    const wishes = [
      { dayIndex: 0, shiftIndex: null, wants: 'off' as const, priceCents: 300 },
      { dayIndex: 1, shiftIndex: 5, wants: 'on' as const, priceCents: 50 },
      { dayIndex: 2, shiftIndex: 8, wants: 'on' as const, priceCents: 7 },
    ];
    // Early on the first three days: the free day and the Day of Tuesday are refused.
    expect(weigh(3, { people: [{ ...contract, contractMinutes: 1440, wishes }] })).toBe(60_350);
  });
  it('costs the ordinary rate only where overtime pays no more', () => {
    const hourly = { ...contract, paidBy: 'hours' as const };
    expect(
      weigh(4, { people: [hourly], pay: { overtimeSteps: [{ overMinutes: 0, percent: 100 }] } }),
    ).toBe(80_000);
  });
});

describe('the slack of rounding', () => {
  const slack = (sketch: ProblemSketch) =>
    roundingSlackCents(buildRosterModel(buildProblem(sketch)));
  it('is none where every minute costs whole cents, or every shift does', () => {
    expect(slack({ people: [{ payCentsPerHour: 2401 }] })).toBe(0);
    expect(roundingSlackCents(buildRosterModel(demoSizedProblem()))).toBe(0);
  });
  it('is half a cent for each sum that may not come out whole', () => {
    const kinds = [{ id: 'Early', startMinute: 420, endMinute: 897 }];
    const odd = { payCentsPerHour: 1933, contractMinutes: 960 };
    expect(slack({ kinds, people: [odd] })).toBe(0.5);
    expect(slack({ kinds, people: [{ ...odd, paidBy: 'hours' as const }] })).toBe(1);
    const floors = [buildFloor({ priceCentsPerHour: 7, endMinute: 425 })];
    expect(slack({ people: [], floors })).toBe(0.5);
  });
});

describe('what no roster can cost less than', () => {
  it('is the constant, less what wishes to work give back', () => {
    const wishes = [
      { dayIndex: 0, shiftIndex: null, wants: 'on' as const, priceCents: 900 },
      { dayIndex: 1, shiftIndex: 4, wants: 'off' as const, priceCents: 500 },
    ];
    const model = buildRosterModel(buildProblem({ people: [{ contractMinutes: 960, wishes }] }));
    expect(objectiveOf(model.linear, 'cost').offset).toBe(40_900);
    expect(leastCostCents(model)).toBe(40_000);
  });
});

describe('what a roster leaves open', () => {
  it('is floors for the missing people of each slice and price', () => {
    const problem = buildProblem({
      people: [{}, {}],
      floors: [
        buildFloor({ people: 2 }),
        buildFloor({ priceCentsPerHour: 900 }),
        buildFloor({ counting: 'shared', skillId: null, startMinute: 1000, endMinute: 1020 }),
      ],
    });
    const model = buildRosterModel(problem);
    const values = placeRoster(model, [assign(problem, 'ione', 0, 'Day')]);
    const open = openFloors(model, values);
    const lines = open.map((floor) => [
      floor.startMinute,
      floor.endMinute,
      floor.people,
      floor.priceCentsPerHour,
    ]);
    // The Day from 09:00 takes one of the two firm places and holds the shared floor.
    expect(lines).toEqual([
      [420, 540, 1, 900],
      [420, 540, 2, null],
      [540, 900, 1, 900],
      [540, 900, 1, null],
    ]);
    expect(
      open.every(({ skillId, counting }) => skillId === 'nurse' && counting === 'seated'),
    ).toBe(true);
  });
});
