import { describe, expect, it } from 'vitest';
import { type Problem, problemSchema, readProblem } from '@/modules/problem';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildFloor, buildProblem, buildRules } from '@/tests/support/problem-builder';

/** What a refused document is told: each place and sentence. */
function faultsOf(document: unknown): readonly string[] {
  const outcome = readProblem(document);
  if (outcome.ok) throw new Error('The document was taken.');
  expect(outcome.error.code).toBe('invalid');
  expect(outcome.error.detail).toBe(outcome.error.fields?.[0]?.message);
  return outcome.error.fields?.map(({ message }) => message) ?? [];
}

/** A document of version 1, as a run of that time holds it. */
function firstVersion(problem: Problem): unknown {
  const { ceilings, teamRules, fairness, people, floors, rules, pay, ...rest } = problem;
  const { shortestRunDays, shortestRunFreeDays, kindsThatMayNotFollow, ...limits } = rules;
  const { overtimeSteps, ...premiums } = pay;
  return {
    ...rest,
    version: 1,
    rules: limits,
    pay: { ...premiums, overtimePercent: 150 },
    floors: floors.map(({ priority, ...floor }) => floor),
    people: people.map(
      ({ following, rules: own, kindLimits, wishes, isOutside, ...person }) => person,
    ),
  };
}

describe('reading a problem', () => {
  it('gives back a document of this version', () => {
    const problem = demoSizedProblem();
    expect(readProblem(JSON.parse(JSON.stringify(problem)))).toEqual({ ok: true, value: problem });
  });

  it('brings a document of version 1 up to today', () => {
    const problem = demoSizedProblem();
    expect(readProblem(firstVersion(problem))).toEqual({ ok: true, value: problem });
    expect(problemSchema.parse(problem)).toEqual(problem);
  });

  it.each([null, 3, 'problem', [], {}])('refuses %j with a sentence', (document) => {
    expect(faultsOf(document)[0]).toMatch(/[A-Za-z].*\.$/);
  });
});

describe('what is not known', () => {
  const problem = buildProblem();
  const known = 'is not known to this version; remove it, or use a version that knows it.';

  it.each<[string, unknown, string]>([
    ['a rule', { ...problem, rules: { ...problem.rules, longestNap: 3 } }, 'The rule longestNap'],
    [
      'a rule of one person',
      { ...problem, people: [{ ...problem.people[0], rules: { ...buildRules(), longestNap: 3 } }] },
      'The rule longestNap',
    ],
    [
      'a team rule',
      { ...problem, teamRules: [{ id: 'r', name: 'r', priceCents: null, kind: 'alternate' }] },
      'The team rule alternate',
    ],
    [
      'a fairness term',
      { ...problem, fairness: [{ kind: 'lottery', measure: 'nights' }] },
      'The fairness term lottery',
    ],
  ])('is refused by its name: %s', (_, document, named) => {
    expect(faultsOf(document)).toEqual([`${named} ${known}`]);
  });

  it('is refused in a document of version 1 too', () => {
    const first = firstVersion(problem) as { rules: object };
    expect(faultsOf({ ...first, rules: { ...first.rules, longestNap: 3 } })).toEqual([
      `The rule longestNap ${known}`,
    ]);
  });

  it('is a later version', () => {
    expect(faultsOf({ ...problem, version: 3 })[0]).toBe(
      'Version 3 of the problem is not known to this version of the program; use a newer program.',
    );
  });

  it('is a field that nothing reads, and a value that does not fit', () => {
    expect(faultsOf({ ...problem, mood: 'good' })).toEqual([
      'The problem document holds mood, which nothing reads; remove it.',
    ]);
    const [fault] = faultsOf({ ...problem, floors: [buildFloor({ priority: 10 })] });
    expect(fault).toMatch(/^floors\.0\.priority does not fit: .* Correct it\.$/);
  });
});

describe('what names something that is not there', () => {
  const linear = (personId: string, shiftIndex: number) => ({
    id: 'sum',
    name: 'Sum',
    priceCents: null,
    kind: 'linear' as const,
    terms: [{ personId, shiftIndex, coefficient: 1 }],
    least: null,
    most: 1,
  });
  const wish = { dayIndex: 0, shiftIndex: null, wants: 'on' as const, priceCents: 1 };

  it.each<[string, Parameters<typeof buildProblem>[0], string]>([
    [
      'a wish for a day',
      { people: [{ wishes: [{ ...wish, dayIndex: 9 }] }] },
      'people.0.wishes.0.dayIndex names the day 9, which this problem does not have; correct it.',
    ],
    [
      'a wish for a shift',
      { people: [{ wishes: [{ ...wish, shiftIndex: 99 }] }] },
      'people.0.wishes.0.shiftIndex names the shift 99, which this problem does not have; correct it.',
    ],
    [
      'a wish for a shift of another day',
      { people: [{ wishes: [{ ...wish, shiftIndex: 4 }] }] },
      'people.0.wishes.0.shiftIndex names the shift 4, which starts on another day; correct one of them.',
    ],
    [
      'a pin',
      { people: [{ pins: [{ dayIndex: 0, shiftIndex: 28, postSkillId: null }] }] },
      'people.0.pins.0.shiftIndex names the shift 28, which this problem does not have; correct it.',
    ],
    [
      'a pair',
      {
        teamRules: [
          {
            id: 'pair',
            name: 'Pair',
            priceCents: null,
            kind: 'together',
            personIds: ['ione', 'nobody'],
          },
        ],
      },
      'teamRules.0.personIds names the person nobody, which this problem does not have; correct it.',
    ],
    [
      'a person in a sum',
      { teamRules: [linear('nobody', 0)] },
      'teamRules.0.terms.0.personId names the person nobody, which this problem does not have; correct it.',
    ],
    [
      'a shift in a sum',
      { teamRules: [linear('ione', 77)] },
      'teamRules.0.terms.0.shiftIndex names the shift 77, which this problem does not have; correct it.',
    ],
    [
      'a skill of a floor',
      { floors: [{ skillId: 'baker' }] },
      'floors.0.skillId names the skill baker, which this problem does not have; correct it.',
    ],
    [
      'a kind that may not follow',
      { rules: { kindsThatMayNotFollow: [{ kindId: 'Late', nextKindId: 'Dawn' }] } },
      'rules.kindsThatMayNotFollow names the shift kind Dawn, which this problem does not have; correct it.',
    ],
    [
      'a kind with a limit',
      { people: [{ kindLimits: [{ kindId: 'Dawn', most: 1 }] }] },
      'people.0.kindLimits names the shift kind Dawn, which this problem does not have; correct it.',
    ],
    [
      'two people with one id',
      { people: [{ id: 'ione' }, { id: 'ione' }] },
      'people.1.id is taken; give each person an id of their own.',
    ],
    [
      'a ceiling that ends before it starts',
      { ceilings: [{ startMinute: 900, endMinute: 420 }] },
      'ceilings.0.endMinute ends before it starts; exchange the two.',
    ],
  ])('%s', (_, sketch, sentence) => {
    expect(faultsOf(buildProblem(sketch))).toEqual([sentence]);
  });

  it('is told at most twenty times', () => {
    const floors = Array.from({ length: 30 }, () => ({ skillId: 'baker' }));
    expect(faultsOf(buildProblem({ floors }))).toHaveLength(20);
  });
});
