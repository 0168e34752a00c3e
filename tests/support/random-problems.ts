import fc from 'fast-check';
import type {
  FairnessTerm,
  Problem,
  ProblemCeiling,
  ProblemFloor,
  ProblemPerson,
  ProblemRules,
} from '@/modules/problem';
import { buildProblem, buildRules, houseKinds } from './problem-builder';
import { teamRule } from './random-team-rules';

/*
 * Small problems in which everything a problem can say occurs: two or three people, four or five days and
 * three shifts a day. Friday is the first or the second day, so that a weekend is always inside.
 */

const kinds = houseKinds
  .filter(({ id }) => id !== 'Day')
  .map((kind) => ({ ...kind, nightMinutes: kind.isNight ? 415 : 0, weekendMinutes: 60 }));
const kindIds = kinds.map(({ id }) => id);

/** A limit that is on in one of three problems. */
const limit = (most: number) =>
  fc.option(fc.integer({ min: 1, max: most }), { nil: null, freq: 1 });

const rules: fc.Arbitrary<ProblemRules> = fc
  .record({
    restMinutes: fc.constantFrom(0, 600, 660),
    longestRunDays: limit(3),
    longestRunNights: limit(2),
    nightsPerPeriod: limit(2),
    weekendsPerPeriod: fc.constantFrom(null, null, 0, 1),
    weekendCountsFridayNight: fc.boolean(),
    shortestRunDays: fc.constantFrom(null, null, 2, 3),
    shortestRunFreeDays: fc.constantFrom(null, null, 2),
    kindsThatMayNotFollow: fc.array(
      fc.record({ kindId: fc.constantFrom(...kindIds), nextKindId: fc.constantFrom(...kindIds) }),
      { maxLength: 2 },
    ),
  })
  .map(buildRules);

const price = (prices: readonly number[]) => fc.constantFrom(null, ...prices);

const windowOn = (dayCount: number) =>
  fc.record({
    startMinute: fc.integer({ min: 4, max: dayCount * 24 - 12 }).map((hour) => hour * 60),
    endMinute: fc.constantFrom(300, 480, 600),
    skillId: fc.constantFrom('nurse', 'nurse', 'vet', null),
    counting: fc.constantFrom('seated' as const, 'shared' as const),
  });

const floors = (dayCount: number): fc.Arbitrary<Partial<ProblemFloor>[]> =>
  fc.array(
    fc
      .tuple(
        windowOn(dayCount),
        fc.record({
          people: fc.integer({ min: 1, max: 2 }),
          priceCentsPerHour: price([600, 1201]),
          priority: fc.integer({ min: 1, max: 3 }),
        }),
      )
      .map(([window, floor]) => ({
        ...floor,
        ...window,
        endMinute: window.startMinute + window.endMinute,
      })),
    { minLength: 2, maxLength: 6 },
  );

const ceilings = (dayCount: number): fc.Arbitrary<Partial<ProblemCeiling>[]> =>
  fc.array(
    fc
      .tuple(
        windowOn(dayCount),
        fc.record({
          people: fc.integer({ min: 0, max: 1 }),
          priceCentsPerHour: price([301]),
        }),
      )
      .map(([window, ceiling]) => ({
        ...ceiling,
        ...window,
        endMinute: window.startMinute + window.endMinute,
      })),
    { maxLength: 2 },
  );

const neighbours = (firstDay: number, step: 1 | -1) =>
  fc.constantFrom(0, 0, 1, 2).chain((count) =>
    fc.constantFrom(...kinds).map(({ startMinute, endMinute, isNight = false }) =>
      Array.from({ length: count }, (_, index) => firstDay + index * step)
        .sort((one, other) => one - other)
        .map((dayIndex) => ({
          dayIndex,
          startMinute: dayIndex * 1440 + startMinute,
          endMinute: dayIndex * 1440 + endMinute,
          isNight,
        })),
    ),
  );

