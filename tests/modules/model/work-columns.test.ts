import { describe, expect, it } from 'vitest';
import { buildRosterModel, findObstacle, objectiveOf } from '@/modules/model';
import type { ProblemPerson } from '@/modules/problem';
import {
  buildFloor,
  buildProblem,
  buildRules,
  type ProblemSketch,
} from '@/tests/support/problem-builder';

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
  it('is too little rest before a shift published after the period', () => {
    const next = { dayIndex: 1, startMinute: 2519, endMinute: 3000, isNight: false };
    expect(obstacle({ following: [next] })).toEqual({ kind: 'rest-before-following' });
    expect(obstacle({ following: [{ ...next, startMinute: 2520 }] })).toBeNull();
  });
  it('is a limit of none of its kind', () => {
    expect(obstacle({ kindLimits: [{ kindId: 'Night', most: 0 }] })).toEqual({
      kind: 'kind-limit',
    });
    expect(obstacle({ kindLimits: [{ kindId: 'Night', most: 1 }] })).toBeNull();
  });
  it('goes by the rest of the person where they have rules of their own', () => {
    const last = { dayIndex: -1, startMinute: -60, endMinute: 721, isNight: true };
    const rules = buildRules({ restMinutes: 600 });
    expect(obstacle({ history: [last], rules })).toBeNull();
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
  it('are all that the person holds where a seated ceiling may make another worth having', () => {
    const people = [{ skillIds: ['desk', 'nurse'] }];
    const floors = [buildFloor()];
    expect(postsOnEarly({ people, floors, ceilings: [{}] })).toEqual(['desk', 'nurse']);
    expect(postsOnEarly({ people, floors, ceilings: [{ skillId: null }] })).toEqual(['nurse']);
  });
});

describe('wishes', () => {
  const wish = { dayIndex: 0, shiftIndex: null, priceCents: 300 };
  const costsOf = (wishes: ProblemPerson['wishes']) => {
    const person = { contractMinutes: 0, payCentsPerHour: 0, paidBy: 'hours' as const, wishes };
    const model = buildRosterModel(buildProblem({ dayCount: 2, people: [person] }));
    const { costs, offset } = objectiveOf(model.linear, 'cost');
    return { offset, costs: [...costs.slice(0, 8)] };
  };
  it('not to work cost their price on each shift they name', () => {
    expect(costsOf([{ ...wish, wants: 'off' }])).toEqual({
      offset: 0,
      costs: [300, 300, 300, 300, 0, 0, 0, 0],
    });
  });
  it('to work cost it until a shift they name is planned', () => {
    expect(costsOf([{ ...wish, wants: 'on', shiftIndex: 2 }])).toEqual({
      offset: 300,
      costs: [0, 0, -300, 0, 0, 0, 0, 0],
    });
  });
});
