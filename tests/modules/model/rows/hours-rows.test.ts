import { describe, expect, it } from 'vitest';
import { broken, days } from './broken-plan';

describe('contract hours', () => {
  const person = { minimumMinutes: 1440, maximumMinutes: 1920, creditMinutes: 480 };
  it.each<[number, string[]]>([
    [1, ['hours']],
    [2, []],
    [3, []],
    [4, ['hours']],
  ])('%d shifts of 8 h with 8 h of leave, where 24 to 32 h are asked for', (shifts, families) => {
    expect(broken({ people: [person] }, days(0, shifts - 1))).toEqual(families);
  });
  it('counts paid minutes only', () => {
    const kinds = [{ id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 30 }];
    const exact = { minimumMinutes: 900, maximumMinutes: 900 };
    expect(broken({ kinds, people: [exact] }, days(0, 1))).toEqual([]);
    expect(broken({ kinds, people: [exact] }, days(0, 0))).toEqual(['hours']);
  });
});
