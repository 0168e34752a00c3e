import { describe, expect, it } from 'vitest';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { boundOf, early, nothing, oneEarly, slice } from './bound-of';

describe('a floor of one nurse, wished at 30.00 an hour', () => {
  const problem = oneEarly({ floors: [{ priceCentsPerHour: 3000 }] });
  // The nurse costs 20,000 and the gap 24,000. By hand: the line takes min(0, 20,000 - c), the slice
  // min(24,000, c).
  it.each([
    ['too low', 12_000, 12_000],
    ['at the cost of the nurse', 20_000, 20_000],
    ['between the two', 22_000, 20_000],
    ['at the price of the gap', 24_000, 20_000],
    ['too high', 30_000, 14_000],
    ['absurd', -5000, 0],
  ])('at a multiplier that is %s', (_, cents, bound) => {
    expect(boundOf(problem, { slices: [slice({ cents })] })).toBe(bound);
  });

  it('a shift that ends as the slice begins earns nothing by it', () => {
    const dawn = { id: 'Dawn', startMinute: 300, endMinute: 420 };
    const both = oneEarly({ kinds: [dawn, early], floors: [{ priceCentsPerHour: 3000 }] });
    expect(boundOf(both, { slices: [slice({ cents: 20_000 })] })).toBe(20_000);
  });

  it('time that the record leaves out counts with multiplier 0', () => {
    expect(boundOf(problem, {})).toBe(0);
    // Nobody can come: the gap is certain.
    const nobody = oneEarly({
      floors: [{ priceCentsPerHour: 3000 }],
      people: [{ skillIds: ['desk'], contractMinutes: 0 }],
    });
    expect(boundOf(nobody, {})).toBe(24_000);
  });
});

describe('floors that stand together', () => {
  const floors = [
    { priceCentsPerHour: 600 },
    { priceCentsPerHour: 3000 },
    { startMinute: 660, endMinute: 780, priority: 1 },
    { startMinute: 660, endMinute: 780, priority: 2 },
  ];
  const record = {
    shortage: [
      { priority: 1, centsPerMinute: 90 },
      { priority: 2, centsPerMinute: 70 },
    ],
  };

  it('are served by priority, then by price, and what one takes the next lacks', () => {
    // One nurse, paid in any case (contract of 1 h: 2,500, and 7 h of overtime if on duty: 26,250). Of
    // four floors from 11:00 to 13:00 she holds priority 1; before and after the dearer wished one.
    const problem = oneEarly({ floors, people: [{ contractMinutes: 60 }] });
    const absent = 8 * 3600 + 2 * 60 * (90 + 70);
    const present = 8 * 600 + 2 * 3000 + 2 * 60 * 70;
    expect(boundOf(problem, { ...record, slices: [slice({ cents: absent - present })] })).toBe(
      2500 + present + Math.min(absent - present, 26_250),
    );
  });

  it('a shared floor stands alone beside them', () => {
    const shared = { ...floors[1], counting: 'shared' as const };
    const problem = oneEarly({ floors: [...floors.slice(0, 1), shared], people: [{}] });
    expect(boundOf(problem, {})).toBe(100_000);
    const nobody = oneEarly({ floors: [...floors.slice(0, 1), shared], people: [] });
    expect(boundOf(nobody, {})).toBe(8 * 3600);
  });
});

describe('firm floors and ceilings', () => {
  const problem = oneEarly({ floors: [{ priority: 2 }] });
  const record = {
    shortage: [{ priority: 2, centsPerMinute: 100 }],
    slices: [slice({ cents: 20_000 })],
  };

  it('hold for rosters without shortage when none is allowed', () => {
    expect(boundOf(problem, record)).toBe(20_000);
  });

  it('what is allowed is taken off at its price', () => {
    const allowing = (minutes: number) => ({
      shortageByPriority: [{ priority: 2, minutes }],
      surplusMinutes: 0,
    });
    expect(boundOf(problem, record, allowing(60))).toBe(14_000);
    expect(boundOf(problem, record, allowing(480))).toBe(0);
  });

  it('a ceiling makes being there worth less than nothing', () => {
    // Least hours force the nurse to come, which costs 20,000, and the ceiling takes nobody.
    const full = oneEarly({
      ceilings: [{ people: 0, priceCentsPerHour: 600 }],
      people: [{ paidBy: 'hours', minimumMinutes: 480 }],
    });
    const ceiling = slice({ of: 'ceiling', id: 'ceiling-1' });
    expect(boundOf(full, { slices: [{ ...ceiling, cents: -4800 }] })).toBe(24_800);
    expect(boundOf(full, {})).toBe(20_000);
  });

  it('firm ceilings allow the surplus that is given', () => {
    const full = oneEarly({
      ceilings: [{ people: 0 }],
      people: [{ paidBy: 'hours', minimumMinutes: 480 }],
    });
    const slices = [slice({ of: 'ceiling', id: 'ceiling-1', cents: -4800 })];
    const surplus = { surplusCentsPerMinute: 10, slices };
    expect(boundOf(full, surplus)).toBe(24_800);
    expect(boundOf(full, surplus, { ...nothing, surplusMinutes: 480 })).toBe(20_000);
  });
});

describe('rounding', () => {
  it('half a cent is taken off for each sum that does not come out whole', () => {
    // A gap of 8 hours and 20 minutes at 0.07 an hour: 58.33, which the proof rounds to 58.
    const floors = [{ startMinute: 400, endMinute: 900, priceCentsPerHour: 7 }];
    const desk = { skillIds: ['desk'], contractMinutes: 0 };
    const whole = { ...floors[0], startMinute: 420 };
    // In two pieces, 20 minutes before the shift and 8 hours within it: one of them is not whole.
    expect(boundOf(oneEarly({ floors, people: [desk] }), {})).toBe(58);
    expect(boundOf(oneEarly({ floors: [whole], people: [desk] }), {})).toBe(56);
  });
});

it('a problem of the size of the demonstration: nobody costs less than the contracts', () => {
  // 88,736.00 for 3,456 contract hours; see prove-pay.test.ts. The holiday leaves 19 weekdays for the
  // 20 shifts of a full contract, so that some weekend premiums come on top.
  const bound = boundOf(demoSizedProblem(), {});
  expect(bound).toBeGreaterThan(8_873_600);
  expect(bound).toBeLessThan(9_000_000);
});
