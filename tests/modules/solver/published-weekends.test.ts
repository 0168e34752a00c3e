import { describe, expect, it } from 'vitest';
import type { Problem, TeamRule } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';
import { optimalOf, runLane } from './search/run-lane';

/*
 * Smallest teams for days off with weekend rules, as whole problems: the published number of people has a
 * roster that holds every floor, and with one person less the engine proves that none does. All values were
 * recomputed with CBC 2.10.8.
 */

const shiftMinutes = 480;
const kinds = [{ id: 'Day', startMinute: 480, endMinute: 480 + shiftMinutes }];

/** So many people for weeks with these needs, Monday to Sunday; each works at most five days a week on average. */
function weeksOf(
  people: number,
  needs: readonly number[],
  weeks: number,
  rules: ProblemSketch['rules'] = {},
) {
  const mostMinutes = 5 * weeks * shiftMinutes;
  return buildProblem({
    startsOn: '2027-02-01',
    dayCount: 7 * weeks,
    kinds,
    people: Array.from({ length: people }, () => ({
      contractMinutes: mostMinutes,
      maximumMinutes: mostMinutes,
    })),
    floors: Array.from({ length: 7 * weeks }, (_, day) => ({
      startMinute: day * 1440 + 480,
      endMinute: day * 1440 + 480 + shiftMinutes,
      people: needs[day % 7] ?? 0,
    })).filter(({ people: needed }) => needed > 0),
    rules,
  });
}

/**
 * The same with exactly five days in every week of each person, as linear rules. A week may begin with the
 * Sunday of the weekend before; that of the first one is the last day, as in a schedule that repeats itself.
 */
function withFiveDaysAWeek(problem: Problem, beginsOn: 'Sunday' | 'Monday'): Problem {
  const count = problem.days.length;
  const weeks = count / 7;
  const shift = beginsOn === 'Sunday' ? count - 1 : 0;
  const teamRules = problem.people.flatMap(({ id }) =>
    Array.from(
      { length: weeks },
      (_, week): TeamRule => ({
        id: `${id} week ${week}`,
        name: `Five days of ${id} in week ${week + 1}`,
        priceCents: null,
        kind: 'linear',
        terms: Array.from({ length: 7 }, (__, day) => ({
          personId: id,
          shiftIndex: (7 * week + day + shift) % count,
          coefficient: 1,
        })),
        least: 5,
        most: 5,
      }),
    ),
  );
  return { ...problem, teamRules };
}

/** Missing people of the best roster, which must be lawful, and proven to be the fewest. */
function missing(problem: Problem): number {
  const found = optimalOf(
    runLane(problem, { haste: 5, onlyProves: true, options: { limitSeconds: 150 } }),
  );
  const proof = proveRoster(problem, found.roster);
  expect(proof.breaches).toEqual([]);
  expect(proof.shortageMinutes).toBe(found.shortageBoundMinutes);
  return proof.shortageMinutes / shiftMinutes;
}

/** The team holds its floors; with one person less it cannot. */
function expectSmallest(people: number, problemOf: (people: number) => Problem) {
  expect(missing(problemOf(people))).toBe(0);
  expect(missing(problemOf(people - 1))).toBeGreaterThan(0);
}

describe('any two days off a week', () => {
  /** W = max(max r, ceil(sum r / 5)); own instances, one for each term. */
  it.each([
    [[3, 3, 3, 3, 3, 3, 3], 5],
    [[2, 7, 2, 4, 3, 1, 0], 7],
    [[4, 3, 5, 4, 4, 2, 1], 5],
  ])('needs %j take %i people', (needs, people) => {
    expectSmallest(people, (count) => weeksOf(count, needs, 1));
  });

  /**
   * N on weekdays and n at weekends: W = max(N, n, N + ceil(2n / 5)). Baker and Magazine, Management Science
   * 24(2), 1977, 161-167.
   */
  it.each([
    [5, 3, 7],
    [3, 8, 8],
    [8, 1, 9],
    [4, 0, 4],
  ])('%i on weekdays and %i at weekends take %i people', (weekday, weekend, people) => {
    const needs = [weekday, weekday, weekday, weekday, weekday, weekend, weekend];
    expectSmallest(people, (count) => weeksOf(count, needs, 1));
  });
});

describe('every other weekend off, five days each week', () => {
  /** W = max(2n, N, N + ceil(2n / 5)). Brownell and Lowerre, Management Science 22(5), 1976, 597-605. */
  it.each([
    [5, 4, 8],
    [4, 1, 5],
    [5, 0, 5],
  ])('%i on weekdays and %i at weekends take %i people', (weekday, weekend, people) => {
    const needs = [weekday, weekday, weekday, weekday, weekday, weekend, weekend];
    expectSmallest(people, (count) =>
      withFiveDaysAWeek(weeksOf(count, needs, 2, { weekendsPerPeriod: 1 }), 'Monday'),
    );
  });
});

describe('A of B weekends off, five days a week, at most six in a row', () => {
  /**
   * Burns and Carter, Management Science 31(5), 1985, 599-607: W is the largest of
   * L1 = ceil(B x max(Sunday, Saturday) / (B - A)), L2 = ceil(sum / 5) and L3 = the largest need. Needs are
   * printed Sunday to Saturday; the first instance is in Pinedo, chapter 12, too.
   */
  it.each([
    { week: '1 0 3 3 3 3 2', off: 1, of: 3, bounds: [3, 3, 3], people: 3 },
    { week: '2 3 3 3 3 3 2', off: 1, of: 2, bounds: [4, 4, 3], people: 4 },
    { week: '3 5 5 5 5 5 3', off: 1, of: 2, bounds: [6, 7, 5], people: 7 },
    { week: '2 4 4 4 4 4 1', off: 2, of: 3, bounds: [6, 5, 4], people: 6 },
  ])('$week with $off of $of off take $people people', ({ week, off, of, bounds, people }) => {
    const needs = week.split(' ').map(Number);
    const [sunday = 0, ...others] = needs;
    const sum = needs.reduce((all, one) => all + one, 0);
    const weekend = Math.max(sunday, needs[6] ?? 0);
    expect(bounds).toEqual([
      Math.ceil((of * weekend) / (of - off)),
      Math.ceil(sum / 5),
      Math.max(...needs),
    ]);
    expect(people).toBe(Math.max(...bounds));
    const rules = { weekendsPerPeriod: of - off, longestRunDays: 6 };
    expectSmallest(people, (count) =>
      withFiveDaysAWeek(weeksOf(count, [...others, sunday], of, rules), 'Sunday'),
    );
  });
});
