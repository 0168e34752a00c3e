import { expect, test } from 'vitest';
import type { ProvenShortage } from '@/modules/proof';
import { shortageLines } from '@/modules/roster/shortage-lines';
import { buildProblem } from '../../support/problem-builder';

const shortage = (changes: Partial<ProvenShortage>): ProvenShortage => ({
  floorIds: ['floor-1'],
  skillId: 'vet',
  date: '2027-02-01',
  startMinute: 1380,
  endMinute: 1860,
  missingPeople: 1,
  isFirm: true,
  ...changes,
});

test('a shortage is told by date, window and skill, earliest first', () => {
  const lines = shortageLines(buildProblem({ dayCount: 14 }), [
    shortage({ startMinute: 10 * 1440 + 1380, endMinute: 10 * 1440 + 1860 }),
    shortage({ skillId: null, startMinute: 420, endMinute: 900, missingPeople: 2 }),
    shortage({ skillId: 'nurse', startMinute: 540, endMinute: 600, isFirm: false }),
  ]);
  expect(lines).toEqual([
    'Mon 1 Feb 07:00-15:00, anybody: short 2',
    'Mon 1 Feb 09:00-10:00, Nurse: short 1 (wished)',
    'Thu 11 Feb 23:00-07:00, Vet: short 1',
  ]);
});

test('windows read as the wall clock shows them, also after the clock was put forward', () => {
  // 28 March 2027, Berlin: 02:00 becomes 03:00, so that minute 360 of the axis is 07:00.
  const problem = buildProblem({ startsOn: '2027-03-28', zone: 'Europe/Berlin' });
  expect(shortageLines(problem, [shortage({ startMinute: 360, endMinute: 840 })])).toEqual([
    'Sun 28 Mar 07:00-15:00, Vet: short 1',
  ]);
});
