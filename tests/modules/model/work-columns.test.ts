import { describe, expect, it } from 'vitest';
import { buildRosterModel, findObstacle } from '@/modules/model';
import type { ProblemPerson } from '@/modules/problem';
import { buildFloor, buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';

/** What stands between the first person and the Night of Monday (23:00 to 07:00). */
function obstacle(person: Partial<ProblemPerson>, sketch: ProblemSketch = {}) {
  const problem = buildProblem({ ...sketch, people: [person] });
  const night = problem.shifts[3];
  const first = problem.people[0];
  return night && first ? findObstacle(problem, first, night) : null;
}

describe('what keeps a person off a shift', () => {
  it('is nothing for a person with the skill, the time and the right contract', () => {
    expect(obstacle({})).toBeNull();
  });
  it.each([
    ['ends as the shift starts', 600, 1380, null],
    ['starts as the shift ends', 1860, 3000, null],
    ['overlaps its first minute', 600, 1381, { kind: 'absent', reason: 'leave' }],
    ['overlaps its last minute', 1859, 3000, { kind: 'absent', reason: 'leave' }],
  ])('is an absence only when it %s', (_, startMinute, endMinute, expected) => {
    expect(obstacle({ absences: [{ startMinute, endMinute, reason: 'leave' }] })).toEqual(expected);
  });
  it('is a contract without Nights', () => {
    expect(obstacle({ mayWorkNights: false })).toEqual({ kind: 'no-nights' });
  });
  it('is a shift kind that takes none of the skills', () => {
    const kinds = buildProblem()
      .shifts.slice(0, 4)
      .map(({ kindId, startMinute, endMinute, isNight }) => ({
        id: kindId,
        startMinute,
        endMinute,
        isNight,
        postSkillIds: ['vet'],
      }));
    expect(obstacle({}, { kinds })).toEqual({ kind: 'no-skill' });
    expect(obstacle({ skillIds: ['nurse', 'vet'] }, { kinds })).toBeNull();
  });
  it('is too little rest after a shift before the period', () => {
    const last = { dayIndex: -1, startMinute: -60, endMinute: 721, isNight: true };
    expect(obstacle({ history: [last] })).toEqual({ kind: 'rest-after-history' });
    expect(obstacle({ history: [{ ...last, endMinute: 720 }] })).toBeNull();
  });
});

describe('posts', () => {
  const postsOnEarly = (sketch: ProblemSketch) =>
    buildRosterModel(buildProblem(sketch))
      .works[0]?.byDay[0]?.filter(({ shift }) => shift.kindId === 'Early')
      .map(({ postSkillId }) => postSkillId);

  it('are the skills that seated floors ask for during the shift', () => {
    const people = [{ skillIds: ['desk', 'nurse', 'vet'] }];
    const floors = [buildFloor({ skillId: 'nurse' }), buildFloor({ skillId: 'vet' })];
    expect(postsOnEarly({ people, floors })).toEqual(['nurse', 'vet']);
  });
  it('are the home skill alone where no seated floor asks', () => {
    const people = [{ skillIds: ['desk', 'nurse'] }];
    const floors = [buildFloor({ counting: 'shared' }), buildFloor({ people: 0 })];
    expect(postsOnEarly({ people, floors })).toEqual(['desk']);
  });
  it('include a pinned post', () => {
    const pins = [{ dayIndex: 0, shiftIndex: 0, postSkillId: 'desk' }];
    const people = [{ skillIds: ['nurse', 'desk'], pins }];
    expect(postsOnEarly({ people, floors: [buildFloor()] })).toEqual(['nurse', 'desk']);
  });
});
