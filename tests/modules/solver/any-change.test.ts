import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { buildRosterModel, roundingSlackCents } from '@/modules/model';
import type { Problem, ProblemPerson, ProblemRules, TeamRule } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { addDays, assertNever } from '@/modules/units';
import { anyProblem, withoutWideRows } from './lines/any-ground';
import { optimalOf, runLane } from './search/run-lane';

/*
 * What a change of a problem does to its optimum. Budgets are left out: pay is rounded, so a firm one can be
 * kept in more ways than a model tells.
 */

const problems = anyProblem.map(withoutWideRows);

/** Team rules, ceilings and floors by priority, in the order in which they count, then the cost. */
interface Optimum {
  readonly levels: readonly number[];
  readonly costCents: number;
  /** How far an optimum may lie from another of the same worth: the rounding of pay. */
  readonly roundingCents: number;
}

/** The optimum, or null when somebody has no lawful line. */
function optimumOf(problem: Problem): Optimum | null {
  const run = runLane(problem, { haste: 20, onlyProves: true, options: { limitSeconds: 300 } });
  if (run.outcome.kind === 'impossible') return null;
  const proof = proveRoster(problem, optimalOf(run).roster);
  const shortage = Array.from({ length: 9 }, (_, index) => {
    const own = proof.shortageByPriority.find(({ priority }) => priority === index + 1);
    return own?.minutes ?? 0;
  });
  const slack = roundingSlackCents(buildRosterModel(problem));
  return {
    levels: [proof.teamRuleUnits, proof.surplusMinutes, ...shortage],
    costCents: proof.costCents,
    roundingCents: slack === 0 ? 0 : 4 * Math.ceil(slack) + 2,
  };
}

/** Levels one after the other, then the cost. */
function expectNotBelow(one: Optimum, other: Optimum) {
  const place = one.levels.findIndex((value, level) => value !== other.levels[level]);
  if (place >= 0) {
    expect(one.levels[place]).toBeGreaterThan(other.levels[place] ?? Number.POSITIVE_INFINITY);
    return;
  }
  const rounding = Math.max(one.roundingCents, other.roundingCents);
  expect(one.costCents).toBeGreaterThanOrEqual(other.costCents - rounding);
}

const limits: readonly ((rules: ProblemRules) => ProblemRules)[] = [
  (rules) => ({ ...rules, restMinutes: 0 }),
  (rules) => ({ ...rules, longestRunDays: null }),
  (rules) => ({ ...rules, longestRunNights: null }),
  (rules) => ({ ...rules, nightsPerPeriod: null }),
  (rules) => ({ ...rules, weekendsPerPeriod: null }),
  (rules) => ({ ...rules, shortestRunDays: null }),
  (rules) => ({ ...rules, shortestRunFreeDays: null }),
  (rules) => ({ ...rules, kindsThatMayNotFollow: [] }),
];

const ownTerms: readonly ((person: ProblemPerson) => ProblemPerson)[] = [
  (person) => ({ ...person, minimumMinutes: 0 }),
  (person) => ({ ...person, maximumMinutes: person.maximumMinutes + 480 }),
  (person) => ({ ...person, mayWorkNights: true }),
  (person) => ({ ...person, absences: [] }),
  (person) => ({ ...person, history: [] }),
  (person) => ({ ...person, following: [] }),
  (person) => ({ ...person, pins: [] }),
  (person) => ({ ...person, kindLimits: [] }),
];

/** Every way in which one thing of a problem is asked less of. */
const loosenings: readonly ((problem: Problem) => Problem)[] = [
  ...limits.map((loosen) => (problem: Problem) => ({
    ...problem,
    rules: loosen(problem.rules),
    people: problem.people.map((person) => ({
      ...person,
      rules: person.rules && loosen(person.rules),
    })),
  })),
  ...ownTerms.map((loosen) => (problem: Problem) => ({
    ...problem,
    people: problem.people.map(loosen),
  })),
  (problem) => ({ ...problem, teamRules: problem.teamRules.slice(1) }),
  (problem) => ({ ...problem, ceilings: problem.ceilings.slice(1) }),
  (problem) => ({ ...problem, floors: problem.floors.slice(1) }),
];

