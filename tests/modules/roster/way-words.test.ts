import { expect, test } from 'vitest';
import type { Requirement } from '@/modules/problem';
import { changeOf } from '@/modules/roster/way-words';
import { buildProblem } from '@/tests/support/problem-builder';

const problem = buildProblem();
const ofIone = { personId: 'ione' } as const;

test.each<[Requirement, string]>([
  [{ kind: 'floor', floorId: 'floor-1', dayIndex: 0 }, 'One person fewer: it'],
  [{ kind: 'ceiling', ceilingId: 'ceiling-1', dayIndex: 0 }, 'One person more: it'],
  [{ kind: 'limit', limit: 'restMinutes' }, 'One hour less: it'],
  [{ kind: 'limit', limit: 'longestRunDays' }, 'One more: it'],
  [{ kind: 'ownLimit', ...ofIone, limit: 'shortestRunFreeDays' }, 'One fewer: it'],
  [{ kind: 'leastHours', ...ofIone }, 'One shift less: it'],
  [{ kind: 'mostHours', ...ofIone }, 'One shift more: it'],
  [{ kind: 'absence', ...ofIone, startMinute: 0, endMinute: 1440 }, 'Do without: it'],
  [{ kind: 'teamRule', ruleId: 'pair' }, 'Do without: it'],
])('the least step of %o is told as something to do', (requirement, words) => {
  expect(changeOf(problem, requirement, 'it', 'step').words).toBe(words);
  expect(changeOf(problem, requirement, 'it', 'dropped').words).toBe('Do without: it');
});

test('what binds a person asks that person first; what does not, whoever answers for it', () => {
  expect(changeOf(problem, { kind: 'noNights', ...ofIone }, 'it', 'step')).toMatchObject({
    ask: 'Ask Ione Baptisto first',
    asksPerson: true,
  });
  const limit: Requirement = { kind: 'limit', limit: 'longestRunDays' };
  expect(changeOf(problem, limit, 'it', 'step')).toMatchObject({
    ask: 'Whoever answers for the rules of the team',
    asksPerson: false,
  });
});
