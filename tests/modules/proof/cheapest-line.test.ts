import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlannedRoster, Problem, ProblemPerson } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { cheapestLine } from '@/modules/proof/bound/cheapest-line';
import type { LinePrices } from '@/modules/proof/bound/line-options';
import { buildProblem, buildRules, type ProblemSketch } from '@/tests/support/problem-builder';
import { past } from './rule-cases';
import {
  anyPay,
  anyPerson,
  anyRules,
  anyShare,
  anyStart,
  everyLine,
  worldKinds,
} from './small-worlds';

const dayCount = 5;
const shiftCount = dayCount * worldKinds.length;
const worth = fc
  .array(fc.integer({ min: -8000, max: 8000 }), { minLength: shiftCount, maxLength: shiftCount })
  .map((cents) => Float64Array.from(cents, (one) => one / 7));
const unit = fc.integer({ min: -3000, max: 3000 }).map((cents) => cents / 7);

const anyPrices: fc.Arbitrary<LinePrices> = fc
  .record({
    anybody: worth,
    nurse: worth,
    vet: worth,
    holder: worth,
    teamWorth: worth,
    payWorth: fc.constantFrom(0, 0, -0.37),
    units: fc.record({ nights: unit, weekends: unit, refusedWishes: unit }),
    /** What every shift is worth on top: nobody wants to work, or everybody does. */
    everyShift: fc.constantFrom(-8000, 0, 20_000, 40_000),
  })
  .map(({ anybody, nurse, vet, holder, teamWorth, payWorth, units, everyShift }) => ({
    cover: {
      anybody: anybody.map((cents) => cents + everyShift),
      byPost: new Map([
        ['nurse', nurse],
        ['vet', vet],
      ]),
      byHolder: new Map([['vet', holder]]),
    },
    teamWorth,
    payWorth,
    units,
  }));

const anyProblem = fc
  .record({
    person: anyPerson(dayCount),
    rules: anyRules,
    pay: anyPay,
    fairness: anyShare,
    startsOn: anyStart,
  })
  .map(({ person, ...sketch }) =>
    buildProblem({
      ...sketch,
      zone: 'Europe/Berlin',
      dayCount,
      kinds: worldKinds,
      people: [person],
    }),
  );

/** The cost of a line as the proof tells it, less what it earns; null when it breaks a rule. */
function pricedCost(
  problem: Problem,
  { cover, teamWorth, payWorth, units }: LinePrices,
  line: PlannedRoster,
): number | null {
  const proof = proveRoster(problem, line);
  const [counts] = proof.people;
  if (proof.breaches.length > 0 || !counts) return null;
  const holdsVet = problem.people[0]?.skillIds.includes('vet') === true;
  const at = (values: Float64Array | undefined, shift: number) => values?.[shift] ?? 0;
  const earned = line.reduce(
    (sum, { shiftIndex, postSkillId }) =>
      sum +
      at(cover.anybody, shiftIndex) +
      at(cover.byPost.get(postSkillId), shiftIndex) +
      (holdsVet ? at(cover.byHolder.get('vet'), shiftIndex) : 0) +
      at(teamWorth, shiftIndex),
    0,
  );
  const pay = proof.contractPayCents + proof.premiumPayCents + proof.overtimePayCents;
  return (
    proof.costCents -
    payWorth * pay +
    units.nights * counts.nights +
    units.weekends * counts.weekends +
    units.refusedWishes * counts.refusedWishes -
    earned
  );
}

function cheapestOfAll(problem: Problem, prices: LinePrices): number | null {
  const [person] = problem.people;
  if (!person) return null;
  const costs = everyLine(problem, person)
    .map((line) => pricedCost(problem, prices, line))
    .filter((cost) => cost !== null);
  return costs.length === 0 ? null : Math.min(...costs);
}

/** Everybody wants to work: every shift is worth more than any pay, a Night more than an Early. */
const eager: LinePrices = {
  cover: {
    anybody: Float64Array.from({ length: shiftCount }, (_, shift) => 40_000 + (shift % 2) * 9000),
    byPost: new Map(),
    byHolder: new Map(),
  },
  teamWorth: undefined,
  payWorth: 0,
  units: { nights: 0, weekends: 0, refusedWishes: 0 },
};
/** Nobody wants to: shifts are worth nothing, and the least hours ask for two. */
const idle: LinePrices = {
  ...eager,
  cover: { ...eager.cover, anybody: new Float64Array(shiftCount) },
};

const night = (dayIndex: number) => past(dayIndex, 1290, 1860, true);

