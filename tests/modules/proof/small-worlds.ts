import fc from 'fast-check';
import type { PlannedRoster, Problem, ProblemPerson, ProblemRules, Wish } from '@/modules/problem';
import { buildRules, type KindSketch } from '@/tests/support/problem-builder';

/*
 * Worlds of a few days, small enough to go through all that can be planned in them. In each a few of the
 * things that a problem can say of a person are on: with all of them there would be nothing left to
 * choose. Odd lengths and rates, so that pay and premiums do not come out whole.
 */

/** Eight hours by day and nine and a half by night, half an hour of break in each. */
export const worldKinds: readonly KindSketch[] = [
  { id: 'Early', startMinute: 420, endMinute: 900, unpaidBreakMinutes: 30, weekendMinutes: 77 },
  {
    id: 'Night',
    startMinute: 1290,
    endMinute: 1860,
    unpaidBreakMinutes: 30,
    isNight: true,
    nightMinutes: 431,
    holidayMinutes: 41,
    postSkillIds: ['nurse', 'desk'],
  },
];

const kindId = fc.constantFrom('Early', 'Night');

const anyRule: fc.Arbitrary<Partial<ProblemRules>> = fc.oneof(
  fc.constantFrom(480, 660, 961, 1500, 2400).map((restMinutes) => ({ restMinutes })),
  fc.integer({ min: 1, max: 3 }).map((longestRunDays) => ({ longestRunDays })),
  fc.integer({ min: 1, max: 2 }).map((longestRunNights) => ({ longestRunNights })),
  fc.integer({ min: 0, max: 2 }).map((nightsPerPeriod) => ({ nightsPerPeriod })),
  fc.tuple(fc.nat(1), fc.boolean()).map(([weekendsPerPeriod, weekendCountsFridayNight]) => ({
    weekendsPerPeriod,
    weekendCountsFridayNight,
  })),
  fc.integer({ min: 2, max: 3 }).map((shortestRunDays) => ({ shortestRunDays })),
  fc.integer({ min: 2, max: 3 }).map((shortestRunFreeDays) => ({ shortestRunFreeDays })),
  fc.record({ kindId, nextKindId: kindId }).map((pair) => ({ kindsThatMayNotFollow: [pair] })),
);

export const anyRules: fc.Arbitrary<ProblemRules> = fc
  .tuple(fc.constantFrom(0, 0, 0, 660), fc.array(anyRule, { maxLength: 3 }))
  .map(([restMinutes, some]) => buildRules(Object.assign({ restMinutes }, ...some)));

const neighbour = (dayIndex: number, isNight: boolean) => ({
  dayIndex,
  startMinute: dayIndex * 1440 + (isNight ? 1290 : 420),
  endMinute: dayIndex * 1440 + (isNight ? 1860 : 900),
  isNight,
});

const neighbours = (...days: readonly number[]) =>
  fc
    .tuple(fc.subarray([...days], { minLength: 1 }), fc.boolean())
    .map(([worked, isNight]) => worked.map((day) => neighbour(day, isNight)));

/** A shift of a kind on a day, or null, as pins and wishes name it. */
const anyCell = (dayCount: number) =>
  fc
    .tuple(fc.nat(dayCount - 1), fc.constantFrom(null, ...worldKinds.keys()))
    .map(([dayIndex, kind]) => ({
      dayIndex,
      shiftIndex: kind === null ? null : dayIndex * worldKinds.length + kind,
    }));

const anyWishes = (dayCount: number): fc.Arbitrary<Wish[]> =>
  fc.array(
    fc
      .tuple(anyCell(dayCount), fc.constantFrom('on' as const, 'off' as const), fc.nat(9000))
      .map(([cell, wants, priceCents]) => ({ ...cell, wants, priceCents })),
    { minLength: 1, maxLength: 3 },
  );

const anyLimit = (dayCount: number): fc.Arbitrary<Partial<ProblemPerson>> =>
  fc.oneof(
    fc.constantFrom(0, 450, 900, 1350).map((minimumMinutes) => ({ minimumMinutes })),
    fc.constantFrom(450, 1020, 1500).map((maximumMinutes) => ({ maximumMinutes })),
    fc.constant({ mayWorkNights: false }),
    fc.nat(dayCount - 1).map((day) => ({
      creditMinutes: 240,
      absences: [{ startMinute: day * 1440 + 60, endMinute: day * 1440 + 1500, reason: 'Leave' }],
    })),
    neighbours(-3, -2, -1).map((history) => ({ history })),
    neighbours(dayCount, dayCount + 1).map((following) => ({ following })),
    fc
      .tuple(anyCell(dayCount), fc.constantFrom(null, 'nurse'))
      .map(([cell, postSkillId]) => ({ pins: [{ ...cell, postSkillId }] })),
    anyRules.map((rules) => ({ rules })),
    fc
      .array(fc.record({ kindId, most: fc.integer({ min: 0, max: 2 }) }), {
        minLength: 1,
        maxLength: 2,
      })
      .map((kindLimits) => ({ kindLimits })),
    anyWishes(dayCount).map((wishes) => ({ wishes })),
    fc.constant({ isOutside: true }),
  );

/** A person with any pay and some of what a problem may say of one. */
export const anyPerson = (dayCount: number): fc.Arbitrary<Partial<ProblemPerson>> =>
  fc
    .tuple(
      fc.record({
        skillIds: fc.constantFrom<string[]>(['nurse'], ['vet', 'nurse'], ['nurse', 'vet']),
        payCentsPerHour: fc.constantFrom(0, 1987, 2500),
        paidBy: fc.constantFrom('contract' as const, 'hours' as const),
        contractMinutes: fc.constantFrom(0, 500, 1020),
      }),
      fc.array(anyLimit(dayCount), { maxLength: 4 }),
    )
    .map(([pay, limits]) => Object.assign({}, pay, ...limits));

/** A Thursday and a Monday; a Friday and a Saturday before a clock change in Berlin. */
export const anyStart = fc.constantFrom('2027-02-04', '2027-02-01', '2026-03-27', '2026-10-24');

export const anyPay = fc.constantFrom<Problem['pay']>(
  {
    nightPercent: 25,
    weekendPercent: 20,
    holidayPercent: 100,
    overtimeSteps: [
      { overMinutes: 0, percent: 125 },
      { overMinutes: 301, percent: 150 },
    ],
  },
  {
    nightPercent: 33,
    weekendPercent: 0,
    holidayPercent: 50,
    overtimeSteps: [{ overMinutes: 0, percent: 150 }],
  },
);

export const anyShare = fc.array(
  fc.record({
    kind: fc.constant('share' as const),
    measure: fc.constantFrom('nights' as const, 'weekends' as const),
    steps: fc.array(fc.record({ above: fc.nat(2), priceCents: fc.nat(5000) }), {
      minLength: 1,
      maxLength: 2,
    }),
  }),
  { maxLength: 1 },
);

/** Every choice of a shift and post, or of none, on each day. */
export function everyLine(problem: Problem, person: ProblemPerson): PlannedRoster[] {
  let lines: PlannedRoster[] = [[]];
  for (const day of problem.days.keys()) {
    const choices = problem.shifts
      .filter(({ dayIndex }) => dayIndex === day)
      .flatMap(({ index, postSkillIds }) =>
        person.skillIds
          .filter((skillId) => postSkillIds?.includes(skillId) ?? true)
          .map((postSkillId) => ({ personId: person.id, shiftIndex: index, postSkillId })),
      );
    lines = lines.flatMap((line) => [line, ...choices.map((choice) => [...line, choice])]);
  }
  return lines;
}
