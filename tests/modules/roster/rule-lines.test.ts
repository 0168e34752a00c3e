import { expect, test } from 'vitest';
import { ruleLines } from '@/modules/roster/rule-lines';

test('each rule that is on is told with its limit and its source', () => {
  const lines = ruleLines({
    restMinutes: 660,
    longestRunDays: 5,
    longestRunNights: 1,
    nightsPerPeriod: null,
    weekendsPerPeriod: 3,
    weekendCountsFridayNight: false,
  });
  expect(lines.map(({ label, limit }) => `${label}: ${limit}`)).toEqual([
    'Rest between shifts: 11 h',
    'Days in a row, at most: 5 days',
    'Nights in a row, at most: 1 night',
    'Weekends worked in a period, at most: 3 weekends',
  ]);
  expect(lines[0]?.source).toContain('2003/88/EC');
});
