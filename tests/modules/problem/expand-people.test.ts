import { describe, expect, it } from 'vitest';
import { assembleProblem, type ProblemParts } from '@/modules/problem';
import {
  floorOf,
  fullTime,
  kindOf,
  nurse,
  partsOf,
  personOf,
  vet,
} from '@/tests/support/problem-parts';

const assembled = (parts: Partial<ProblemParts>) => {
  const { problem, notes } = assembleProblem(partsOf(parts));
  return { person: problem.people[0] ?? null, notes };
};
const ione = (person: Parameters<typeof personOf>[0]) => assembled({ people: [personOf(person)] });
const days = (from: number, to: number, reason: string) => ({
  startMinute: from * 1440,
  endMinute: to * 1440,
  reason,
});

describe('who can be planned', () => {
  it('an active person with a contract and a skill', () => {
    expect(ione({})).toEqual({
      person: {
        id: 'per_ione',
        name: 'Ione Baptisto',
        skillIds: ['ski_nurse'],
        payCentsPerHour: 2500,
        paidBy: 'contract',
        contractMinutes: 2400,
        creditMinutes: 0,
        minimumMinutes: 2400,
        maximumMinutes: 3840,
        mayWorkNights: true,
        absences: [],
        history: [],
        following: [],
        pins: [],
        rules: null,
        kindLimits: [],
        wishes: [],
        isOutside: false,
      },
      notes: [],
    });
  });

  it.each([
    ['an inactive person, without a note', { isActive: false }, []],
    [
      'a person without a contract in the period',
      { contracts: [{ ...fullTime, endsOn: '2027-01-31' }] },
      ['Ione Baptisto has no contract in this period and is left out.'],
    ],
    [
      'a person without a skill',
      { skills: [] },
      ['Ione Baptisto has no skill valid through this period and is left out.'],
    ],
    [
      'a person whose only skill expires',
      { skills: [{ skillId: nurse.id, position: 0, expiresOn: '2027-02-05' }] },
      [
        'Ione Baptisto: the skill Nurse expires on 2027-02-05, so it is not used in this period.',
        'Ione Baptisto has no skill valid through this period and is left out.',
      ],
    ],
  ])('not %s', (_, person, notes) => {
    expect(ione(person)).toEqual({ person: null, notes });
  });
});

describe('skills', () => {
  it('stand with the home skill first, and unknown ones are ignored', () => {
    const skills = [
      { skillId: nurse.id, position: 1, expiresOn: null },
      { skillId: 'ski_gone' as const, position: 2, expiresOn: null },
      { skillId: vet.id, position: 0, expiresOn: null },
    ];
    expect(ione({ skills }).person?.skillIds).toEqual([vet.id, nurse.id]);
  });

  it.each([
    ['on the last day', '2027-02-07', [nurse.id]],
    ['on the day after the period', '2027-02-08', [nurse.id, vet.id]],
  ])('that expire %s', (_, expiresOn, expected) => {
    const skills = [
      { skillId: nurse.id, position: 0, expiresOn: null },
      { skillId: vet.id, position: 1, expiresOn },
    ];
    const { person, notes } = ione({ skills });
    expect(person?.skillIds).toEqual(expected);
    expect(notes.length).toBe(2 - expected.length);
  });
});

describe('contract hours', () => {
  it.each([
    ['exact', { underMinutes: 0, overtimeMinutes: 0 }, [2400, 2400, 2400]],
    ['with a tolerance', { underMinutes: 60, overtimeMinutes: 120 }, [2400, 2340, 2520]],
    ['never below nothing', { underMinutes: 9999, overtimeMinutes: 0 }, [2400, 0, 2400]],
  ])('%s', (_, limits, expected) => {
    const { person } = ione({ contracts: [{ ...fullTime, ...limits }] });
    expect([person?.contractMinutes, person?.minimumMinutes, person?.maximumMinutes]).toEqual(
      expected,
    );
  });

  it('of a period that is no whole number of weeks are rounded once', () => {
    // 10 days of a seventh of 100 minutes: 142.86, not 10 times 14.
    const contracts = [{ ...fullTime, weeklyMinutes: 100 }];
    const { person } = assembled({ people: [personOf({ contracts })], endsOn: '2027-02-10' });
    expect(person?.contractMinutes).toBe(143);
  });

  it('of two contracts add up date by date, pay and limits are of the first', () => {
    const contracts = [
      { ...fullTime, startsOn: '2027-02-04', weeklyMinutes: 1400, payCentsPerHour: 9900 },
      { ...fullTime, endsOn: '2027-02-03', weeklyMinutes: 2100, overtimeMinutes: 60 },
    ];
    const { person, notes } = ione({ contracts });
    expect(person).toMatchObject({
      contractMinutes: 3 * 300 + 4 * 200,
      maximumMinutes: 1760,
      payCentsPerHour: 2500,
      absences: [],
    });
    expect(notes).toEqual([
      'Ione Baptisto: the contract changes on 2027-02-04; pay and limits of the first are used for the whole period.',
    ]);
  });

  it.each([
    ['before it begins', { startsOn: '2027-02-03' }, 5, [days(0, 2, 'No contract')]],
    ['after it ends', { endsOn: '2027-02-05' }, 5, [days(5, 8, 'No contract')]],
    [
      'after the last day, into which a night would run',
      { endsOn: '2027-02-07' },
      7,
      [days(7, 8, 'No contract')],
    ],
  ])('give no days %s', (_, dates, daysUnder, absences) => {
    const { person } = ione({ contracts: [{ ...fullTime, weeklyMinutes: 700, ...dates }] });
    expect(person).toMatchObject({ contractMinutes: daysUnder * 100, absences });
  });
});

