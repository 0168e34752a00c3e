import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { buildRosterModel, readRoster } from '@/modules/model';
import {
  capacityLacks,
  describeRequirement,
  loosen,
  type Problem,
  type Requirement,
  requirementKey,
  requirementsOf,
  without,
} from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { solveLinearModel } from '@/modules/solver/highs-adapter';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildProblem } from '@/tests/support/problem-builder';
import { smallProblems } from '@/tests/support/random-problems';

const highs = await loadHighs();

/** Any roster that keeps the rules of each person; null when there is none. */
function anyRoster(problem: Problem) {
  const model = buildRosterModel(problem);
  const outcome = solveLinearModel(highs, model.linear, 'cost', { limitSeconds: 20 });
  return outcome.kind === 'optimal' ? readRoster(model, outcome.solution.values) : null;
}

const demo = demoSizedProblem();
const say = (requirement: Requirement) => describeRequirement(demo, requirement);

describe('requirements', () => {
  it('are said in the words of whoever entered them', () => {
    const personId = 'person-0';
    const absence = { startMinute: 14 * 1440, endMinute: 19 * 1440 };
    expect(say({ kind: 'floor', floorId: 'Vet Night', dayIndex: 10 })).toBe(
      'Vet Night on Thu 11 Feb needs 1',
    );
    expect(say({ kind: 'limit', limit: 'restMinutes' })).toBe('rest of 11 h');
    expect(say({ kind: 'limit', limit: 'longestRunDays' })).toBe('at most 5 days in a row');
    expect(say({ kind: 'absence', personId, ...absence })).toBe("Maren Oduya's leave 15-19 Feb");
    expect(say({ kind: 'mostHours', personId })).toBe("Maren Oduya's contract of at most 184 h");
    expect(say({ kind: 'noNights', personId: 'person-5' })).toBe('Ciaran Vought works no Nights');
  });

  it('are listed once each, whatever a problem says', () => {
    for (const problem of smallProblems(50, 3)) {
      const keys = requirementsOf(problem).map(requirementKey);
      expect(new Set(keys).size).toBe(keys.length);
      for (const requirement of requirementsOf(problem)) {
        expect(describeRequirement(problem, requirement)).not.toMatch(/undefined|null|NaN/);
      }
    }
  });

  it('only give room when they are dropped or loosened: a lawful roster stays lawful', () => {
    let tried = 0;
    for (const problem of smallProblems(60, 11)) {
      const roster = anyRoster(problem);
      if (!roster) continue;
      const before = proveRoster(problem, roster).breaches.length;
      for (const requirement of requirementsOf(problem)) {
        for (const wider of [without(problem, [requirement]), loosen(problem, requirement)]) {
          tried += 1;
          expect(proveRoster(wider, roster).breaches.length).toBeLessThanOrEqual(before);
        }
      }
    }
    expect(tried).toBeGreaterThan(500);
  });
});

describe('capacity sums', () => {
  it('say nothing of a team that holds its floors', () => {
    expect(capacityLacks(demo)).toEqual([]);
  });

  it('prove a shortage of hours by week and skill', () => {
    const problem = {
      ...demo,
      people: demo.people.filter((_, index) => index !== 1 && index !== 2),
    };
    const lacks = capacityLacks(problem);
    // Four Vets: six of seven days at most by five days in a row, 48 h each; on leave Maren has 16 h.
    expect(lacks.map(({ sentence }) => sentence)).toEqual([
      'In the week of 1 Feb the Vet floors need 208 h; people who hold Vet can give 192 h at most.',
      'In the week of 8 Feb the Vet floors need 208 h; people who hold Vet can give 192 h at most.',
      'In the week of 15 Feb the Vet floors need 208 h; people who hold Vet can give 160 h at most.',
      'In the week of 22 Feb the Vet floors need 208 h; people who hold Vet can give 192 h at most.',
      'From 1 Feb to 28 Feb the Vet floors need 832 h; people who hold Vet can give 600 h at most.',
    ]);
  });

  it('prove a shortage of heads, and name two skills only where one is not enough', () => {
    const problem = buildProblem({
      people: [{ skillIds: ['nurse', 'vet'] }, { skillIds: ['nurse'] }],
      floors: [{ people: 2 }, { skillId: 'vet' }],
    });
    expect(capacityLacks(problem)[0]?.sentence).toBe(
      'On Mon 1 Feb, Early, the Nurse and Vet floors need 3 people; 2 can be there at most.',
    );
  });
});
