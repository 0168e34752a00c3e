import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlannedRoster, ProblemPerson } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { assign, buildProblem, type KindSketch } from '@/tests/support/problem-builder';

const payOf = (
  person: Partial<ProblemPerson>,
  kinds: readonly KindSketch[],
  dayCount: number,
  rates: NonNullable<Parameters<typeof buildProblem>[0]>['pay'] = {},
) => {
  const problem = buildProblem({ people: [person], kinds, pay: rates });
  const roster = Array.from({ length: dayCount }, (_, dayIndex) =>
    assign(problem, 'ione', dayIndex, kinds[0]?.id ?? ''),
  );
  const proof = proveRoster(problem, roster);
  return {
    ordinary: proof.contractPayCents,
    premium: proof.premiumPayCents,
    overtime: proof.overtimePayCents,
    all: proof.costCents,
  };
};

const early = { id: 'Early', startMinute: 420, endMinute: 900 };

describe('ordinary and overtime pay', () => {
  it.each([
    ['by contract, fewer hours worked', { paidBy: 'contract' }, 3, [100_000, 0]],
    ['by contract, exactly the contract', { paidBy: 'contract' }, 5, [100_000, 0]],
    ['by contract, beyond it', { paidBy: 'contract' }, 7, [100_000, 60_000]],
    ['by the hour, fewer hours worked', { paidBy: 'hours' }, 3, [60_000, 0]],
    ['by the hour, beyond the contract', { paidBy: 'hours' }, 7, [100_000, 60_000]],
    ['by the hour, leave is paid', { paidBy: 'hours', creditMinutes: 480 }, 3, [80_000, 0]],
    [
      'leave counts towards overtime',
      { paidBy: 'contract', creditMinutes: 480 },
      5,
      [100_000, 30_000],
    ],
    [
      'by the hour, no contract hours at all',
      { paidBy: 'hours', contractMinutes: 0 },
      1,
      [0, 30_000],
    ],
  ] as const)('%s', (_, person, dayCount, [ordinary, overtime]) => {
    expect(payOf(person, [early], dayCount)).toEqual({
      ordinary,
      premium: 0,
      overtime,
      all: ordinary + overtime,
    });
  });

  /** 46 hours at 12.00, 6 of them at one and a half: 588.00. 29 CFR 778.110(a), 76 FR 18857 (2011). */
  it('gives the published 588.00 for 46 hours at 12.00', () => {
    const person = { paidBy: 'hours', payCentsPerHour: 1200, contractMinutes: 2400 } as const;
    const kind = { id: 'Long', startMinute: 420, endMinute: 420 + 552 };
    expect(payOf(person, [kind], 5)).toMatchObject({
      ordinary: 48_000,
      overtime: 10_800,
      all: 58_800,
    });
  });

  /** 3,456 contract hours: 864 of vets at 38.00, 1,216 at 25.00, 736 at 19.00 and 640 at 18.00. */
  it('of the demonstration period is 88,736.00', () => {
    expect(proveRoster(demoSizedProblem(), []).contractPayCents).toBe(8_873_600);
  });

  it('is rounded once for each person, half up', () => {
    // 1 cent an hour for 30 minutes on each of 5 days: 2.5 cents, not 5 times half a cent.
    const person = { paidBy: 'hours', payCentsPerHour: 1 } as const;
    expect(payOf(person, [{ id: 'Short', startMinute: 0, endMinute: 30 }], 5).ordinary).toBe(3);
  });

  it.each([
    ['within the first step', 120, 120 * 1.25],
    ['at the end of the first step', 301, 301 * 1.25],
    ['one minute into the second', 302, 301 * 1.25 + 1.5],
    ['into the third', 700, 301 * 1.25 + 299 * 1.5 + 100 * 2],
  ])('goes by steps of overtime: %s', (_, minutes, units) => {
    const overtimeSteps = [
      { overMinutes: 0, percent: 125 },
      { overMinutes: 301, percent: 150 },
      { overMinutes: 600, percent: 200 },
    ];
    // 60.00 an hour is 100 cents a minute.
    const person = { contractMinutes: 100, payCentsPerHour: 6000 };
    const kind = { id: 'Long', startMinute: 0, endMinute: 100 + minutes };
    expect(payOf(person, [kind], 1, { overtimeSteps }).overtime).toBe(units * 100);
  });

  it('rounds each step of overtime by itself, half up', () => {
    // 1 cent an hour: 30 minutes at 100 % are half a cent in each of two steps.
    const overtimeSteps = [
      { overMinutes: 0, percent: 100 },
      { overMinutes: 30, percent: 100 },
    ];
    const person = { contractMinutes: 0, payCentsPerHour: 1 };
    const kind = { id: 'Short', startMinute: 0, endMinute: 60 };
    expect(payOf(person, [kind], 1, { overtimeSteps }).overtime).toBe(2);
  });

  it('stays exact at the largest rates and longest periods', () => {
    const person = { payCentsPerHour: 1_000_000_000, contractMinutes: 500_001 };
    expect(payOf(person, [early], 0).ordinary).toBe(8_333_350_000_000);
  });
});

describe('premiums', () => {
  it('add up, each on its own minutes', () => {
    const kind = { ...early, nightMinutes: 60, weekendMinutes: 480, holidayMinutes: 120 };
    // 25.00 x (1 h x 25 % + 8 h x 20 % + 2 h x 100 %)
    expect(payOf({}, [kind], 1).premium).toBe(625 + 4000 + 5000);
  });

  it('are rounded one by one, half up', () => {
    // 1 cent x 30 min x 100 % is half a cent in each category.
    const kind = { ...early, nightMinutes: 30, weekendMinutes: 30, holidayMinutes: 30 };
    const all = { nightPercent: 100, weekendPercent: 100, holidayPercent: 100 };
    expect(payOf({ payCentsPerHour: 1 }, [kind], 1, all).premium).toBe(3);
    expect(payOf({ payCentsPerHour: 1 }, [{ ...kind, nightMinutes: 29 }], 1, all).premium).toBe(2);
  });

  it('are additive: the premiums of two rosters together are those of both', () => {
    const problem = buildProblem({
      dayCount: 14,
      people: [
        { id: 'ione', payCentsPerHour: 1987 },
        { id: 'ravi', payCentsPerHour: 2503 },
      ],
      kinds: [
        { ...early, weekendMinutes: 77 },
        { id: 'Night', startMinute: 1380, endMinute: 1860, nightMinutes: 431, holidayMinutes: 13 },
      ],
    });
    const assignment = fc.record({
      personId: fc.constantFrom('ione', 'ravi'),
      shiftIndex: fc.nat(27),
      postSkillId: fc.constant('nurse'),
    });
    const premiumOf = (roster: PlannedRoster): number =>
      proveRoster(problem, roster).premiumPayCents;
    fc.assert(
      fc.property(fc.array(assignment), fc.array(assignment), (one, other) => {
        expect(premiumOf([...one, ...other])).toBe(premiumOf(one) + premiumOf(other));
      }),
    );
  });
});
