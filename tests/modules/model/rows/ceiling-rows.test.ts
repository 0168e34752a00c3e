import { describe, expect, it } from 'vitest';
import { buildRosterModel, placeRoster, weighRoster } from '@/modules/model';
import type { ProblemCeiling } from '@/modules/problem';
import { assign, buildProblem } from '@/tests/support/problem-builder';

const people = [
  { contractMinutes: 0, paidBy: 'hours' as const, payCentsPerHour: 0 },
  { contractMinutes: 0, paidBy: 'hours' as const, payCentsPerHour: 0 },
  {
    contractMinutes: 0,
    paidBy: 'hours' as const,
    payCentsPerHour: 0,
    skillIds: ['vet', 'nurse'],
  },
];
const ids = ['ione', 'person-2', 'person-3'];

/** Surplus and cost of so many people on the first Early, in posts of these skills. */
function weigh(ceilings: readonly Partial<ProblemCeiling>[], posts: readonly string[]) {
  const problem = buildProblem({ dayCount: 1, people, ceilings });
  const model = buildRosterModel(problem);
  const roster = posts.map((post, index) => assign(problem, ids[index] ?? '', 0, 'Early', post));
  const { levels, costCents } = weighRoster(model, placeRoster(model, roster));
  return { names: model.levels.map(({ name }) => name), levels, costCents };
}

describe('ceilings', () => {
  it('count person-minutes above a firm one as a level of their own', () => {
    expect(weigh([{}], ['nurse', 'nurse'])).toEqual({
      names: ['surplus'],
      levels: [480],
      costCents: 0,
    });
    expect(weigh([{}], ['nurse'])).toMatchObject({ levels: [0] });
  });
  it('cost their price for each person-minute above, rounded once for each stretch', () => {
    // Two people above over 10 minutes at 7 an hour: 2.33, and nothing after that.
    const ceiling = { people: 0, endMinute: 430, priceCentsPerHour: 7 };
    expect(weigh([ceiling], ['nurse', 'nurse'])).toEqual({ names: [], levels: [], costCents: 2 });
  });
  it('count people in the post when seated, and everybody who holds the skill when shared', () => {
    const posts = ['nurse', 'nurse', 'vet'];
    expect(weigh([{}], posts).levels).toEqual([480]);
    expect(weigh([{ counting: 'shared' }], posts).levels).toEqual([960]);
    expect(weigh([{ skillId: null }], posts).levels).toEqual([960]);
    expect(weigh([{ skillId: 'vet', people: 0 }], posts).levels).toEqual([480]);
  });
  it('stand alone where they overlap', () => {
    expect(weigh([{}, { people: 0 }], ['nurse', 'nurse']).levels).toEqual([480 + 960]);
  });
  it('have rows only where people enough could come', () => {
    expect(buildRosterModel(buildProblem({ ceilings: [{}] })).ceilings).toEqual([]);
    const rows = buildRosterModel(buildProblem({ people: [{}, {}], ceilings: [{}] })).ceilings;
    expect(rows.map(({ startMinute, endMinute }) => [startMinute, endMinute])).toEqual([
      [420, 540],
      [540, 900],
    ]);
  });
});
