import fc from 'fast-check';
import type { Problem, ProblemPerson } from '@/modules/problem';
import { buildProblem, houseKinds } from './problem-builder';

const dayCount = 7;
const kinds = houseKinds
  .filter(({ id }) => id !== 'Day')
  .map((kind) => ({ ...kind, nightMinutes: kind.isNight ? 420 : 0 }));

const person: fc.Arbitrary<Partial<ProblemPerson>> = fc
  .record({
    skillIds: fc.constantFrom<string[]>(['nurse'], ['vet'], ['nurse', 'vet']),
    payCentsPerHour: fc.constantFrom(1800, 2400, 3600),
    paidBy: fc.constantFrom('contract' as const, 'hours' as const),
    shifts: fc.integer({ min: 3, max: 5 }),
    overtimeShifts: fc.integer({ min: 0, max: 1 }),
    mayWorkNights: fc.boolean(),
    awayOn: fc.option(fc.integer({ min: 0, max: dayCount - 1 }), { nil: null }),
    hasNightBefore: fc.boolean(),
  })
  .map(({ shifts, overtimeShifts, awayOn, hasNightBefore, ...rest }) => ({
    ...rest,
    contractMinutes: shifts * 480,
    minimumMinutes: rest.paidBy === 'contract' ? (shifts - 1) * 480 : 0,
    maximumMinutes: (shifts + overtimeShifts) * 480,
    creditMinutes: awayOn === null ? 0 : 480,
    absences:
      awayOn === null
        ? []
        : [{ startMinute: awayOn * 1440, endMinute: (awayOn + 1) * 1440, reason: 'leave' }],
    history: hasNightBefore
      ? [{ dayIndex: -1, startMinute: -60, endMinute: 420, isNight: true }]
      : [],
  }));

const floors = fc
  .record({
    nurseEarly: fc.constantFrom(0, 1, 1, 2),
    vetEarly: fc.integer({ min: 0, max: 1 }),
    nurseLate: fc.integer({ min: 0, max: 1 }),
    nightAny: fc.integer({ min: 0, max: 1 }),
    nurseShared: fc.integer({ min: 0, max: 1 }),
    wishedLate: fc.integer({ min: 0, max: 1 }),
  })
  .map((needs) =>
    Array.from({ length: dayCount }, (_, dayIndex) => dayIndex * 1440).flatMap((midnight) => [
      floorOf(midnight, 420, 'nurse', needs.nurseEarly),
      floorOf(midnight, 420, 'vet', needs.vetEarly),
      floorOf(midnight, 900, 'nurse', needs.nurseLate),
      floorOf(midnight, 1380, null, needs.nightAny),
      { ...floorOf(midnight, 600, 'nurse', needs.nurseShared), counting: 'shared' as const },
      { ...floorOf(midnight, 900, 'nurse', needs.wishedLate), priceCentsPerHour: 1200 },
    ]),
  );

const floorOf = (midnight: number, start: number, skillId: string | null, people: number) => ({
  startMinute: midnight + start,
  endMinute: midnight + start + 480,
  skillId,
  people,
});

const team = fc
  .record({
    people: fc.array(person, { minLength: 4, maxLength: 6 }),
    floors,
    longestRunDays: fc.constantFrom(null, 3, 5),
    weekendsPerPeriod: fc.constantFrom(null, 0, 1),
  })
  .map(({ people, floors: asked, longestRunDays, weekendsPerPeriod }) =>
    buildProblem({
      dayCount,
      kinds,
      people,
      floors: asked,
      rules: { longestRunDays, longestRunNights: 3, nightsPerPeriod: 3, weekendsPerPeriod },
    }),
  );

/** Small teams of four to six people and a week, the same for the same seed. */
export const randomTeams = (count: number, seed: number): Problem[] =>
  fc.sample(team, { numRuns: count, seed });
