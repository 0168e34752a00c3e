import { describe, expect, it } from 'vitest';
import { buildRosterModel } from '@/modules/model';
import { brokenFamilies } from '@/tests/support/broken-rows';
import { assign, buildProblem } from '@/tests/support/problem-builder';
import { broken } from './broken-plan';

describe('pins', () => {
  it('keeps a shift, in any post or in the one that is pinned', () => {
    const pins = [{ dayIndex: 0, shiftIndex: 0, postSkillId: null }];
    expect(broken({ people: [{ pins }] }, [[0, 'Early']])).toEqual([]);
    expect(broken({ people: [{ pins }] }, [[0, 'Late']])).toEqual(['pin']);
    const posted = [{ dayIndex: 0, shiftIndex: 0, postSkillId: 'vet' }];
    const person = { skillIds: ['nurse', 'vet'], pins: posted };
    const problem = buildProblem({ people: [person] });
    expect(
      brokenFamilies(buildRosterModel(problem), [assign(problem, 'ione', 0, 'Early', 'vet')]),
    ).toEqual([]);
  });
  it('keeps a day free', () => {
    const pins = [{ dayIndex: 1, shiftIndex: null, postSkillId: null }];
    expect(broken({ people: [{ pins }] }, [[0, 'Early']])).toEqual([]);
    expect(broken({ people: [{ pins }] }, [[1, 'Early']])).toEqual(['pin']);
  });
  it('cannot be met when nothing lets the person work the shift', () => {
    const pins = [{ dayIndex: 0, shiftIndex: 3, postSkillId: null }];
    expect(broken({ people: [{ pins, mayWorkNights: false }] }, [[0, 'Night']])).toEqual(['pin']);
  });
});
