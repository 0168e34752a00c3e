import { describe, expect, it } from 'vitest';
import { broken, type Plan } from './broken-plan';

describe('Nights in a period', () => {
  it('counts them wherever they stand', () => {
    const rules = { nightsPerPeriod: 2 };
    const two: Plan = [
      [0, 'Night'],
      [3, 'Night'],
    ];
    expect(broken({ rules }, two)).toEqual([]);
    expect(broken({ rules }, [...two, [6, 'Night']])).toEqual(['nights']);
  });
});
