import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { footingOf, type ProblemFloor, type ProblemPerson } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { demoSizedProblem } from '@/tests/support/demo-sized-problem';
import { buildFloor, buildProblem } from '@/tests/support/problem-builder';

const hours = (minutes: number): number => minutes / 60;

describe('the footing of the demonstration period', () => {
  /** 424 shifts of 8 hours; contracts give 3,456 h, 152 h of them leave: 88 h of overtime at least. */
  it('needs 88 hours of overtime', () => {
    const footing = footingOf(demoSizedProblem());
    expect(hours(footing.neededMinutes)).toBe(3392);
    expect(hours(footing.availableMinutes)).toBe(3304);
    expect(hours(footing.overtimeNeededMinutes)).toBe(88);
    expect(
      footing.bySkill.map(({ name, neededMinutes, ownMinutes }) => [
        name,
        hours(neededMinutes),
        hours(ownMinutes),
      ]),
    ).toEqual([
      ['Vet', 832, 824],
      ['Nurse', 1288, 1152],
      ['Ward', 672, 712],
      ['Desk', 600, 616],
    ]);
  });

  it('still asks vets for overtime when everybody else has plenty', () => {
    const { people } = demoSizedProblem();
    const footing = footingOf(
      demoSizedProblem({
        people: people.map((person) =>
          person.skillIds[0] === 'vet' ? person : { ...person, contractMinutes: 20_000 },
        ),
      }),
    );
    expect(hours(footing.overtimeNeededMinutes)).toBe(8);
  });
});

const nurse = { skillIds: ['nurse'], contractMinutes: 480 };
const desk = { skillIds: ['desk'], contractMinutes: 480 };
const both = { skillIds: ['desk', 'nurse'], contractMinutes: 480 };
const footingWith = (
  people: readonly Partial<ProblemPerson>[],
  floors: readonly Partial<ProblemFloor>[],
) => footingOf(buildProblem({ people, floors }));

describe('overtime that the floors force', () => {
  it.each([
    ['none when hours suffice', [nurse], [{}], 0],
    ['the whole window without anybody', [], [{}], 480],
    ['a skill that is short although hours lie idle', [nurse, desk, desk], [{ people: 2 }], 480],
    ['two skills that share one person', [both], [{}, { skillId: 'desk' }], 480],
    ['a second skill that helps', [nurse, both], [{ people: 2 }], 0],
    ['leave is not available', [{ ...nurse, creditMinutes: 180 }], [{}], 180],
    [
      'leave beyond the contract takes nothing from others',
      [{ ...nurse, creditMinutes: 999 }, nurse],
      [{}],
      0,
    ],
    ['wished floors ask for nothing', [], [{ priceCentsPerHour: 100 }], 0],
    ['shared floors are left out', [], [{ counting: 'shared' }], 0],
  ] as const)('%s', (_, people, floors, expected) => {
    const sketch = people.map((person) => ({ ...person, skillIds: [...person.skillIds] }));
    expect(footingWith(sketch, floors).overtimeNeededMinutes).toBe(expected);
  });

  it('leaves a lack only where contracts allow too little of it', () => {
    const lackWith = (maximumMinutes: number) =>
      footingWith([{ ...nurse, skillIds: ['nurse'], maximumMinutes }], [{ people: 2 }]).lackMinutes;
    expect([480, 720, 960, 2000].map(lackWith)).toEqual([480, 240, 0, 0]);
  });

  it('is found with more skills than sets can be listed for', () => {
    const names = Array.from({ length: 40 }, (_, index) => `skill-${index}`);
    const problem = {
      ...buildProblem({ people: [{ skillIds: ['skill-35'], contractMinutes: 480 }] }),
      skills: names.map((id) => ({ id, name: id })),
      floors: names.map((skillId) => buildFloor({ skillId })),
    };
    expect(footingOf(problem).overtimeNeededMinutes).toBe(39 * 480);
    const rich = {
      ...problem.people[0],
      id: 'rich',
      skillIds: ['skill-0'],
      contractMinutes: 99_999,
    };
    const people = [...problem.people, rich as ProblemPerson];
    expect(footingOf({ ...problem, people }).overtimeNeededMinutes).toBe(480);
  });
});