/** Thursday 4 to Monday 8 February 2027. */
const ruleWorlds: readonly (readonly [string, ProblemSketch])[] = [
  ['nothing', {}],
  ['days in a row', { rules: { longestRunDays: 2 } }],
  [
    'days in a row, with those before',
    { rules: { longestRunDays: 2 }, people: [{ history: [night(-1)] }] },
  ],
  [
    'days in a row, too many before',
    { rules: { longestRunDays: 1 }, people: [{ history: [night(-2), night(-1)] }] },
  ],
  [
    'days in a row, with those after',
    { rules: { longestRunDays: 2 }, people: [{ following: [night(5), night(6)] }] },
  ],
  ['nights in a row', { rules: { longestRunNights: 1 } }],
  [
    'nights in a row, with those before',
    { rules: { longestRunNights: 2 }, people: [{ history: [night(-1)] }] },
  ],
  [
    'nights in a row, with those after',
    { rules: { longestRunNights: 2 }, people: [{ following: [night(5), night(6)] }] },
  ],
  [
    'a night after the period and not next to it',
    { rules: { longestRunNights: 1 }, people: [{ following: [night(6)] }] },
  ],
  ['rest', { rules: { restMinutes: 961 } }],
  ['rest over more than a day', { rules: { restMinutes: 2000 } }],
  [
    'rest to the days around',
    {
      rules: { restMinutes: 660 },
      people: [{ history: [night(-1)], following: [past(5, 0, 420)] }],
    },
  ],
  ['nights', { rules: { nightsPerPeriod: 2 } }],
  ['weekends', { rules: { weekendsPerPeriod: 0 } }],
  [
    'weekends from Friday night on',
    { rules: { weekendsPerPeriod: 0, weekendCountsFridayNight: true } },
  ],
  ['short runs of days', { rules: { shortestRunDays: 3, longestRunDays: 3 } }],
  [
    'short runs of days, without a longest',
    { rules: { shortestRunDays: 3, nightsPerPeriod: 0 }, people: [{ maximumMinutes: 1000 }] },
  ],
  ['short runs of days off', { rules: { shortestRunFreeDays: 2, longestRunDays: 2 } }],
  [
    'kinds that may not follow',
    {
      rules: {
        kindsThatMayNotFollow: [
          { kindId: 'Night', nextKindId: 'Night' },
          { kindId: 'Early', nextKindId: 'Night' },
        ],
      },
    },
  ],
  [
    'a limit of one of two kinds of equal hours',
    {
      kinds: [
        { id: 'Early', startMinute: 420, endMinute: 900 },
        { id: 'Day', startMinute: 540, endMinute: 1020 },
      ],
      people: [{ kindLimits: [{ kindId: 'Day', most: 1 }] }],
    },
  ],
  [
    'a limit of a kind',
    {
      people: [
        {
          kindLimits: [
            { kindId: 'Night', most: 1 },
            { kindId: 'Early', most: 2 },
          ],
        },
      ],
    },
  ],
  ['the most hours', { people: [{ maximumMinutes: 1500 }] }],
  [
    'pins and leave',
    {
      people: [
        {
          pins: [
            { dayIndex: 0, shiftIndex: null, postSkillId: null },
            { dayIndex: 1, shiftIndex: 2, postSkillId: null },
          ],
          absences: [{ startMinute: 4 * 1440, endMinute: 5 * 1440, reason: 'Leave' }],
        },
      ],
    },
  ],
  [
    'limits of a person',
    { people: [{ rules: buildRules({ restMinutes: 0, longestRunDays: 1 }) }] },
  ],
];

const findCheapest = (problem: Problem, prices: LinePrices): number | null => {
  const [person] = problem.people;
  return person ? cheapestLine(problem, person, prices) : null;
};

describe('the cheapest line of one person', () => {
  it.each(ruleWorlds)('is the cheapest of all lines: %s', (_, sketch) => {
    const world = { startsOn: '2027-02-04', dayCount, kinds: worldKinds, ...sketch };
    const rules = { restMinutes: 0, ...sketch.rules };
    const problem = buildProblem({ ...world, rules });
    expect(findCheapest(problem, eager)).toBe(cheapestOfAll(problem, eager));
    const people = [{ paidBy: 'hours' as const, minimumMinutes: 900, ...sketch.people?.[0] }];
    const dutiful = buildProblem({ ...world, rules, people });
    expect(findCheapest(dutiful, idle)).toBe(cheapestOfAll(dutiful, idle));
    // Without pay or least hours nothing depends on the hours.
    const unpaid = buildProblem({
      ...world,
      rules,
      people: [{ payCentsPerHour: 0, ...sketch.people?.[0] }],
    });
    expect(findCheapest(unpaid, eager)).toBe(cheapestOfAll(unpaid, eager));
  });

  it('is none where the hours, pins or days cannot be kept', () => {
    const none = (person: Partial<ProblemPerson>, change: Partial<ProblemSketch> = {}) =>
      findCheapest(
        buildProblem({ dayCount, kinds: worldKinds, people: [person], ...change }),
        idle,
      );
    expect(none({ minimumMinutes: 60, maximumMinutes: 0 })).toBeNull();
    expect(none({ creditMinutes: 480, maximumMinutes: 60 })).toBeNull();
    expect(none({ minimumMinutes: 60 }, { kinds: [] })).toBeNull();
    expect(none({ pins: [{ dayIndex: 9, shiftIndex: 1, postSkillId: null }] })).toBeNull();
    expect(none({ pins: [{ dayIndex: 0, shiftIndex: 0, postSkillId: 'vet' }] })).toBeNull();
    expect(none({ pins: [{ dayIndex: 9, shiftIndex: null, postSkillId: null }] })).not.toBeNull();
  });

  it('is the cheapest of all lines that break no rule, at any prices', () => {
    fc.assert(
      fc.property(anyProblem, anyPrices, (problem, prices) => {
        const found = findCheapest(problem, prices);
        const expected = cheapestOfAll(problem, prices);
        if (expected === null) expect(found).toBeNull();
        else expect(found).toBeCloseTo(expected, 6);
      }),
      { numRuns: 40 },
    );
  });
});
