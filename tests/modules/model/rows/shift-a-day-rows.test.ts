import { describe, expect, it } from 'vitest';
import { broken, type Plan } from './broken-plan';

describe('one shift a day', () => {
  it('lets one shift start on a day', () => {
    expect(broken({}, [[0, 'Early']])).toEqual([]);
  });
  it('refuses two, even when they leave time between them', () => {
    const plan: Plan = [
      [0, 'Early'],
      [0, 'Night'],
    ];
    expect(broken({ rules: { restMinutes: 0 } }, plan)).toEqual(['day']);
  });
});
