import { startNode } from '../../model';
import type { Pricing, Refill } from './refill';
import { dayOff, type RosterLines } from './roster-lines';

/** How an annealing goes. */
export interface AnnealPlan {
  /** How far it is, from 0 to 1, where it ends. */
  readonly progress: () => number;
  /** Cents: a worsening of this size is accepted once in e times; falls evenly on a log scale. */
  readonly hotCents: number;
  readonly coldCents: number;
  readonly random: () => number;
  /** By row of the space: what one unit more is worth in the linear relaxation; guides insertion. */
  readonly worth: Float64Array | null;
  /** Called whenever a roster is better than all before it. */
  readonly onBest: () => void;
}

export interface AnnealReport {
  readonly moves: number;
  readonly accepted: number;
  readonly best: number;
}

const mostPeople = 4;
/** Moves at one temperature, before it is asked how far the annealing is. */
const movesABatch = 64;
/** Days of the longest window but for whole lines. */
const longestWindow = 20;
/** Share of the work that lays whole lines anew. */
const wholeLineShare = 0.15;

/**
 * Ruin and recreate (Schrimpf, Schneider, Stamm-Wilbrandt and Dueck, J. Computational Physics 159, 2000,
 * 139-171): takes some days of a few people out and lays them anew, one person after the other at the
 * least cost given all others; worse rosters are accepted by simulated annealing (Kirkpatrick, Gelatt and
 * Vecchi, Science 220, 1983, 671-680). Ends with the best roster found in `roster`.
 */
export function anneal(roster: RosterLines, refill: Refill, plan: AnnealPlan): AnnealReport {
  const search = new Annealing(roster, refill, plan);
  return search.run();
}

/**
 * Lays the whole line of everybody who is out, one after the other; answers those for whom no lawful line
 * was found, by position.
 */
export function layAll(
  roster: RosterLines,
  refill: Refill,
  plan: Pick<AnnealPlan, 'random' | 'worth'>,
): number[] {
  const out = shuffled(roster.people, plan.random).filter((person) => roster.isIn[person] === 0);
  return out.filter((person, position) => {
    roster.nodes.fill(-1, person * (roster.days + 1), (person + 1) * (roster.days + 1));
    roster.nodes[person * (roster.days + 1)] = startNode;
    roster.cells.fill(dayOff, person * roster.days, (person + 1) * roster.days);
    const share = plan.worth ? plan.random() * (1 - position / out.length) : 0;
    if (!refill.fill(person, 0, roster.days, pricingOf(roster, plan, share, 0))) return true;
    roster.countDays(person, 0, roster.days, 1);
    roster.countEnd(person, 1);
    return false;
  });
}

class Annealing {
  readonly #roster: RosterLines;
  readonly #refill: Refill;
  readonly #plan: AnnealPlan;
  readonly #savedCells: Int32Array;
  readonly #savedNodes: Int32Array;
  readonly #bestCells: Int32Array;
  #best: number;
  #current: number;
  #accepted = 0;
  #wholeWork = 0;

  constructor(roster: RosterLines, refill: Refill, plan: AnnealPlan) {
    this.#roster = roster;
    this.#refill = refill;
    this.#plan = plan;
    this.#savedCells = new Int32Array(mostPeople * roster.days);
    this.#savedNodes = new Int32Array(mostPeople * (roster.days + 1));
    this.#bestCells = roster.cells.slice();
    this.#current = roster.total;
    this.#best = this.#current;
  }

  run(): AnnealReport {
    let moves = 0;
    for (let done = this.#plan.progress(); done < 1; done = this.#plan.progress()) {
      const temperature = this.#temperature(done);
      for (let batch = 0; batch < movesABatch; batch += 1) this.#move(temperature);
      moves += movesABatch;
    }
    this.#restoreBest();
    return { moves, accepted: this.#accepted, best: this.#best };
  }

  #temperature(progress: number): number {
    const { hotCents, coldCents } = this.#plan;
    return hotCents * (coldCents / hotCents) ** progress;
  }

