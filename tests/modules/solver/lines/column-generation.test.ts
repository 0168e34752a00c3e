import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blendObjective, type LinearModel, relaxed, roundingSlackCents } from '@/modules/model';
import { type BoundProof, proveBound, proveRoster } from '@/modules/proof';
import { writeBoundRecord } from '@/modules/solver/lines/bound-record';
import { generateColumns } from '@/modules/solver/lines/column-generation';
import { costOf } from '@/modules/solver/lines/line-cost';
import { wholeOf } from '@/modules/solver/lines/part';
import {
  type MasterPrices,
  type Pattern,
  PatternMaster,
} from '@/modules/solver/lines/pattern-master';
import { dayOff } from '@/modules/solver/lines/roster-lines';
import { type Ground, linesOf } from '@/modules/solver/search/first-roster';
import { levelCents } from '@/modules/solver/search/level-cents';
import { realTools } from '../analysis-solver';
import { annealFor, anyProblem, layGround, roomFor, rosterOf, withoutWideRows } from './any-ground';

const anySeed = fc.nat(1_000_000);

/** Few enough lines a person to make a column of each. */
const tinyProblem = anyProblem
  .filter(({ days }) => days.length === 4)
  .map((problem) => ({ ...withoutWideRows(problem), people: problem.people.slice(0, 2) }))
  .map((problem) => ({
    ...problem,
    teamRules: problem.teamRules.filter((rule) => !JSON.stringify(rule).includes('person-3')),
  }));

/** Every line of everybody that the nets have, in every choice of posts. */
function everyPattern({ space, lines }: Ground): Pattern[] {
  return space.lines.flatMap((own, person) => {
    const { groupCount, dayCount, next, layers } = own.net;
    const found: Pattern[] = [];
    const cells = new Int32Array(dayCount).fill(dayOff);
    const visit = (day: number, node: number) => {
      if (day === dayCount) {
        const end = node - (layers[dayCount] ?? 0);
        if (isOverLimit(own, cells, space.columns.group)) return;
        const whole = cells.slice();
        found.push({ person, cells: whole, end, cost: costOf(space, person, whole, end) });
        return;
      }
      for (let group = 0; group < groupCount; group += 1) {
        const target = next[node * groupCount + group] ?? -1;
        if (target < 0) continue;
        const columns =
          group > 0
            ? (own.options[day * groupCount + group] ?? []).map(({ column }) => column)
            : own.mayBeFree[day] === 1
              ? [dayOff]
              : [];
        for (const column of columns) {
          cells[day] = column;
          visit(day + 1, target);
        }
      }
    };
    visit(0, 0);
    expect(lines.days).toBe(dayCount);
    return found;
  });
}

const isOverLimit = (
  { sideLimits }: Ground['space']['lines'][number],
  cells: Int32Array,
  groupOf: Int16Array,
): boolean =>
  sideLimits.some(
    ({ most, group }) =>
      cells.filter((column) => column >= 0 && groupOf[column] === group).length > most,
  );

function optimum(linear: LinearModel, objective: string): number {
  const outcome = realTools.solve(linear, objective, { limitSeconds: 30 });
  if (outcome.kind !== 'optimal') throw new Error(outcome.kind);
  return outcome.solution.objective;
}

const generate = (ground: Ground, more: Partial<Parameters<typeof generateColumns>[3]> = {}) =>
  generateColumns(ground.lines, ground.refill, realTools.open, {
    part: wholeOf(ground.space),
    patterns: linesOf(ground, wholeOf(ground.space)),
    mostRounds: 400,
    limitSeconds: 30,
    shouldStop: () => false,
    onBound: () => undefined,
    isEnough: () => false,
    ...more,
  });

