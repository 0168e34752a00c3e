import { describe, expect, it } from 'vitest';
import type { ProblemFloor } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import { assign, buildProblem } from '@/tests/support/problem-builder';

const people = [
  { id: 'ione', skillIds: ['nurse'] },
  { id: 'ravi', skillIds: ['nurse', 'desk'] },
  { id: 'gwen', skillIds: ['desk'] },
];

type Plan = readonly (readonly [personId: string, kindId: string, postSkillId: string])[];

const prove = (floors: readonly Partial<ProblemFloor>[], plan: Plan, dayIndex = 0): Proof => {
  const problem = buildProblem({ floors, people });
  return proveRoster(
    problem,
    plan.map(([personId, kindId, post]) => assign(problem, personId, dayIndex, kindId, post)),
  );
};

const stretches = (proof: Proof) =>
  proof.shortages.map(({ startMinute, endMinute, missingPeople, floorIds }) => [
    startMinute,
    endMinute,
    missingPeople,
    floorIds.join(),
  ]);

describe('seated floors', () => {
  it('hold when the post is filled over the whole window', () => {
    const proof = prove([{}], [['ione', 'Early', 'nurse']]);
    expect(proof.shortages).toEqual([]);
    expect(proof.shortageMinutes).toBe(0);
  });

  it('are short over the whole window when nobody is there, named by date, window and skill', () => {
    expect(prove([{ people: 2 }], []).shortages).toEqual([
      {
        floorIds: ['floor-1'],
        skillId: 'nurse',
        date: '2027-02-01',
        startMinute: 420,
        endMinute: 900,
        missingPeople: 2,
        isFirm: true,
      },
    ]);
  });

  it('are short only while the shift does not reach', () => {
    const proof = prove([{ startMinute: 420, endMinute: 1020 }], [['ione', 'Day', 'nurse']]);
    expect(stretches(proof)).toEqual([[420, 540, 1, 'floor-1']]);
    expect(proof.shortageMinutes).toBe(120);
  });

  it('are held by two shifts that touch', () => {
    const plan = [
      ['ione', 'Early', 'nurse'],
      ['ravi', 'Late', 'nurse'],
    ] as const;
    expect(prove([{ startMinute: 420, endMinute: 1380 }], plan).shortages).toEqual([]);
  });

  it('count the post, not other skills the person holds', () => {
    expect(prove([{}], [['ravi', 'Early', 'desk']]).shortageMinutes).toBe(480);
    expect(prove([{ skillId: 'desk' }], [['ravi', 'Early', 'desk']]).shortageMinutes).toBe(0);
  });

  it('for anybody count every post', () => {
    const plan = [
      ['ione', 'Early', 'nurse'],
      ['gwen', 'Early', 'desk'],
    ] as const;
    expect(prove([{ skillId: null, people: 2 }], plan).shortageMinutes).toBe(0);
    expect(prove([{ skillId: null, people: 3 }], plan).shortageMinutes).toBe(480);
  });

  it('of one skill add up where their windows overlap', () => {
    const floors = [{}, { startMinute: 540, endMinute: 1020 }];
    const proof = prove(floors, [['ione', 'Early', 'nurse']]);
    expect(stretches(proof)).toEqual([[540, 1020, 1, 'floor-1,floor-2']]);
  });

  it('of two skills do not add up, nor do floors for anybody with those of a skill', () => {
    const floors = [{}, { skillId: null }];
    expect(prove(floors, [['ione', 'Early', 'nurse']]).shortages).toEqual([]);
  });

  it('that only touch are short one by one', () => {
    const floors = [{}, { startMinute: 900, endMinute: 1380 }];
    expect(stretches(prove(floors, []))).toEqual([
      [420, 900, 1, 'floor-1'],
      [900, 1380, 1, 'floor-2'],
    ]);
  });

  it('of a night belong to the day on which it starts', () => {
    const floor = { dayIndex: 6, startMinute: 6 * 1440 + 1380, endMinute: 6 * 1440 + 1860 };
    expect(prove([floor], [['ione', 'Night', 'nurse']], 6).shortages).toEqual([]);
    expect(prove([floor], [['ione', 'Late', 'nurse']], 6).shortages[0]).toMatchObject({
      date: '2027-02-07',
      startMinute: floor.startMinute,
      endMinute: floor.endMinute,
    });
  });

  it('that ask for nobody are never short', () => {
    expect(prove([{ people: 0 }], []).shortages).toEqual([]);
  });
});