describe('leave', () => {
  const leaveOf = (startsOn: string, endsOn: string, creditMinutes = 2400) => ({
    id: 'lea_one' as const,
    personId: 'per_ione' as const,
    startsOn,
    endsOn,
    creditMinutes,
  });

  it.each([
    ['inside the period', leaveOf('2027-02-02', '2027-02-03', 960), 960, [days(1, 3, 'Leave')]],
    [
      'across its start, by days',
      leaveOf('2027-01-30', '2027-02-03'),
      1440,
      [days(-2, 3, 'Leave')],
    ],
    ['across its end, by days', leaveOf('2027-02-05', '2027-02-09'), 1440, [days(4, 9, 'Leave')]],
    ['longer than it', leaveOf('2027-01-25', '2027-02-14', 6300), 2100, [days(-7, 14, 'Leave')]],
    [
      'from the day after it, for the last night',
      leaveOf('2027-02-08', '2027-02-09'),
      0,
      [days(7, 9, 'Leave')],
    ],
    ['later', leaveOf('2027-02-09', '2027-02-09'), 0, []],
    ['before it', leaveOf('2027-01-30', '2027-01-31'), 0, []],
  ])('%s', (_, leave, creditMinutes, absences) => {
    expect(assembled({ leave: [leave] }).person).toMatchObject({ creditMinutes, absences });
  });

  it('credits of neighbouring periods add up to the whole', () => {
    const leave = [leaveOf('2027-02-06', '2027-02-08', 1000)];
    const first = assembled({ leave }).person?.creditMinutes ?? 0;
    const next = assembled({ leave, startsOn: '2027-02-08', endsOn: '2027-02-14' }).person;
    expect([first, next?.creditMinutes]).toEqual([667, 333]);
  });

  it('of others does not count', () => {
    const other = { ...leaveOf('2027-02-02', '2027-02-03'), personId: 'per_other' as const };
    expect(assembled({ leave: [other] }).person).toMatchObject({ creditMinutes: 0, absences: [] });
  });

  it('is a whole local day on a clock change too', () => {
    const { person } = assembled({
      startsOn: '2026-03-23',
      endsOn: '2026-03-29',
      leave: [leaveOf('2026-03-29', '2026-03-29')],
    });
    expect(person?.absences).toEqual([
      { startMinute: 6 * 1440, endMinute: 7 * 1440 - 60, reason: 'Leave' },
    ]);
  });
});

describe('pins', () => {
  const shiftKinds = [kindOf(), kindOf({ id: 'knd_late', name: 'Late' })];
  const pin = { personId: 'per_ione', date: '2027-02-02', postSkillId: nurse.id } as const;

  it.each([
    [
      'a shift',
      { ...pin, kindId: 'knd_late' },
      { dayIndex: 1, shiftIndex: 3, postSkillId: nurse.id },
    ],
    ['a day off', { ...pin, kindId: null }, { dayIndex: 1, shiftIndex: null, postSkillId: null }],
  ] as const)('%s', (_, cell, expected) => {
    const { person, notes } = assembled({ shiftKinds, pins: [cell], floors: [floorOf()] });
    expect(person?.pins).toEqual([expected]);
    expect(notes).toEqual([]);
  });

  it('outside the period or of others do not count', () => {
    const pins = [
      { ...pin, kindId: null, date: '2027-02-08' },
      { ...pin, kindId: null, personId: 'per_other' as const },
    ];
    expect(assembled({ pins }).person?.pins).toEqual([]);
  });

  it('to a kind that is no longer offered are dropped with a note', () => {
    const { person, notes } = assembled({ pins: [{ ...pin, kindId: 'knd_gone' }] });
    expect(person?.pins).toEqual([]);
    expect(notes).toEqual([
      'Ione Baptisto: the shift pinned on 2027-02-02 is no longer offered, so the pin is dropped.',
    ]);
  });
});