  #move(temperature: number): void {
    const { random } = this.#plan;
    const { days } = this.#roster;
    const people = this.#choosePeople();
    const isWhole = this.#wholeWork <= wholeLineShare * this.#refill.work;
    const workBefore = this.#refill.work;
    const length = isWhole
      ? days
      : Math.min(days, 2 + Math.floor(random() * random() * longestWindow));
    const from = Math.floor(random() * (days - length + 1));
    const costBefore = this.#roster.cost;
    for (const [position, person] of people.entries()) {
      this.#takeOut(person, position, from, from + length);
    }
    const laid = this.#layAnew(people, from, from + length, temperature);
    if (isWhole) this.#wholeWork += this.#refill.work - workBefore;
    const total = laid ? this.#roster.total : Number.POSITIVE_INFINITY;
    const worse = total - this.#current;
    if (worse <= 0 || random() < Math.exp(-worse / temperature)) {
      this.#current = total;
      this.#accepted += 1;
      if (total < this.#best - 1e-6) this.#keepBest();
    } else {
      for (const [position, person] of people.entries()) {
        this.#putBack(person, position, from, from + length);
      }
      this.#roster.cost = costBefore;
    }
  }

  #choosePeople(): number[] {
    const { random } = this.#plan;
    const count = Math.min(this.#roster.people, 1 + Math.floor(random() * mostPeople));
    const chosen: number[] = [];
    while (chosen.length < count) {
      const person = Math.floor(random() * this.#roster.people);
      if (!chosen.includes(person)) chosen.push(person);
    }
    return chosen;
  }

  #takeOut(person: number, position: number, from: number, to: number): void {
    const { days, cells, nodes } = this.#roster;
    const own = cells.subarray(person * days, (person + 1) * days);
    this.#savedCells.set(own, position * days);
    const line = nodes.subarray(person * (days + 1), (person + 1) * (days + 1));
    this.#savedNodes.set(line, position * (days + 1));
    this.#roster.countDays(person, from, to, -1);
    this.#roster.countEnd(person, -1);
  }

  /** Lays the window of each person, the last at the true price, those before with a view to the rest. */
  #layAnew(people: readonly number[], from: number, to: number, temperature: number): boolean {
    return people.every((person, position) => {
      const rest = people.length - 1 - position;
      const share = this.#plan.worth && rest > 0 ? this.#plan.random() : 0;
      const noise = this.#plan.random() < 0.5 ? temperature : 0;
      const pricing = pricingOf(this.#roster, this.#plan, share, noise);
      if (!this.#refill.fill(person, from, to, pricing)) return false;
      this.#roster.countDays(person, from, to, 1);
      this.#roster.countEnd(person, 1);
      return true;
    });
  }

  #putBack(person: number, position: number, from: number, to: number): void {
    const { days, cells, nodes, isIn } = this.#roster;
    if (isIn[person] === 1) {
      this.#roster.countDays(person, from, to, -1);
      this.#roster.countEnd(person, -1);
    }
    cells.set(this.#savedCells.subarray(position * days, (position + 1) * days), person * days);
    const line = this.#savedNodes.subarray(position * (days + 1), (position + 1) * (days + 1));
    nodes.set(line, person * (days + 1));
    this.#roster.countDays(person, from, to, 1);
    this.#roster.countEnd(person, 1);
  }

  #keepBest(): void {
    this.#best = this.#current;
    this.#bestCells.set(this.#roster.cells);
    this.#plan.onBest();
  }

  #restoreBest(): void {
    this.#roster.cells.set(this.#bestCells);
    for (let person = 0; person < this.#roster.people; person += 1) this.#roster.trace(person);
    this.#roster.recount();
  }
}

/** Cover priced by its marginal cost, mixed with its worth in the relaxation; noise in cents. */
function pricingOf(
  roster: RosterLines,
  { worth, random }: Pick<AnnealPlan, 'random' | 'worth'>,
  worthShare: number,
  noiseCents: number,
): Pricing {
  const noise = noiseCents > 0 ? () => random() * noiseCents : () => 0;
  if (!worth || worthShare === 0) {
    return { coverPrice: (column) => roster.marginal(column), noise };
  }
  const { starts, rows, coefficients } = roster.space.columns;
  const worthOf = (column: number): number => {
    let sum = 0;
    for (let at = starts[column] as number; at < (starts[column + 1] as number); at += 1) {
      sum += (coefficients[at] as number) * (worth[rows[at] as number] as number);
    }
    return sum;
  };
  return {
    coverPrice: (column) =>
      (1 - worthShare) * roster.marginal(column) - worthShare * worthOf(column),
    noise,
  };
}

function shuffled(count: number, random: () => number): number[] {
  const order = Array.from({ length: count }, (_, index) => index);
  for (let last = count - 1; last > 0; last -= 1) {
    const other = Math.floor(random() * (last + 1));
    const moved = order[last] ?? 0;
    order[last] = order[other] ?? 0;
    order[other] = moved;
  }
  return order;
}