describe('shared floors', () => {
  it('count everybody on duty who holds the skill, in any post', () => {
    const floor = { skillId: 'nurse', counting: 'shared', people: 2 } as const;
    const plan = [
      ['ione', 'Early', 'nurse'],
      ['ravi', 'Early', 'desk'],
      ['gwen', 'Early', 'desk'],
    ] as const;
    expect(prove([floor], plan).shortages).toEqual([]);
    expect(prove([{ ...floor, people: 3 }], plan).shortageMinutes).toBe(480);
    expect(prove([{ ...floor, skillId: null, people: 3 }], plan).shortages).toEqual([]);
  });

  it('stand alone where their windows overlap', () => {
    const floor = { counting: 'shared' } as const;
    expect(prove([floor, floor, {}], [['ione', 'Early', 'nurse']]).shortages).toEqual([]);
    expect(prove([floor, floor], []).shortageMinutes).toBe(960);
  });
});

describe('wished floors', () => {
  it('cost their price for each missing person-hour and are no firm shortage', () => {
    const proof = prove([{ people: 2, priceCentsPerHour: 1500 }], [['ione', 'Early', 'nurse']]);
    expect(proof).toMatchObject({
      shortageMinutes: 0,
      wishedShortageMinutes: 480,
      wishedShortageCents: 12_000,
    });
    expect(proof.shortages.map(({ isFirm }) => isFirm)).toEqual([false]);
  });

  it('are served after the firm floors of the skill, the dearest first', () => {
    const floors = [{ priceCentsPerHour: 600 }, { priceCentsPerHour: 1200 }, {}];
    const one = prove(floors, [['ione', 'Early', 'nurse']]);
    expect(stretches(one).map(([, , , floorIds]) => floorIds)).toEqual(['floor-2', 'floor-1']);
    expect(one).toMatchObject({ shortageMinutes: 0, wishedShortageCents: 14_400 });
    const two = prove(floors, [
      ['ione', 'Early', 'nurse'],
      ['ravi', 'Early', 'nurse'],
    ]);
    expect(two.wishedShortageCents).toBe(4800);
  });

  it('are rounded once for each stretch, half up', () => {
    // 30 missing minutes at 1 cent an hour are half a cent, on both sides of the Day shift.
    const floor = { startMinute: 510, endMinute: 1050, priceCentsPerHour: 1 };
    const proof = prove([floor], [['ione', 'Day', 'nurse']]);
    expect(stretches(proof).length).toBe(2);
    expect(proof.wishedShortageCents).toBe(2);
  });

  it('that are shared cost alike', () => {
    const proof = prove([{ counting: 'shared', priceCentsPerHour: 100 }], []);
    expect(proof).toMatchObject({ shortageMinutes: 0, wishedShortageCents: 800 });
  });
});

describe('priorities of firm floors', () => {
  const floors = [
    { people: 1, priority: 2 },
    { people: 2, priority: 1, startMinute: 540, endMinute: 900 },
    { people: 1, priority: 3, counting: 'shared' as const, skillId: 'desk' },
  ];

  it('cover serves the first priority first, and each has its minutes', () => {
    // One nurse from 07:00 to 15:00: from 09:00 on priority 1 takes them and still lacks one.
    const proof = prove(floors, [['ione', 'Early', 'nurse']]);
    expect(proof.shortageByPriority).toEqual([
      { priority: 1, minutes: 360 },
      { priority: 2, minutes: 360 },
      { priority: 3, minutes: 480 },
    ]);
    expect(proof.shortageMinutes).toBe(1200);
  });

  it('are listed though nothing is missing, and only for floors that ask for people', () => {
    const plan = [['ione', 'Early', 'nurse']] as const;
    expect(prove([{ priority: 4 }, { priority: 2, people: 0 }], plan).shortageByPriority).toEqual([
      { priority: 4, minutes: 0 },
    ]);
  });

  it('of wished floors is of no account', () => {
    const proof = prove(
      [{ priority: 9 }, { priority: 1, priceCentsPerHour: 100 }],
      [['ione', 'Early', 'nurse']],
    );
    expect(proof).toMatchObject({ shortageMinutes: 0, wishedShortageMinutes: 480 });
  });
});
