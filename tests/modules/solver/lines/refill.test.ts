import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type LinearModel, objectiveOf, roundingSlackCents } from '@/modules/model';
import type { Problem } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { seededRandom } from '@/modules/solver/lines/random';
import type { Pricing } from '@/modules/solver/lines/refill';
import { dayOff, type RosterLines } from '@/modules/solver/lines/roster-lines';
import { findClashes, type Ground, prepareGround } from '@/modules/solver/search/first-roster';
import { everyLine, rosterOf as rosterOfLine, type ShiftLine } from '../../model/net/every-line';
import { realTools } from '../analysis-solver';
import { anyProblem, layGround, recounted, roomFor, rosterOf } from './any-ground';

/** Everybody's Nights and weekends have a price, so that the ends of lines know them. */
const fairness: Problem['fairness'] = [
  { kind: 'share', measure: 'nights', steps: [{ above: 1, priceCents: 1700 }] },
  { kind: 'share', measure: 'weekends', steps: [{ above: 0, priceCents: 900 }] },
];

/** One person of a problem with its floors, which make several posts worth having. */
const anyPersonAlone = anyProblem.map((problem) => ({
  ...problem,
  people: problem.people.slice(0, 1).map((person) => ({ ...person, isOutside: false })),
  teamRules: [],
  fairness,
}));

/** Prices on shifts by column, on each Night and on each weekend. */
interface Prices {
  readonly columns: Float64Array;
  readonly night: number;
  readonly weekend: number;
}

function drawPrices({ model }: Ground, seed: number): Prices {
  const random = seededRandom(seed);
  const size = 40_000 * random();
  const draw = () => (random() - 0.5) * size;
  const columns = Float64Array.from(model.linear.columnNames, draw);
  return { columns, night: draw() / 5, weekend: draw() / 5 };
}

const pricingBy = ({ space }: Ground, { columns, night, weekend }: Prices): Pricing => ({
  coverPrice: (column) => columns[column] ?? 0,
  noise: () => 0,
  endPrice: (person, end) => {
    const ends = space.lines[person]?.net.ends;
    return night * (ends?.nights[end] ?? 0) + weekend * (ends?.weekends[end] ?? 0);
  },
});

interface LawfulLine {
  readonly line: ShiftLine;
  readonly costCents: number;
  readonly nights: number;
  readonly weekends: number;
}

/** Every line that breaks no rule, with its cost and counts by the proof. */
function lawfulLines(problem: Problem): LawfulLine[] {
  const [person] = problem.people;
  if (!person) return [];
  const bare = { ...problem, floors: [], ceilings: [] };
  return everyLine(problem).flatMap((line) => {
    const { breaches, costCents, people } = proveRoster(bare, rosterOfLine(problem, person, line));
    const [counts] = people;
    if (breaches.length > 0 || !counts) return [];
    return [{ line, costCents, nights: counts.nights, weekends: counts.weekends }];
  });
}

/** Least cost of some lines, each shift in its cheapest post. */
function cheapestOf(lines: readonly LawfulLine[], { model }: Ground, prices: Prices): number {
  const [work] = model.works;
  const priceOf = (shiftIndex: number): number => {
    const pin = work?.person.pins.find((one) => one.shiftIndex === shiftIndex);
    const posts = work?.columns.filter(({ shift }) => shift.index === shiftIndex) ?? [];
    const open = posts.filter((post) =>
      [null, post.postSkillId].includes(pin?.postSkillId ?? null),
    );
    return Math.min(...open.map(({ column }) => prices.columns[column] ?? 0));
  };
  const shiftPrices = model.problem.shifts.map(({ index }) => priceOf(index));
  return lines.reduce((least, { line, costCents, nights, weekends }) => {
    const worked = line.filter((shiftIndex) => shiftIndex !== null);
    const paid = worked.reduce(
      (sum, shiftIndex) => sum + (shiftPrices[shiftIndex] ?? 0),
      costCents,
    );
    return Math.min(least, paid + prices.night * nights + prices.weekend * weekends);
  }, Number.POSITIVE_INFINITY);
}

