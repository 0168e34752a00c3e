import { describe, expect, it } from 'vitest';
import {
  capacityLacks,
  type Problem,
  type Requirement,
  requirementKey,
  requirementsOf,
} from '@/modules/problem';
import { findKnots } from '@/modules/solver/knots/find-knots';
import { firmPart } from '@/modules/solver/knots/firm-part';
import type { Knot } from '@/modules/solver/knots/knot';
import { isHoldable } from '@/modules/solver/knots/whole-test';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildProblem } from '@/tests/support/problem-builder';
import { smallProblems } from '@/tests/support/random-problems';
import { realTools } from './analysis-solver';

const find = (problem: Problem, shortAtMinutes: readonly number[] = []) =>
  findKnots(realTools, problem, { limitSeconds: 20, mostKnots: 4, shortAtMinutes });

/** Whether these requirements alone can be held in whole shifts. */
function holds(problem: Problem, members: readonly Requirement[]): boolean {
  const keys = new Set(members.map(requirementKey));
  const others = requirementsOf(problem).filter((one) => !keys.has(requirementKey(one)));
  return isHoldable(realTools, firmPart(problem), others, 20) === 'yes';
}

/** A knot clashes; when it says it is smallest, any one member less does not. */
function expectKnot(problem: Problem, { members, isMinimal }: Knot): void {
  expect(holds(problem, members)).toBe(false);
  if (!isMinimal) return;
  for (const left of members) {
    expect(
      holds(
        problem,
        members.filter((member) => member !== left),
      ),
    ).toBe(true);
  }
}

const floor = (floorId: string, day: number, start: number, more = {}) => ({
  floorId,
  dayIndex: day,
  startMinute: day * 1440 + start,
  endMinute: day * 1440 + start + 480,
  ...more,
});
const early = 420;
const late = 900;
const leave = (first: number, last: number) => ({
  startMinute: first * 1440,
  endMinute: (last + 1) * 1440,
  reason: 'Leave',
});

describe('knots', () => {
  it('are none where everything holds', () => {
    expect(find(buildProblem({ floors: [floor('early', 0, early)] }))).toEqual({
      knots: [],
      isComplete: true,
    });
  });

  it('count heads first: a floor against a leave, in words', () => {
    const problem = buildProblem({
      people: [{}, { skillIds: ['desk'] }],
      floors: [floor('nurse early', 3, early)],
    });
    const [ione, ...others] = problem.people;
    if (!ione) throw new Error('nobody');
    const away = { ...problem, people: [{ ...ione, absences: [leave(2, 4)] }, ...others] };
    const { knots, isComplete } = find(away);
    expect(isComplete).toBe(true);
    expect(knots).toMatchObject([
      {
        isMinimal: true,
        sentence: 'On Thu 4 Feb, Early, the Nurse floors need 1 person; 0 can be there at most.',
        words: ['Nurse Early on Thu 4 Feb needs 1', "Ione Baptisto's leave 3-5 Feb"],
      },
    ]);
  });

  it('find what only rest forbids, and nothing that has no part in it', () => {
    const problem = buildProblem({
      people: [{ pins: [{ dayIndex: 5, shiftIndex: null, postSkillId: null }] }],
      rules: { longestRunDays: 5, weekendsPerPeriod: 1 },
      floors: [floor('late', 1, late), floor('early', 2, early), floor('early', 4, early)],
    });
    const { knots, isComplete } = find(problem);
    expect(isComplete).toBe(true);
    expect(knots).toMatchObject([
      {
        isMinimal: true,
        sentence: null,
        words: [
          'Nurse Late on Tue 2 Feb needs 1',
          'Nurse Early on Wed 3 Feb needs 1',
          'rest of 11 h',
        ],
      },
    ]);
    expectKnot(problem, knots[0] as Knot);
  });

  it('are several where several clashes have nothing but a limit in common', () => {
    const problem = buildProblem({
      floors: [
        floor('late', 0, late),
        floor('early', 1, early),
        floor('late', 4, late),
        floor('early', 5, early),
      ],
    });
    const { knots, isComplete } = find(problem);
    expect(isComplete).toBe(true);
    expect(knots).toHaveLength(2);
    for (const knot of knots) expectKnot(problem, knot);
    const floors = knots.flatMap(({ members }) => members.filter(({ kind }) => kind === 'floor'));
    expect(new Set(floors.map(requirementKey)).size).toBe(4);
  });

  it('see clashes that only whole shifts have', () => {
    const person = { contractMinutes: 480, maximumMinutes: 720 };
    const problem = buildProblem({
      people: [person, person, person],
      floors: [0, 1, 2, 3].map((day) => floor('early', day, early)),
    });
    expect(capacityLacks(problem)).toEqual([]);
    const { knots } = find(problem);
    expect(knots).toHaveLength(1);
    expect(knots[0]).toMatchObject({ isMinimal: true, sentence: null });
    expect(knots[0]?.members).toHaveLength(4 + 3);
    expectKnot(problem, knots[0] as Knot);
  });

  it('name a clash within one person, who has no lawful line', () => {
    const problem = buildProblem({
      people: [{ minimumMinutes: 2400 }],
      rules: { longestRunDays: 1 },
      floors: [floor('early', 0, early)],
    });
    const { knots } = find(problem);
    expect(knots[0]?.words).toEqual([
      'at most 1 day in a row',
      "Ione Baptisto's contract of at least 40 h",
    ]);
  });

  it('stay small in a hospital of 24 people: two Vets on Night while one is on leave', () => {
    const demo = demoSizedProblem();
    const floors = demo.floors.map((one) =>
      one.floorId === 'Vet Night' && one.dayIndex >= 14 && one.dayIndex <= 18
        ? { ...one, people: 2 }
        : one,
    );
    const problem = { ...demo, floors };
    const { knots, isComplete } = find(problem, [17 * 1440 + 1380]);
    expect(isComplete).toBe(true);
    expect(knots[0]?.words).toContain("Maren Oduya's leave 15-19 Feb");
    expect(knots[0]?.words).toContain('rest of 11 h');
    expect(knots[0]?.members.length).toBeLessThanOrEqual(8);
    for (const knot of knots) expectKnot(problem, knot);
  });

  it('say when they were cut by their time', () => {
    const floors = [floor('late', 1, late), floor('early', 2, early)];
    const options = { limitSeconds: 0, mostKnots: 4, shortAtMinutes: [] };
    expect(findKnots(realTools, buildProblem({ floors }), options)).toEqual({
      knots: [],
      isComplete: false,
    });
    const heads = buildProblem({ people: [{ skillIds: ['desk'] }], floors: [{}] });
    expect(findKnots(realTools, heads, options)).toMatchObject({
      knots: [{ isMinimal: false, sentence: expect.any(String) }],
      isComplete: false,
    });
  });

  it('are the same each time', () => {
    const problem = buildProblem({
      people: [{}, {}],
      rules: { longestRunDays: 3 },
      floors: [0, 1, 2, 3, 4].flatMap((day) => [
        floor('early', day, early),
        floor('late', day, late),
      ]),
    });
    expect(find(problem)).toEqual(find(problem));
  });

  it('clash, and are smallest where they say so, on problems of every kind', () => {
    let found = 0;
    for (const problem of smallProblems(60, 7)) {
      const { knots, isComplete } = find(problem);
      found += knots.length;
      for (const knot of knots) expectKnot(problem, knot);
      if (knots.length === 0 && isComplete) {
        expect(holds(problem, requirementsOf(problem))).toBe(true);
      }
      expect(isComplete || knots.length === 4).toBe(true);
    }
    expect(found).toBeGreaterThan(20);
  });
});
