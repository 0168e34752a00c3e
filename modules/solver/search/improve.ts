import { blendObjective, restrictModel } from '../../model';
import { anneal } from '../lines/anneal';
import { generateColumns } from '../lines/column-generation';
import type { LinePool } from '../lines/line-pool';
import type { Part } from '../lines/part';
import { type Choice, chooseDays, choosePeople, freeColumns } from './choose-part';
import { dive } from './dive';
import { type Ground, linesOf, putRoster } from './first-roster';
import { masterWork, type Pace } from './pace';
import type { LinearTools } from './search-lane';
import { searchPatterns } from './search-patterns';
import type { SearchState } from './search-state';
import { temperatures } from './temperatures';

type ArmName = 'anneal' | 'people' | 'days' | 'part' | 'line patterns' | 'window patterns';

/** One kind of improvement step, and how it has done so far. */
interface Arm {
  readonly name: ArmName;
  /** Work columns that are freed, or nominal seconds of an annealing. */
  size: number;
  spent: number;
  successes: number;
}

/** Nominal seconds after which a solve was too large, and below which it could have been larger. */
const longSolve = 1.5;
const shortSolve = 0.6;
const mostNodes = 400;
/** More people are laid by a dive. */
const mostPeopleOfATree = 12;
/** Nominal seconds of the longest annealing. */
const longestAnneal = 10;
/** How much of an arm's past still counts after each step. */
const memory = 0.92;

export interface Improver extends LinearTools {
  readonly ground: Ground;
  readonly state: SearchState;
  readonly pace: Pace;
  readonly pool: LinePool;
  readonly random: () => number;
}

/**
 * Fix and optimise, a large neighbourhood search (Shaw, in: Principles and Practice of Constraint
 * Programming, Springer 1998, 417-431): some part of the best roster is freed and solved anew as a small
 * model, the rest stays. The next arm is the one that has cost least for what it has won.
 */