/** The same by the compact model of the one person, without what floors and ceilings cost. */
function cheapestByModel({ model }: Ground, prices: Prices): number {
  const cost = objectiveOf(model.linear, 'cost');
  const costs = cost.costs.slice();
  for (const { shorts } of model.floors) for (const { column } of shorts) costs[column] = 0;
  for (const { excessColumn } of model.ceilings) costs[excessColumn] = 0;
  for (const { column, shift } of model.works[0]?.columns ?? []) {
    costs[column] =
      (costs[column] ?? 0) + (prices.columns[column] ?? 0) + (shift.isNight ? prices.night : 0);
  }
  for (const { column } of model.weekends[0] ?? [])
    costs[column] = (costs[column] ?? 0) + prices.weekend;
  const linear: LinearModel = { ...model.linear, objectives: { priced: { ...cost, costs } } };
  const outcome = realTools.solve(linear, 'priced', { limitSeconds: 20 });
  if (outcome.kind === 'infeasible') return Number.POSITIVE_INFINITY;
  if (outcome.kind !== 'optimal') throw new Error(outcome.kind);
  return outcome.solution.objective;
}

const anySeed = fc.nat(1_000_000);

describe('the cheapest line of a person', () => {
  it('costs what the cheapest of all lines costs, and what the compact model says', () => {
    let found = 0;
    fc.assert(
      fc.property(anyPersonAlone, anySeed, (problem, seed) => {
        const ground = prepareGround(problem);
        const isClash = findClashes(ground).length > 0;
        const rounding = roundingSlackCents(ground.model) + 1e-6;
        const lawful = lawfulLines(problem);
        for (const more of [0, 1, 2, 3]) {
          const prices = drawPrices(ground, seed + more);
          const byModel = cheapestByModel(ground, prices);
          const ofAll = cheapestOf(lawful, ground, prices);
          if (isClash) {
            expect([byModel, ofAll]).toEqual([Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY]);
            continue;
          }
          const { least, lines } = ground.refill.cheapestLines(0, pricingBy(ground, prices), 3);
          const cost = least + ground.offset;
          const isCounted = ground.space.lines[0]?.sideLimits.length === 0;
          found += isCounted ? 1 : 0;
          // A limit that the net does not count makes it a lower bound.
          expect(cost).toBeLessThanOrEqual(byModel + 1e-5);
          expect(cost).toBeLessThanOrEqual(ofAll + rounding);
          if (!isCounted) continue;
          expect(cost).toBeGreaterThanOrEqual(byModel - 1e-5);
          expect(cost).toBeGreaterThanOrEqual(ofAll - rounding);
          expect(lines[0]?.price).toBeCloseTo(least, 6);
        }
      }),
      { numRuns: 40 },
    );
    expect(found).toBeGreaterThan(40);
  });

  it('is told with its shifts, its price and its end, and breaks no rule', () => {
    fc.assert(
      fc.property(anyPersonAlone, anySeed, (problem, seed) => {
        const ground = prepareGround(problem);
        if (findClashes(ground).length > 0) return;
        const prices = drawPrices(ground, seed);
        const pricing = pricingBy(ground, prices);
        const { least, lines } = ground.refill.cheapestLines(0, pricing, 4);
        for (const { cells, end, price } of lines) {
          ground.lines.cells.set(cells);
          expect(ground.lines.trace(0)).toBe(true);
          expect(ground.lines.endOf(0)).toBe(end);
          const cost = cells.reduce((sum, column) => {
            if (column === dayOff) return sum;
            return sum + (ground.space.columns.cost[column] ?? 0) + pricing.coverPrice(column);
          }, 0);
          const atEnd = (ground.space.ends[0]?.[end] ?? 0) + (pricing.endPrice?.(0, end) ?? 0);
          expect(price).toBeCloseTo(cost + atEnd, 5);
          expect(price).toBeGreaterThanOrEqual(least - 1e-6);
          expect(proveRoster(problem, rosterOf(ground)).breaches).toEqual([]);
        }
      }),
      { numRuns: 60 },
    );
  });
});

/** Every choice for the days of a window, as the person's whole line: a work column or a day off on each. */
function everyWindow({ space, lines }: Ground, window: Window): Int32Array[] {
  const own = space.lines[window.person];
  const first = window.person * lines.days;
  let choices = [lines.cells.slice(first, first + lines.days)];
  for (let day = window.from; own && day < window.to; day += 1) {
    const { groupCount } = own.net;
    const works = own.options.slice(day * groupCount, (day + 1) * groupCount).flat();
    const ofDay = works.map(({ column }) => column);
    if (own.mayBeFree[day] === 1) ofDay.push(dayOff);
    choices = choices.flatMap((cells) =>
      ofDay.map((column) => {
        const changed = cells.slice();
        changed[day] = column;
        return changed;
      }),
    );
  }
  return choices;
}

