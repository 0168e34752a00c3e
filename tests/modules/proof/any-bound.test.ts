import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { BoundRecord, PlannedRoster, Problem } from '@/modules/problem';
import { type Proof, proveBound, proveRoster } from '@/modules/proof';
import { buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';
import { type Draw, drawFrom, recordOf, shake } from './draw-record';
import {
  anyPay,
  anyPerson,
  anyRules,
  anyShare,
  anyStart,
  everyLine,
  worldKinds,
} from './small-worlds';

/*
 * Two people and three days: every roster there is, against the bound at any multipliers.
 */

const dayCount = 3;
const price = fc.option(fc.constantFrom(100, 1999, 6000), { nil: null });
const skillId = fc.constantFrom('nurse', 'vet', null);
const counting = fc.constantFrom('seated' as const, 'shared' as const);
const window = fc
  .record({ from: fc.integer({ min: 0, max: 60 }), hours: fc.integer({ min: 1, max: 12 }) })
  .map(({ from, hours }) => ({ startMinute: from * 60 + 15, endMinute: (from + hours) * 60 + 15 }));

const anyFloors = fc.array(
  fc
    .tuple(
      window,
      fc.record({
        skillId,
        counting,
        people: fc.integer({ min: 0, max: 3 }),
        priceCentsPerHour: price,
        priority: fc.integer({ min: 1, max: 2 }),
      }),
    )
    .map(([when, floor]) => ({ ...when, ...floor })),
  { minLength: 1, maxLength: 3 },
);

const anyCeilings = fc.array(
  fc
    .tuple(
      window,
      fc.record({
        skillId,
        counting,
        people: fc.integer({ min: 0, max: 1 }),
        priceCentsPerHour: price,
      }),
    )
    .map(([when, ceiling]) => ({ ...when, ...ceiling })),
  { minLength: 1, maxLength: 2 },
);

const personId = fc.constantFrom('ione', 'person-2');
const pair = ['ione', 'person-2'];
const anyTeamRule = fc
  .tuple(
    fc.constantFrom('together', 'apart', 'mostFree', 'budget', 'linear'),
    fc.constantFrom(null, 700, 1),
    fc.array(
      fc.record({
        personId,
        shiftIndex: fc.nat(dayCount * worldKinds.length - 1),
        coefficient: fc.integer({ min: -2, max: 3 }),
      }),
      { minLength: 1, maxLength: 3 },
    ),
    fc.nat(1),
  )
  .map(([kind, priceCents, terms, most]): Problem['teamRules'][number] => {
    const common = { id: kind, name: kind, priceCents };
    switch (kind) {
      case 'together':
        return { ...common, kind, personIds: ['ione', 'person-2'] };
      case 'apart':
        return { ...common, kind, personIds: pair };
      case 'mostFree':
        return { ...common, kind, personIds: pair, most };
      case 'budget':
        return { ...common, kind, mostCents: 20_000 + 20_000 * most };
      default:
        return { ...common, kind: 'linear', terms, least: most - 1, most: most + 1 };
    }
  });

const anySpread = fc.array(
  fc.record({
    kind: fc.constant('spread' as const),
    measure: fc.constantFrom('nights' as const, 'weekends' as const, 'refusedWishes' as const),
    priceCents: fc.constantFrom(0, 501, 3000),
  }),
  { minLength: 1, maxLength: 2 },
);

/** One thing that joins people at a time shows best what it does to a bound; some worlds have them all. */
const anyJoint: fc.Arbitrary<ProblemSketch> = fc.oneof(
  anyFloors.map((floors) => ({ floors })),
  anyCeilings.map((ceilings) => ({ ceilings })),
  anyTeamRule.map((rule) => ({ teamRules: [rule] })),
  anySpread.map((fairness) => ({ fairness })),
  fc.record({
    floors: anyFloors,
    ceilings: anyCeilings,
    teamRules: fc.uniqueArray(anyTeamRule, { maxLength: 2, selector: ({ kind }) => kind }),
    fairness: fc.tuple(anySpread, anyShare).map((terms) => terms.flat()),
  }),
);

const anyProblem = fc
  .record({
    people: fc.array(anyPerson(dayCount), { minLength: 2, maxLength: 2 }),
    rules: anyRules,
    pay: anyPay,
    startsOn: anyStart,
    joint: anyJoint,
  })
  .map(({ joint, ...sketch }) =>
    buildProblem({ ...sketch, ...joint, zone: 'Europe/Berlin', dayCount, kinds: worldKinds }),
  );

interface Weighed {
  readonly roster: PlannedRoster;
  readonly proof: Proof;
}

/** Every roster that breaks no rule. */
function everyLawfulRoster(problem: Problem): Weighed[] {
  const linesOf = problem.people.map((person) => {
    const alone = { ...problem, people: [person], teamRules: [] };
    return everyLine(problem, person).filter(
      (line) => proveRoster(alone, line).breaches.length === 0,
    );
  });
  return (linesOf[0] ?? [])
    .flatMap((one) => (linesOf[1] ?? []).map((other) => [...one, ...other]))
    .map((roster) => ({ roster, proof: proveRoster(problem, roster) }))
    .filter(({ proof }) => proof.breaches.length === 0);
}

/** Whether a roster is short and in surplus by no more than the figures. */
const isWithin = (proof: Proof, figures: Proof): boolean =>
  proof.surplusMinutes <= figures.surplusMinutes &&
  proof.shortageByPriority.every(
    ({ minutes }, index) => minutes <= (figures.shortageByPriority[index]?.minutes ?? 0),
  );

/** The highest bound on a way uphill from the record: what is unsound anywhere near shows there. */
function climb(problem: Problem, first: BoundRecord, figures: Proof, draw: Draw): number {
  const boundOf = (record: BoundRecord): number => {
    const found = proveBound(problem, record, figures);
    if (found.kind === 'refused') throw new Error(found.sentence);
    return found.boundCents;
  };
  let [record, bound] = [first, boundOf(first)];
  for (let step = 0; step < 120; step += 1) {
    const other = shake(record, draw);
    const found = boundOf(other);
    if (found >= bound) [record, bound] = [other, found];
  }
  return bound;
}

describe('the bound at any multipliers', () => {
  it('lies below the cost of every roster of two people', () => {
    const draws = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), {
      minLength: 97,
      maxLength: 97,
    });
    fc.assert(
      fc.property(anyProblem, draws, fc.nat(), (problem, figures, pick) => {
        const rosters = everyLawfulRoster(problem);
        const allowed = rosters[pick % Math.max(1, rosters.length)];
        if (!allowed) return;
        const draw = drawFrom(figures);
        const bound = climb(problem, recordOf(problem, draw), allowed.proof, draw);
        const costs = rosters
          .filter(({ proof }) => isWithin(proof, allowed.proof))
          .map(({ proof }) => proof.costCents);
        expect(bound).toBeLessThanOrEqual(Math.min(...costs));
      }),
      { numRuns: 70 },
    );
  });
});
