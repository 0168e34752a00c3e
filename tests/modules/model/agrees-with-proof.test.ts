import fc from 'fast-check';
import { expect, it } from 'vitest';
import { buildRosterModel, placeRoster, type RosterModel, weighRoster } from '@/modules/model';
import type { PlannedRoster, Problem, ProblemPerson } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { brokenRows } from '@/tests/support/broken-rows';
import { buildProblem, houseKinds } from '@/tests/support/problem-builder';

/*
 * The model and the proof share no code but the problem they read. Here every roster that one person
 * can have in a few days is held against both: they must agree on what is lawful, what is missing and
 * what it costs.
 */

const dayCount = 3;
const limit = (most: number) => fc.option(fc.integer({ min: 1, max: most }), { nil: null });

const rules = fc.record({
  restMinutes: fc.constantFrom(0, 480, 600, 660, 961),
  longestRunDays: limit(4),
  longestRunNights: limit(3),
  nightsPerPeriod: limit(3),
  weekendsPerPeriod: fc.constantFrom(null, 0, 1),
  weekendCountsFridayNight: fc.boolean(),
});

const history = fc.subarray([-3, -2, -1]).map((days) =>
  days.map((dayIndex) => ({
    dayIndex,
    startMinute: dayIndex * 1440 + 1380,
    endMinute: dayIndex * 1440 + 1860,
    isNight: true,
  })),
);

const absences = fc
  .option(fc.integer({ min: 0, max: 2 }), { nil: null, freq: 1 })
  .map((day) =>
    day === null ? [] : [{ startMinute: day * 1440, endMinute: (day + 1) * 1440, reason: 'leave' }],
  );

const pins = fc.option(
  fc.record({
    dayIndex: fc.constant(2),
    shiftIndex: fc.constantFrom(null, 8, 11),
    postSkillId: fc.constantFrom(null, 'nurse'),
  }),
  { nil: null, freq: 1 },
);

const person: fc.Arbitrary<Partial<ProblemPerson>> = fc
  .record({
    skillIds: fc.constantFrom<string[]>(['nurse'], ['vet', 'nurse']),
    paidBy: fc.constantFrom('contract' as const, 'hours' as const),
    contractMinutes: fc.constantFrom(480, 960, 1440),
    creditMinutes: fc.constantFrom(0, 480),
    minimumMinutes: fc.constantFrom(0, 960),
    maximumMinutes: fc.constantFrom(960, 1920),
    mayWorkNights: fc.boolean(),
    absences,
    history,
    pin: pins,
  })
  .map(({ pin, ...rest }) => ({
    ...rest,
    pins: pin ? [pin] : [],
  }));

const floor = fc.record({
  dayIndex: fc.constant(0),
  startMinute: fc.integer({ min: 0, max: 90 }).map((step) => step * 60),
  skillId: fc.constantFrom('nurse', 'vet', null),
  people: fc.integer({ min: 0, max: 2 }),
  counting: fc.constantFrom('seated' as const, 'shared' as const),
  priceCentsPerHour: fc.constantFrom(null, null, 600, 1200),
});

const problems = fc
  .record({
    rules,
    people: fc.tuple(person),
    floors: fc.array(floor, { maxLength: 4 }),
    startsOn: fc.constantFrom('2027-02-01', '2027-02-05', '2027-02-07'),
  })
  .map(({ floors, ...sketch }) =>
    buildProblem({
      ...sketch,
      dayCount,
      kinds: houseKinds.map((kind) => ({ ...kind, nightMinutes: 120, weekendMinutes: 60 })),
      floors: floors.map((one) => ({ ...one, endMinute: one.startMinute + 600 })),
    }),
  );

/** Every choice of a shift, in a post the model has for it, or of none, on each day. */
function everyRoster(problem: Problem, model: RosterModel): PlannedRoster[] {
  let rosters: PlannedRoster[] = [[]];
  for (const day of problem.days.keys()) {
    const choices = problem.shifts
      .filter(({ dayIndex }) => dayIndex === day)
      .flatMap((shift) => postsOf(model, shift.index).map((post) => ({ shift, post })));
    const next = choices.map(({ shift, post }) => ({
      personId: 'ione',
      shiftIndex: shift.index,
      postSkillId: post,
    }));
    rosters = rosters.flatMap((roster) => [roster, ...next.map((one) => [...roster, one])]);
  }
  return rosters;
}

/** Posts of the columns of a shift; `nurse` where the model lets nobody work it. */
function postsOf(model: RosterModel, shiftIndex: number): string[] {
  const columns = model.works.flatMap((work) => work.columns);
  const posts = columns.filter(({ shift }) => shift.index === shiftIndex);
  return posts.length === 0 ? ['nurse'] : posts.map(({ postSkillId }) => postSkillId);
}

function judge(problem: Problem, model: RosterModel, roster: PlannedRoster) {
  const values = placeRoster(model, roster);
  const isPlaced = values.reduce((sum, value) => sum + value, 0) === roster.length;
  const isLawful = isPlaced && brokenRows(model, roster).length === 0;
  const proof = proveRoster(problem, roster);
  return { isLawful, proof, figures: weighRoster(model, values) };
}

it('agrees with the proof on every roster of small random problems', () => {
  fc.assert(
    fc.property(problems, (problem) => {
      const model = buildRosterModel(problem);
      for (const roster of everyRoster(problem, model)) {
        const { isLawful, proof, figures } = judge(problem, model, roster);
        expect({ roster, isLawful }).toEqual({ roster, isLawful: proof.breaches.length === 0 });
        if (!isLawful) continue;
        const { shortageMinutes, costCents } = proof;
        expect({ roster, ...figures }).toMatchObject({ roster, shortageMinutes, costCents });
      }
    }),
    { numRuns: 40, seed: 7 },
  );
});
