import { describe, expect, it } from 'vitest';
import { broken, days, type Plan, past } from './broken-plan';

describe('shortest run of days', () => {
  const rules = { shortestRunDays: 3 };
  it.each<[string, Plan, string[]]>([
    ['one day alone', days(2, 2), ['shortrun']],
    ['two days', days(2, 3), ['shortrun']],
    ['three days', days(2, 4), []],
    ['one day at the first of the period, the rest of which lies before it', days(0, 0), []],
    ['two days to its last', days(5, 6), []],
    ['one day just inside the last', days(5, 5), ['shortrun']],
    ['two short runs', [...days(1, 1), ...days(3, 4)], ['shortrun']],
  ])('%s', (_, plan, families) => {
    expect(broken({ rules }, plan)).toEqual(families);
  });

  it('takes no day before the period into account', () => {
    const people = [{ history: [past(-1, 420, 900)] }];
    expect(broken({ rules, people }, days(1, 2))).toEqual(['shortrun']);
  });

  it('lets a day on which the person cannot work end a run', () => {
    const absences = [{ startMinute: 1440, endMinute: 2880, reason: 'leave' }];
    expect(broken({ rules, people: [{ absences }] }, days(2, 3))).toEqual(['shortrun']);
    expect(broken({ rules, people: [{ absences }] }, days(2, 4))).toEqual([]);
  });
});

describe('shortest run of days off', () => {
  const rules = { shortestRunFreeDays: 2 };
  it.each<[string, Plan, string[]]>([
    ['one day off between two runs', [...days(1, 2), ...days(4, 5)], ['shortfree']],
    ['two days off', [...days(1, 2), ...days(5, 6)], []],
    ['one day off at the first of the period', days(1, 6), []],
    ['one day off at its last', days(0, 5), []],
  ])('%s', (_, plan, families) => {
    expect(broken({ rules }, plan)).toEqual(families);
  });

  it('counts a day of leave as a day off', () => {
    const absences = [{ startMinute: 4320, endMinute: 5760, reason: 'leave' }];
    const plan = [...days(1, 2), ...days(4, 5)];
    expect(broken({ rules, people: [{ absences }] }, plan)).toEqual(['shortfree']);
  });
});
