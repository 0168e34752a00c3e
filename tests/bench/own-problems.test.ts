import { describe, expect, it } from 'vitest';
import { readProblem } from '@/modules/problem';
import { demoProblem } from './demo-problem';
import { makeTeam } from './make-team';

describe('the problems that the benchmark makes', () => {
  it.each([
    ['the demo', demoProblem()],
    ['a team of 10', makeTeam(10, 1)],
    ['a team of 160', makeTeam(160, 1)],
  ])('%s is a document that the product reads', (_, problem) => {
    expect(readProblem(problem)).toEqual({ ok: true, value: problem });
  });

  it('has 36 wishes, shared floors and both spreads in the demo', () => {
    const { people, floors, fairness, pay } = demoProblem();
    expect(people.flatMap(({ wishes }) => wishes)).toHaveLength(36);
    expect(floors.filter(({ counting }) => counting === 'shared')).toHaveLength(84);
    expect(fairness.map((term) => term.kind === 'spread' && term.measure)).toEqual([
      'nights',
      'weekends',
    ]);
    expect(pay.overtimeSteps.at(-1)).toEqual({ overMinutes: 960, percent: 200 });
  });

  it('makes the same team for the same seed, and one that the floors leave little room', () => {
    expect(makeTeam(20, 1)).toEqual(makeTeam(20, 1));
    expect(makeTeam(20, 1)).not.toEqual(makeTeam(20, 2));
    const { people, floors } = makeTeam(40, 1);
    const given = people.reduce((sum, one) => sum + one.contractMinutes - one.creditMinutes, 0);
    const asked = floors.reduce(
      (sum, floor) => sum + floor.people * (floor.endMinute - floor.startMinute),
      0,
    );
    expect(asked / given).toBeGreaterThan(0.85);
    expect(asked / given).toBeLessThan(0.9);
  });
});