interface Window {
  readonly person: number;
  readonly from: number;
  readonly to: number;
}

/** What the window of a person's line costs by some prices, with the end and what it does to the spreads. */
function windowPrice(
  lines: RosterLines,
  { person, from, to }: Window,
  prices: Float64Array,
): number {
  const { columns, ends } = lines.space;
  const first = person * lines.days;
  const shifts = lines.cells.subarray(first + from, first + to).reduce((sum, column) => {
    if (column === dayOff) return sum;
    return sum + (columns.cost[column] ?? 0) + (prices[column] ?? 0);
  }, 0);
  return shifts + (ends[person]?.[lines.endOf(person)] ?? 0) + (lines.total - lines.cost);
}

function cheapestWindow(ground: Ground, window: Window, prices: Float64Array): number {
  const scratch = recounted(ground);
  return everyWindow(ground, window).reduce((least, cells) => {
    scratch.cells.set(cells, window.person * scratch.days);
    return scratch.trace(window.person)
      ? Math.min(least, windowPrice(scratch, window, prices))
      : least;
  }, Number.POSITIVE_INFINITY);
}

/** Takes a window out and lays it anew, as a search does. */
function layAnew({ lines, refill }: Ground, window: Window, prices: Float64Array): boolean {
  const { person, from, to } = window;
  lines.countDays(person, from, to, -1);
  lines.countEnd(person, -1);
  const pricing = { coverPrice: (column: number) => prices[column] ?? 0, noise: () => 0 };
  const isLaid = refill.fill(person, from, to, pricing);
  lines.countDays(person, from, to, 1);
  lines.countEnd(person, 1);
  return isLaid;
}

function drawWindow({ lines }: Ground, random: () => number): Window {
  const person = Math.floor(random() * lines.people);
  const from = Math.floor(random() * lines.days);
  return { person, from, to: Math.min(lines.days, from + 1 + Math.floor(random() * 3)) };
}

/** The cells with those of the window as they were. */
function withWindowOf(cells: Int32Array, before: Int32Array, window: Window, days: number) {
  const kept = cells.slice();
  const first = window.person * days;
  kept.set(before.subarray(first + window.from, first + window.to), first + window.from);
  return kept;
}

/** What a line does to the spreads depends on everybody else's. */
const withSpreads = anyProblem.map((problem) => ({
  ...problem,
  fairness: (['nights', 'weekends'] as const).map((measure) => ({
    kind: 'spread' as const,
    measure,
    priceCents: 20_000,
  })),
}));

describe('a window of days laid anew', () => {
  it('changes no other day, breaks no rule and is the cheapest there is', () => {
    let filled = 0;
    const relay = (ground: Ground, window: Window, prices: Float64Array) => {
      const { lines, space } = ground;
      const isExact = space.lines[window.person]?.sideLimits.length === 0;
      const least = isExact ? cheapestWindow(ground, window, prices) : null;
      const before = lines.cells.slice();
      const isLaid = layAnew(ground, window, prices);
      filled += isLaid ? 1 : 0;
      expect(withWindowOf(lines.cells, before, window, lines.days)).toEqual(before);
      const { breaches } = proveRoster(ground.model.problem, rosterOf(ground));
      expect(breaches.filter(({ rule }) => rule !== 'teamRules')).toEqual([]);
      if (least === null) return;
      expect(isLaid).toBe(true);
      const price = windowPrice(lines, window, prices);
      expect(Math.abs(price - least)).toBeLessThanOrEqual(roomFor(lines.cost));
    };
    fc.assert(
      fc.property(withSpreads, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        const random = seededRandom(seed);
        for (let step = 0; ground && step < 12; step += 1) {
          relay(ground, drawWindow(ground, random), drawPrices(ground, seed + step).columns);
        }
      }),
      { numRuns: 40 },
    );
    expect(filled).toBeGreaterThan(100);
  });
});
