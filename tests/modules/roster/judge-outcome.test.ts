import { describe, expect, it } from 'vitest';
import type { PlannedRoster, Problem, TeamRule } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { judgeOutcome } from '@/modules/roster/judge-outcome';
import type { RosterOutcome, SolvedRoster } from '@/modules/solver';
import { assign, buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';

/** One Early of Ione on Monday, one floor of priority 2 short on Tuesday, one person too many on Monday. */
const sketch: ProblemSketch = {
  people: [{ payCentsPerHour: 1999, contractMinutes: 100 }, {}],
  floors: [{ dayIndex: 1, startMinute: 1860, endMinute: 2340, priority: 2 }],
  ceilings: [{ people: 0 }],
};
const plan = (problem: Problem): PlannedRoster => [assign(problem, 'ione', 0, 'Early')];

function solved(problem: Problem, claims: Partial<SolvedRoster> = {}): SolvedRoster {
  const roster = plan(problem);
  const { shortageMinutes, costCents } = proveRoster(problem, roster);
  return {
    roster,
    shortageMinutes,
    shortageBoundMinutes: shortageMinutes,
    costCents,
    boundCents: costCents - 1,
    gap: 0,
    levels: [480, 480],
    boundRecord: null,
    recordedBoundCents: null,
    ...claims,
  };
}

const judge = (claims: Partial<SolvedRoster> = {}, change: ProblemSketch = {}) => {
  const problem = buildProblem({ ...sketch, ...change });
  return judgeOutcome(problem, { kind: 'optimal', ...solved(problem, claims) });
};

describe('a roster on which solver and re-check agree', () => {
  it('is adopted with its proof and bound', () => {
    const problem = buildProblem(sketch);
    expect(judge()).toEqual({
      kind: 'adopt',
      state: 'done',
      roster: plan(problem),
      proof: proveRoster(problem, plan(problem)),
      boundCents: proveRoster(problem, plan(problem)).costCents - 1,
      shortageBoundMinutes: 480,
      isProvenOptimal: true,
    });
  });

  it('is adopted when the solver counts rules of the team as a level too', () => {
    expect(judge({ levels: [0, 480, 480] }).kind).toBe('adopt');
  });

  it('is adopted without a level for ceilings when nobody can be too many', () => {
    expect(judge({ levels: [480] }, { ceilings: [{ people: 2 }] }).kind).toBe('adopt');
  });

  it('may have a bound that is the cost, and is not proven best unless the solver says so', () => {
    const problem = buildProblem(sketch);
    const found = solved(problem);
    const outcome: RosterOutcome = {
      kind: 'stopped',
      best: { ...found, boundCents: found.costCents },
    };
    expect(judgeOutcome(problem, outcome)).toMatchObject({
      kind: 'adopt',
      state: 'stopped',
      isProvenOptimal: false,
    });
  });
});

/** 100 contract minutes at 19.99 an hour and 380 at one and a half, and the contract of the second person. */
const costCents = 3332 + 18_991 + 100_000;

describe('a figure on which they differ refuses the roster', () => {
  it.each([
    [
      'a cent more',
      { costCents: costCents + 1 },
      `${costCents + 1} minor units of cost, the re-check ${costCents}`,
    ],
    [
      'a cent less',
      { costCents: costCents - 1 },
      `${costCents - 1} minor units of cost, the re-check ${costCents}`,
    ],
    ['a minute of shortage', { shortageMinutes: 479 }, '479 missing minutes, the re-check 480'],
    [
      'a minute of one priority',
      { levels: [480, 481] },
      '481 missing minutes of priority 2, the re-check 480',
    ],
    ['a minute of surplus', { levels: [479, 480] }, '479 minutes above ceilings, the re-check 480'],
    ['a level that is missing', { levels: [480] }, '0 minutes above ceilings, the re-check 480'],
    ['all levels missing', { levels: [] }, '0 minutes above ceilings, the re-check 480'],
    ['units of rules', { levels: [2, 480, 480] }, '482 minutes above ceilings, the re-check 480'],
  ])('%s', (_, claim, difference) => {
    expect(judge(claim)).toMatchObject({
      kind: 'refuse',
      sentence: `The independent re-check refused the roster: The solver counts ${difference}. The draft is unchanged.`,
    });
  });

  it('a bound above the cost', () => {
    expect(judge({ boundCents: costCents + 1 })).toMatchObject({
      kind: 'refuse',
      sentence: `The independent re-check refused the roster: The solver's bound of ${costCents + 1} lies above the cost of ${costCents} minor units. The draft is unchanged.`,
    });
  });
});

describe('a broken rule refuses the roster', () => {
  const rule: TeamRule = {
    id: 'pair',
    name: 'Mentor',
    kind: 'together',
    personIds: ['ione', 'person-2'],
    priceCents: null,
  };

  it('a firm one that joins people, by its name', () => {
    expect(judge({}, { teamRules: [rule] })).toMatchObject({
      kind: 'refuse',
      sentence:
        'The independent re-check refused the roster: Mentor: Ione Baptisto is on Early on Mon 1 Feb and Person 2 is not; both or neither may be. The draft is unchanged.',
      proof: { teamRuleUnits: 1 },
    });
  });

  it('but not one that has a price', () => {
    expect(judge({}, { teamRules: [{ ...rule, priceCents: 100 }] }).kind).toBe('adopt');
  });

  it('a budget, without telling the pay', () => {
    const budget: TeamRule = {
      id: 'budget',
      name: 'February',
      kind: 'budget',
      mostCents: 1,
      priceCents: null,
    };
    const verdict = judge({}, { teamRules: [budget] });
    expect(verdict).toMatchObject({
      sentence:
        'The independent re-check refused the roster: February: the pay is above the budget. The draft is unchanged.',
    });
  });
});