const wishes = (dayCount: number) =>
  fc.array(
    fc
      .record({
        dayIndex: fc.integer({ min: 0, max: dayCount - 1 }),
        kind: fc.constantFrom(null, ...kinds.keys()),
        wants: fc.constantFrom('on' as const, 'off' as const),
        priceCents: fc.constantFrom(0, 2500, 9000),
      })
      .map(({ kind, ...wish }) => ({
        ...wish,
        shiftIndex: kind === null ? null : wish.dayIndex * kinds.length + kind,
      })),
    { maxLength: 3 },
  );

const person = (dayCount: number): fc.Arbitrary<Partial<ProblemPerson>> =>
  fc.record({
    skillIds: fc.constantFrom<string[]>(['nurse'], ['vet', 'nurse'], ['nurse', 'vet']),
    payCentsPerHour: fc.constantFrom(1800, 2433),
    paidBy: fc.constantFrom('contract' as const, 'hours' as const),
    contractMinutes: fc.constantFrom(0, 480, 960),
    creditMinutes: fc.constantFrom(0, 0, 450),
    minimumMinutes: fc.constantFrom(0, 0, 480),
    maximumMinutes: fc.constantFrom(1440, 2400),
    mayWorkNights: fc.constantFrom(true, true, false),
    history: neighbours(-1, -1),
    following: neighbours(dayCount, 1),
    rules: fc.option(rules, { nil: null, freq: 1 }),
    kindLimits: fc.array(
      fc.record({ kindId: fc.constantFrom(...kindIds), most: fc.integer({ min: 0, max: 2 }) }),
      { maxLength: 1 },
    ),
    wishes: wishes(dayCount),
    isOutside: fc.constantFrom(false, false, false, true),
  });

type FairnessSteps = Extract<FairnessTerm, { kind: 'share' }>['steps'];

const fairness: fc.Arbitrary<FairnessTerm[]> = fc.array(
  fc.oneof(
    fc.record({
      kind: fc.constant('spread' as const),
      measure: fc.constantFrom('nights' as const, 'weekends' as const, 'refusedWishes' as const),
      priceCents: fc.constantFrom(0, 700, 8000),
    }),
    fc.record({
      kind: fc.constant('share' as const),
      measure: fc.constantFrom('nights' as const, 'weekends' as const),
      steps: fc.constantFrom<FairnessSteps[]>(
        [{ above: 0, priceCents: 900 }],
        [
          { above: 0, priceCents: 400 },
          { above: 1, priceCents: 2000 },
        ],
      ),
    }),
  ),
  { maxLength: 3 },
);

const overtimeSteps = fc.constantFrom<Problem['pay']['overtimeSteps'][]>(
  [{ overMinutes: 0, percent: 150 }],
  [{ overMinutes: 0, percent: 100 }],
  [
    { overMinutes: 0, percent: 125 },
    { overMinutes: 240, percent: 150 },
    { overMinutes: 700, percent: 200 },
  ],
);

/** One small problem with everything in it. */
export const smallProblem: fc.Arbitrary<Problem> = fc
  .record({
    dayCount: fc.integer({ min: 4, max: 5 }),
    peopleCount: fc.integer({ min: 2, max: 3 }),
    startsOn: fc.constantFrom('2027-02-04', '2027-02-05'),
  })
  .chain(({ dayCount, peopleCount, startsOn }) =>
    fc
      .record({
        rules,
        people: fc.array(person(dayCount), { minLength: peopleCount, maxLength: peopleCount }),
        floors: floors(dayCount),
        ceilings: ceilings(dayCount),
        teamRules: fc.uniqueArray(teamRule(peopleCount, dayCount * kinds.length), {
          maxLength: 3,
          selector: ({ id }) => id,
        }),
        fairness,
        overtimeSteps,
      })
      .map(({ overtimeSteps: steps, ...sketch }) =>
        buildProblem({
          ...sketch,
          startsOn,
          dayCount,
          kinds,
          pay: { overtimeSteps: steps },
        }),
      ),
  );

/** So many small problems, the same for the same seed. */
export const smallProblems = (count: number, seed: number): Problem[] =>
  fc.sample(smallProblem, { numRuns: count, seed });