describe('floors for anybody', () => {
  it('need only what those of skills do not bring', () => {
    const footing = footingWith(
      [],
      [{}, { skillId: null, people: 3, startMinute: 540, endMinute: 1020 }],
    );
    expect(footing.bySkill.at(-1)).toEqual({
      skillId: null,
      name: 'Any skill',
      neededMinutes: 2 * 360 + 3 * 120,
      ownMinutes: 0,
    });
    expect(footing.neededMinutes).toBe(480 + 1080);
  });

  it('have no line where there are none', () => {
    expect(footingWith([], [{}]).bySkill.map(({ skillId }) => skillId)).toEqual([
      'nurse',
      'vet',
      'desk',
    ]);
  });
});

describe('unpaid breaks', () => {
  const kinds = [
    { id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 30 },
    { id: 'Short', startMinute: 420, endMinute: 660 },
    {
      id: 'Desk',
      startMinute: 420,
      endMinute: 900,
      unpaidBreakMinutes: 240,
      postSkillIds: ['desk'],
    },
  ];

  it('are taken at the smallest paid share of the shifts that can serve the window', () => {
    const needed = (floor: Partial<ProblemFloor>): number =>
      footingOf(buildProblem({ kinds, floors: [floor] })).neededMinutes;
    expect(needed({ people: 2 })).toBe(900);
    expect(needed({ skillId: 'desk' })).toBe(240);
    expect(needed({ startMinute: 900, endMinute: 1000 })).toBe(100);
  });
});

describe('any roster without firm shortage', () => {
  it('has at least the overtime the footing names, and the hours it needs', () => {
    const kinds = [
      { id: 'A', startMinute: 0, endMinute: 10, unpaidBreakMinutes: 3 },
      { id: 'B', startMinute: 5, endMinute: 20 },
      { id: 'C', startMinute: 12, endMinute: 30, unpaidBreakMinutes: 1 },
    ];
    const skills = ['nurse', 'vet', 'desk'];
    const person = fc
      .record({
        skillIds: fc.subarray(skills, { minLength: 1 }),
        contractMinutes: fc.nat(40),
        creditMinutes: fc.nat(10),
      })
      .map((one) => ({ ...one, skillIds: [...one.skillIds] }));
    const post = fc.record({ shiftIndex: fc.nat(2), post: fc.nat(2) });
    fc.assert(
      fc.property(fc.array(fc.tuple(person, post), { maxLength: 6 }), (staff) => {
        const people = staff.map(([one], index) => ({ ...one, id: `p${index}` }));
        const roster = staff.map(([one, { shiftIndex, post: choice }], index) => ({
          personId: `p${index}`,
          shiftIndex,
          postSkillId: one.skillIds[choice % one.skillIds.length] ?? '',
        }));
        // Floors exactly as high as the cover that the roster gives.
        const floors = roster.flatMap(({ shiftIndex, postSkillId }) => {
          const { startMinute = 0, endMinute = 0 } = kinds[shiftIndex] ?? {};
          const window = { startMinute, endMinute };
          return [
            { ...window, skillId: postSkillId },
            { ...window, skillId: null },
          ];
        });
        const problem = buildProblem({ kinds, people, floors, dayCount: 1 });
        const proof = proveRoster(problem, roster);
        const footing = footingOf(problem);
        const worked = proof.people.reduce((sum, { workedMinutes }) => sum + workedMinutes, 0);
        expect(proof.shortageMinutes).toBe(0);
        expect(footing.neededMinutes).toBeLessThanOrEqual(worked);
        expect(footing.overtimeNeededMinutes).toBeLessThanOrEqual(proof.overtimeMinutes);
      }),
      { numRuns: 300 },
    );
  });
});