/** The same people in the opposite order and under other names. */
function renamePeople(problem: Problem): Problem {
  const rename = (id: string) => `other-${id}`;
  return {
    ...problem,
    people: problem.people.map((person) => ({ ...person, id: rename(person.id) })).reverse(),
    teamRules: problem.teamRules.map((rule) => renameIn(rule, rename)),
  };
}

function renameIn(rule: TeamRule, rename: (id: string) => string): TeamRule {
  switch (rule.kind) {
    case 'together': {
      const [first, second] = rule.personIds;
      return { ...rule, personIds: [rename(second), rename(first)] };
    }
    case 'apart':
    case 'mostFree':
      return { ...rule, personIds: rule.personIds.map(rename).reverse() };
    case 'linear':
      return {
        ...rule,
        terms: rule.terms.map((term) => ({ ...term, personId: rename(term.personId) })),
      };
    case 'budget':
      return rule;
    default:
      return assertNever(rule);
  }
}

/** The same shifts in another order, those of each day backwards. */
function reorderShifts(problem: Problem): Problem {
  const order = [...problem.shifts].sort(
    (one, other) => one.dayIndex - other.dayIndex || other.index - one.index,
  );
  const placeOf = new Map(order.map(({ index }, place) => [index, place]));
  const move = <T extends { readonly shiftIndex: number | null }>(part: T): T => ({
    ...part,
    shiftIndex: part.shiftIndex === null ? null : (placeOf.get(part.shiftIndex) ?? null),
  });
  return {
    ...problem,
    shifts: order.map((shift, index) => ({ ...shift, index })),
    people: problem.people.map((person) => ({
      ...person,
      pins: person.pins.map(move),
      wishes: person.wishes.map(move),
    })),
    teamRules: problem.teamRules.map((rule) =>
      rule.kind === 'linear' ? { ...rule, terms: rule.terms.map(move) } : rule,
    ),
  };
}

const aWeekLater = (problem: Problem): Problem => ({
  ...problem,
  days: problem.days.map((day) => ({ ...day, date: addDays(day.date, 7) })),
});

describe('the optimum of a problem', () => {
  it('never falls when a floor is added', () => {
    let compared = 0;
    fc.assert(
      fc.property(problems, problems, (problem, other) => {
        const [added] = other.floors;
        const before = optimumOf(problem);
        if (!before || !added) return;
        compared += 1;
        const floor = { ...added, floorId: 'one more' };
        const after = optimumOf({ ...problem, floors: [...problem.floors, floor] });
        if (!after) throw new Error('A floor takes nobody their lawful line.');
        expectNotBelow(after, before);
      }),
      { numRuns: 25 },
    );
    expect(compared).toBeGreaterThan(10);
  });

  it('never rises when a rule is loosened', () => {
    let fell = 0;
    fc.assert(
      fc.property(problems, fc.constantFrom(...loosenings), (problem, loosen) => {
        const before = optimumOf(problem);
        if (!before) return;
        const after = optimumOf(loosen(problem));
        if (!after) throw new Error('Loosened rules leave everybody their lawful lines.');
        expectNotBelow(before, after);
        fell += JSON.stringify(before) === JSON.stringify(after) ? 0 : 1;
      }),
      { numRuns: 40, seed: 7 },
    );
    expect(fell).toBeGreaterThan(3);
  });

  it.each([
    ['people are renamed and put in another order', renamePeople],
    ['shifts are put in another order', reorderShifts],
    ['all dates are a week later', aWeekLater],
  ])('is the same when %s', (_, change) => {
    fc.assert(
      fc.property(problems, (problem) => {
        const [before, after] = [optimumOf(problem), optimumOf(change(problem))];
        expect(after === null).toBe(before === null);
        if (!before || !after) return;
        expectNotBelow(after, before);
        expectNotBelow(before, after);
      }),
      { numRuns: 15 },
    );
  });
});