export class Improvement {
  readonly #tools: Improver;
  readonly #arms: Arm[] = [
    { name: 'anneal', size: 2, spent: 0, successes: 1 },
    { name: 'people', size: 800, spent: 0, successes: 0 },
    { name: 'days', size: 800, spent: 0, successes: 0 },
    { name: 'part', size: 800, spent: 0, successes: 0 },
    { name: 'line patterns', size: 500, spent: 0, successes: 0 },
    { name: 'window patterns', size: 800, spent: 0, successes: 0 },
  ];

  constructor(tools: Improver) {
    this.#tools = tools;
  }

  /** One step of the arm whose turn it is; the state takes whatever is better. */
  step(): void {
    const { state, pace } = this.#tools;
    const arm = this.#nextArm();
    const before = state.best;
    const startedAt = pace.elapsed();
    switch (arm.name) {
      case 'anneal':
        this.#anneal(arm);
        break;
      case 'line patterns':
      case 'window patterns':
        this.#layPatterns(arm, arm.name);
        break;
      default:
        this.#solvePart(arm, arm.name);
    }
    const spent = pace.elapsed() - startedAt;
    for (const other of this.#arms) {
      other.spent *= memory;
      other.successes *= memory;
    }
    arm.spent += spent;
    if (state.best !== before) arm.successes += 1;
    if (arm.name !== 'anneal') {
      if (spent > longSolve) arm.size = Math.max(50, arm.size * 0.8);
      else if (spent < shortSolve) {
        arm.size = Math.min(this.#workColumns, arm.size * (spent < shortSolve / 3 ? 1.3 : 1.1));
      }
    }
  }

  get #workColumns(): number {
    return this.#tools.ground.model.works.reduce((sum, { columns }) => sum + columns.length, 0);
  }

  #nextArm(): Arm {
    const cost = ({ spent, successes }: Arm) => (spent + 0.05) / (successes + 0.3);
    return this.#arms.reduce((best, arm) => (cost(arm) < cost(best) ? arm : best));
  }

  #anneal(arm: Arm): void {
    const { ground, state, pace, random, pool } = this.#tools;
    if (!state.best || putRoster(ground, state.best.roster).length > 0) return;
    const startedAt = pace.elapsed();
    const arcs = ground.refill.work;
    let counted = arcs;
    const { hotCents, coldCents } = temperatures(ground);
    const heat = random() < 0.5 ? 1 : 0.1 + 0.4 * random();
    anneal(ground.lines, ground.refill, {
      progress: () => {
        pace.countArcs(ground.refill.work - counted);
        counted = ground.refill.work;
        return state.isOver ? 1 : (pace.elapsed() - startedAt) / arm.size;
      },
      hotCents: hotCents * heat,
      coldCents,
      random,
      worth: state.worth,
      onBest: () => undefined,
    });
    pool.take(ground.lines);
    state.offerLines(ground);
    arm.size = Math.min(longestAnneal, arm.size * 1.3);
  }

  /**
   * A part laid anew over whole patterns: column generation, then a search tree over what it found, or a
   * dive where the part has many people.
   */
  #layPatterns(arm: Arm, name: 'line patterns' | 'window patterns'): void {
    const { ground, state, open, pace, random, pool } = this.#tools;
    if (!state.best || putRoster(ground, state.best.roster).length > 0) return;
    const isWindow = name === 'window patterns';
    const days = isWindow ? chooseDays(ground, arm.size, 'days', random) : null;
    const people = isWindow
      ? ground.space.lines.keys()
      : choosePeople(ground, arm.size, 'people', random);
    const part: Part = {
      people: [...people],
      from: days?.from ?? 0,
      to: days?.to ?? ground.space.dayCount,
    };
    const startedAt = pace.elapsed();
    const found = generateColumns(ground.lines, ground.refill, open, {
      part,
      patterns: [...linesOf(ground, part), ...(isWindow ? [] : pool.patterns(part.people))],
      mostRounds: 40,
      limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : Math.min(4, pace.remaining()),
      shouldStop: () => state.isOver || pace.elapsed() - startedAt > 4,
      onIterations: (count) => pace.countSolve(masterWork, count),
      onBound: () => undefined,
      isEnough: () => false,
    });
    if (found.value >= ground.lines.total - 0.5) return;
    if (!isWindow && part.people.length > mostPeopleOfATree) {
      dive(this.#tools, found);
      return;
    }
    searchPatterns(
      {
        ...this.#tools,
        seed: Math.floor(random() * 1e6),
        limitSeconds: Math.min(3, pace.remaining()),
        nodeLimit: mostNodes,
      },
      found,
    );
  }

  #solvePart(arm: Arm, name: 'people' | 'days' | 'part'): void {
    const { ground, state, solve, pace, random } = this.#tools;
    const best = state.best;
    if (!best) return;
    const choice: Choice = {
      people: name === 'days' ? null : choosePeople(ground, arm.size, name, random),
      days: name === 'people' ? null : chooseDays(ground, arm.size, name, random),
    };
    const part = restrictModel(ground.model.linear, best.values, freeColumns(ground.model, choice));
    const nonzeros = part.linear.indices.length;
    const outcome = solve(part.linear, blendObjective, {
      limitSeconds: pace.isCounted ? Number.POSITIVE_INFINITY : Math.min(3, pace.remaining()),
      absoluteGap: 0.9,
      nodeLimit: mostNodes,
      seed: Math.floor(random() * 1e6),
      start: Float64Array.from(part.columns, (column) => best.values[column] ?? 0),
      shouldStop: () => state.isStopRequested,
      onIterations: (iterations) => pace.countSolve(nonzeros, iterations),
    });
    if (!('solution' in outcome) || !outcome.solution) return;
    const values = best.values.slice();
    const found = outcome.solution.values;
    part.columns.forEach((column, place) => {
      values[column] = found[place] ?? 0;
    });
    state.offer(values);
  }
}