describe('column generation', () => {
  it('ends at the value of all patterns at once, above the compact relaxation', () => {
    let compared = 0;
    fc.assert(
      fc.property(tinyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        compared += 1;
        const { model, offset, space } = ground;
        const found = generate(ground);
        const master = new PatternMaster(ground.lines, wholeOf(space));
        const all = master.withPatterns(everyPattern(ground));
        // Rows that no line can change are outside of the master: their cost stands fast.
        const fixed = offset + ground.lines.total - master.valueOf(ground.lines);
        const ofAll = optimum(relaxed(all), 'cost') + fixed;
        const compact = optimum(relaxed(model.linear), blendObjective);
        const best = optimum(model.linear, blendObjective);
        const room = Math.max(1e-3, Math.abs(best) * 1e-6);
        expect(found.isConverged).toBe(true);
        expect(ofAll).toBeGreaterThanOrEqual(compact - room);
        expect(ofAll).toBeLessThanOrEqual(best + room);
        expect(found.bound + offset).toBeLessThanOrEqual(ofAll + room);
        if (space.lines.some(({ sideLimits }) => sideLimits.length > 0)) return;
        expect(found.bound + offset).toBeGreaterThanOrEqual(ofAll - 2 * room);
      }),
      { numRuns: 30 },
    );
    expect(compared).toBeGreaterThan(10);
  });

  it('has whole-number masters whose best roster is that of the compact model', () => {
    let compared = 0;
    fc.assert(
      fc.property(tinyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        compared += 1;
        const master = new PatternMaster(ground.lines, wholeOf(ground.space));
        const fixed = ground.offset + ground.lines.total - master.valueOf(ground.lines);
        const patterns = optimum(master.withPatterns(everyPattern(ground)), 'cost') + fixed;
        const compact = optimum(ground.model.linear, blendObjective);
        expect(Math.abs(patterns - compact)).toBeLessThanOrEqual(Math.max(1e-3, compact * 1e-6));
      }),
      { numRuns: 15 },
    );
    expect(compared).toBeGreaterThan(4);
  });

  it('lays a part of the roster at the least cost with the rest as it is', () => {
    let changed = 0;
    fc.assert(
      fc.property(tinyProblem, anySeed, fc.nat(3), fc.nat(3), (problem, seed, one, other) => {
        const ground = layGround(problem, seed, true);
        if (!ground) return;
        const [from, to] = [Math.min(one, other), Math.max(one, other) + 1];
        const people = seed % 3 === 0 ? [seed % 2] : [0, 1];
        const part = { people, from, to };
        const found = generate(ground, { part, patterns: linesOf(ground, part) });
        const { lines } = ground;
        const isKept = ({ person, cells }: Pattern) =>
          cells.every(
            (column, day) =>
              (day >= from && day < to) || column === lines.cells[person * lines.days + day],
          );
        expect(found.patterns.filter((pattern) => !isKept(pattern))).toEqual([]);
        const master = new PatternMaster(lines, part);
        const open = everyPattern(ground).filter(
          (pattern) => people.includes(pattern.person) && isKept(pattern),
        );
        const fixed = lines.total - master.valueOf(lines);
        const least = optimum(relaxed(master.withPatterns(open)), 'cost') + fixed;
        const room = Math.max(1e-3, Math.abs(lines.total) * 1e-7);
        expect(least).toBeLessThanOrEqual(lines.total + room);
        changed += least < lines.total - room ? 1 : 0;
        expect(found.value).toBeGreaterThanOrEqual(least - room);
        if (ground.space.lines.some(({ sideLimits }) => sideLimits.length > 0)) return;
        expect(found.value).toBeLessThanOrEqual(least + room);
      }),
      { numRuns: 50 },
    );
    expect(changed).toBeGreaterThan(3);
  });

  it('gives bounds that rise, that no roster lies below and that the proof reckons too', () => {
    let compared = 0;
    fc.assert(
      fc.property(anyProblem, anySeed, (problem, seed) => {
        const ground = layGround(problem, seed);
        if (!ground) return;
        compared += 1;
        const bounds: number[] = [];
        const { prices, bound } = generate(ground, { onBound: (value) => bounds.push(value) });
        expect(bounds).toEqual([...bounds].sort((one, other) => one - other));
        expect(bounds.at(-1)).toBe(bound);
        const compare = () =>
          expect(bound).toBeLessThanOrEqual(ground.lines.total + roomFor(bound) * 100);
        annealFor(ground, 6, seed, compare);
        if (!prices) return;
        expectWithinSlopes(ground, prices);
        const proven = proveBound(
          problem,
          writeBoundRecord(ground.space, prices),
          proveRoster(problem, rosterOf(ground)),
        );
        compareWithProof(ground, bound, proven);
      }),
      { numRuns: 120 },
    );
    expect(compared).toBeGreaterThan(20);
  });
});

/** One unit more is never worth more than it can take off the cost of a row, nor less than it can add. */
function expectWithinSlopes({ space: { rows } }: Ground, prices: MasterPrices) {
  prices.rows.forEach((price, row) => {
    const from = rows.offsets[row] ?? 0;
    const to = rows.offsets[row + 1] ?? rows.table.length;
    const slope = (at: number) => (rows.table[at + 1] ?? 0) - (rows.table[at] ?? 0);
    const room = roomFor(price) * 100;
    expect(price).toBeLessThanOrEqual(-slope(from) + room);
    expect(price).toBeGreaterThanOrEqual(-slope(to - 2) - room);
  });
}

/** The engine's bound for the levels of the roster in the lines, and the proof's for the same figures. */
function compareWithProof(ground: Ground, bound: number, proven: BoundProof) {
  if (proven.kind === 'refused') {
    expect(proven.sentence).toMatch(/^No roster can keep the rule /);
    return;
  }
  const { model, offset, space } = ground;
  const proof = proveRoster(model.problem, rosterOf(ground));
  const levels = model.levels.map(({ name, priority }) => {
    if (name === 'teamRules') return 0;
    if (name === 'surplus') return proof.surplusMinutes;
    return proof.shortageByPriority.find((one) => one.priority === priority)?.minutes ?? 0;
  });
  const cents = bound + offset - levelCents(model, levels);
  const room = 2 * roundingSlackCents(model) + 1 + roomFor(bound, ...levels.map(() => bound));
  expect(proven.boundCents).toBeGreaterThanOrEqual(Math.max(0, cents) - room);
  if (space.lines.some(({ sideLimits }) => sideLimits.length > 0)) return;
  expect(proven.boundCents).toBeLessThanOrEqual(Math.max(0, cents) + room);
}
