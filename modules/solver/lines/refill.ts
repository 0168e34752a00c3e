import { firstEnd, type PersonLines, startNode } from '../../model';
import { KindMultipliers } from './kind-multipliers';
import { dayOff, type RosterLines } from './roster-lines';

/** What a shift is worth to the rows while a window is refilled. */
export interface Pricing {
  /** Price of the column's cover; the column's own cost is added to it. */
  readonly coverPrice: (column: number) => number;
  /** Random extra cost of a choice, 0 or more. */
  readonly noise: () => number;
  /** Price of an end by its counts instead of what it adds to the spreads given everybody else. */
  readonly endPrice?: (person: number, end: number) => number;
}

/** A whole line and its cost by the prices it was found with. */
export interface PricedLine {
  readonly cells: Int32Array;
  readonly end: number;
  readonly price: number;
}

/** Costs of an end node, its own included, and a lower bound of them. */
interface EndPrices {
  readonly of: (end: number) => number;
  readonly least: number;
}

/** Cents below which two prices are the same. */
const tolerance = 1e-6;
/** Tries with a dearer kind before a line over a limit that the net does not count is given up. */
const limitTries = 8;

/**
 * Finds the cheapest way to fill some days of one person's line, the other days kept: a shortest path
 * through the net from the node before the window to each node after it from which the kept days lead to
 * a lawful end. One instance holds the memory for all nets of a search.
 */
export class Refill {
  readonly #roster: RosterLines;
  readonly #distance: Float64Array;
  readonly #from: Int32Array;
  readonly #group: Int16Array;
  /** The refill in which a node was last reached. */
  readonly #stamp: Int32Array;
  #round = 0;
  /** Arcs looked at so far: a measure of work that a repetition repeats. */
  work = 0;
  #frontier: Int32Array;
  #following: Int32Array;
  #costs = new Float64Array(0);
  #columns = new Int32Array(0);
  #suffix = new Int16Array(0);
  /** By day of the window: the least that the days from it on can cost. */
  #toCome = new Float64Array(0);
  /** By person: the cheapest end. */
  readonly #leastEnds: Float64Array;

  constructor(roster: RosterLines) {
    this.#roster = roster;
    const sizes = roster.space.lines.map(({ net }) => net.layers[net.dayCount + 1] ?? 0);
    const size = Math.max(1, ...sizes);
    this.#leastEnds = Float64Array.from(roster.space.ends, (ends) =>
      ends.reduce((least, cost) => Math.min(least, cost), Number.POSITIVE_INFINITY),
    );
    this.#distance = new Float64Array(size);
    this.#from = new Int32Array(size);
    this.#group = new Int16Array(size);
    this.#stamp = new Int32Array(size);
    this.#frontier = new Int32Array(size);
    this.#following = new Int32Array(size);
  }

  /**
   * Writes the cheapest lawful choice for days [from, to) into the cells and nodes of a person who is
   * taken out; false when there is none (the cells are then unchanged).
   */
  fill(person: number, from: number, to: number, pricing: Pricing): boolean {
    const lines = this.#roster.space.lines[person];
    if (!lines) return false;
    this.#priceOptions(lines, from, to, pricing);
    this.#readSuffix(lines, person, to);
    const multipliers = new KindMultipliers(lines, this.#keptCounts(lines, person, from, to));
    for (let attempt = 0; attempt <= limitTries; attempt += 1) {
      const last = this.#findCheapest(lines, person, from, to, pricing);
      if (last < 0) return false;
      if (this.#findOverLimit(lines, person, from, to, last) < 0) {
        this.#write(lines, person, from, to, last);
        return true;
      }
      const counts = this.#pathCounts(lines, last, from, to);
      const change = multipliers.next(counts, this.#scale(lines, from, to));
      if (!change) return false;
      this.#addToGroup(lines, from, to, change.group, change.extra);
    }
    return false;
  }

  /**
   * The cheapest lines by some prices with the days outside [from, to) kept, at most one for each node
   * after the window and at most `count` for each try. `least` is a lower bound for all of them: exact, or
   * where a limit is not counted by the net, by a multiplier on the kind (Lagrangian relaxation).
   */
  cheapestLines(
    person: number,
    pricing: Pricing,
    count: number,
    { from, to } = { from: 0, to: this.#roster.days },
  ): { readonly least: number; readonly lines: PricedLine[] } {
    const own = this.#roster.space.lines[person];
    if (!own) return { least: 0, lines: [] };
    this.#priceOptions(own, from, to, pricing);
    this.#readSuffix(own, person, to);
    if (from === 0) this.#roster.nodes[person * (this.#roster.days + 1)] = startNode;
    const priced = this.#endPrices(own, person, pricing);
    const multipliers = new KindMultipliers(own, this.#keptCounts(own, person, from, to));
    const lines: PricedLine[] = [];
    let least = Number.NEGATIVE_INFINITY;
    for (let attempt = 0; attempt <= limitTries; attempt += 1) {
      const found = this.#rankEnds(own, person, from, to, priced);
      const best = found[0];
      if (!best) return { least: Number.POSITIVE_INFINITY, lines: [] };
      least = Math.max(least, best.price - multipliers.constant);
      for (const { node, end, price } of found.slice(0, count)) {
        if (this.#findOverLimit(own, person, from, to, node) >= 0) continue;
        const cells = this.#cellsTo(own, person, from, to, node);
        lines.push({
          end,
          cells,
          price: price - multipliers.priceOf(this.#pathCounts(own, node, from, to)),
        });
      }
      const change = multipliers.next(
        this.#pathCounts(own, best.node, from, to),
        this.#scale(own, from, to),
      );
      if (!change) break;
      this.#addToGroup(own, from, to, change.group, change.extra);
    }
    return { least, lines };
  }

  #rankEnds(
    own: PersonLines,
    person: number,
    from: number,
    to: number,
    priced: EndPrices | null,
  ): { node: number; end: number; price: number }[] {
    const reached = this.#push(own, person, from, to, Number.POSITIVE_INFINITY);
    const ends = this.#roster.space.ends[person] as Float64Array;
    return Array.from(this.#frontier.subarray(0, reached))
      .flatMap((node) => {
        const last = this.#follow(own, node, to);
        if (last < 0) return [];
        const end = last - firstEnd(own.net);
        const price =
          (this.#distance[node] as number) + (priced ? priced.of(end) : (ends[end] as number));
        return [{ node, end, price }];
      })
      .sort((one, other) => one.price - other.price);
  }

  /** How often each kind of a side limit is worked on the kept days. */
  #keptCounts({ sideLimits }: PersonLines, person: number, from: number, to: number): number[] {
    const { cells, days, space } = this.#roster;
    return sideLimits.map(({ group }) => {
      let count = 0;
      for (let day = 0; day < days; day += 1) {
        const column = cells[person * days + day] as number;
        const isKept = day < from || day >= to;
        if (isKept && column >= 0 && space.columns.group[column] === group) count += 1;
      }
      return count;
    });
  }

  /** The same on the path to a node. */
  #pathCounts({ sideLimits }: PersonLines, last: number, from: number, to: number): number[] {
    return sideLimits.map(({ group }) => {
      let count = 0;
      for (let node = last, day = to; day > from; day -= 1, node = this.#from[node] as number) {
        if (this.#group[node] === group) count += 1;
      }
      return count;
    });
  }

  #scale({ net }: PersonLines, from: number, to: number): number {
    let scale = 1;
    for (let at = 0; at < (to - from) * net.groupCount; at += 1) {
      const cost = Math.abs(this.#costs[at] as number);
      if (cost < Number.POSITIVE_INFINITY && cost > scale) scale = cost;
    }
    return scale;
  }

  #addToGroup({ net }: PersonLines, from: number, to: number, group: number, extra: number): void {
    for (let day = from; day < to; day += 1) {
      const at = (day - from) * net.groupCount + group;
      this.#costs[at] = (this.#costs[at] as number) + extra;
    }
  }

  /** The end that the kept days after a window lead to, or -1. */
  #follow({ net }: PersonLines, node: number, to: number): number {
    let end = node;
    for (let day = to; day < net.dayCount && end >= 0; day += 1) {
      end = net.next[end * net.groupCount + (this.#suffix[day] as number)] as number;
    }
    return end;
  }

  #cellsTo(
    { net }: PersonLines,
    person: number,
    from: number,
    to: number,
    last: number,
  ): Int32Array {
    const { days, cells: kept } = this.#roster;
    const cells = kept.slice(person * days, (person + 1) * days);
    for (let node = last, day = to - 1; day >= from; day -= 1) {
      const group = this.#group[node] as number;
      const at = (day - from) * net.groupCount + group;
      cells[day] = group === 0 ? dayOff : (this.#columns[at] as number);
      node = this.#from[node] as number;
    }
    return cells;
  }

  #priceOptions(
    lines: PersonLines,
    from: number,
    to: number,
    { coverPrice, noise }: Pricing,
  ): void {
    const { groupCount } = lines.net;
    const size = (to - from) * groupCount;
    if (this.#costs.length < size) {
      this.#costs = new Float64Array(size);
      this.#columns = new Int32Array(size);
    }
    const own = this.#roster.space.columns.cost;
    for (let at = 0; at < size; at += 1) {
      const options = lines.options[from * groupCount + at] ?? [];
      let least = Number.POSITIVE_INFINITY;
      let chosen = dayOff;
      for (const { column } of options) {
        const cost = (own[column] as number) + coverPrice(column);
        if (cost < least) {
          least = cost;
          chosen = column;
        }
      }
      this.#costs[at] = least + noise();
      this.#columns[at] = chosen;
    }
    for (let day = from; day < to; day += 1) {
      const isFree = lines.mayBeFree[day] === 1;
      this.#costs[(day - from) * groupCount] = isFree ? noise() : Number.POSITIVE_INFINITY;
    }
  }

  #readSuffix(lines: PersonLines, person: number, to: number): void {
    const { days, cells, space } = this.#roster;
    if (this.#suffix.length < days) this.#suffix = new Int16Array(days);
    for (let day = to; day < lines.net.dayCount; day += 1) {
      const column = cells[person * days + day] as number;
      this.#suffix[day] = column < 0 ? 0 : (space.columns.group[column] as number);
    }
  }

  /** The node after the window on the cheapest lawful path, or -1. */
  #findCheapest(
    lines: PersonLines,
    person: number,
    from: number,
    to: number,
    pricing: Pricing,
  ): number {
    const { net } = lines;
    const ends = this.#roster.space.ends[person] as Float64Array;
    const spread = this.#endPrices(lines, person, pricing);
    const leastEnd = spread ? spread.least : (this.#leastEnds[person] as number);
    let least = this.#priceOld(lines, person, from, to, spread);
    const count = this.#push(lines, person, from, to, least - leastEnd);
    let chosen = -1;
    for (let index = 0; index < count; index += 1) {
      const node = this.#frontier[index] as number;
      const reached = this.#distance[node] as number;
      if (reached + leastEnd > least + tolerance || (chosen >= 0 && reached + leastEnd >= least)) {
        continue;
      }
      const end = this.#follow(lines, node, to);
      if (end < 0) continue;
      const position = end - firstEnd(net);
      const cost = reached + (spread ? spread.of(position) : (ends[position] as number));
      if (cost < least || (chosen < 0 && cost <= least + tolerance)) {
        least = cost;
        chosen = node;
      }
    }
    return chosen;
  }

  /** What the days of the window in the cells would cost; no path dearer than that is of use. */
  #priceOld(
    { net }: PersonLines,
    person: number,
    from: number,
    to: number,
    spread: EndPrices | null,
  ): number {
    const { cells, days, space, nodes } = this.#roster;
    if ((nodes[person * (days + 1) + days] as number) < 0) return Number.POSITIVE_INFINITY;
    let cost = 0;
    for (let day = from; day < to; day += 1) {
      const column = cells[person * days + day] as number;
      const group = column < 0 ? 0 : (space.columns.group[column] as number);
      cost += this.#costs[(day - from) * net.groupCount + group] as number;
    }
    const end = this.#roster.endOf(person);
    return cost + (spread ? spread.of(end) : (space.ends[person]?.[end] as number));
  }

  /**
   * Pushes distances layer by layer from the node before the window; the last layer is the frontier.
   * Nodes from which even the cheapest days to come would cost more than `most` are left out.
   */
  #push({ net }: PersonLines, person: number, from: number, to: number, most: number): number {
    const { next, groupCount } = net;
    this.#sumToCome(net.groupCount, from, to);
    this.#round += 1;
    const round = this.#round;
    const start = this.#roster.nodes[person * (this.#roster.days + 1) + from] as number;
    this.#frontier[0] = start;
    this.#distance[start] = 0;
    let count = 1;
    for (let day = from; day < to; day += 1) {
      let reached = 0;
      this.work += count * groupCount;
      const base = (day - from) * groupCount;
      const limit = most - (this.#toCome[day - from + 1] as number) + tolerance;
      for (let index = 0; index < count; index += 1) {
        const node = this.#frontier[index] as number;
        const distance = this.#distance[node] as number;
        const arcs = node * groupCount;
        for (let group = 0; group < groupCount; group += 1) {
          const target = next[arcs + group] as number;
          if (target < 0) continue;
          const cost = distance + (this.#costs[base + group] as number);
          if (cost > limit) continue;
          if (this.#stamp[target] === round) {
            if (cost >= (this.#distance[target] as number)) continue;
          } else {
            if (cost === Number.POSITIVE_INFINITY) continue;
            this.#stamp[target] = round;
            this.#following[reached] = target;
            reached += 1;
          }
          this.#distance[target] = cost;
          this.#from[target] = node;
          this.#group[target] = group;
        }
      }
      [this.#frontier, this.#following] = [this.#following, this.#frontier];
      count = reached;
    }
    return count;
  }

  #sumToCome(groupCount: number, from: number, to: number): void {
    if (this.#toCome.length <= to - from) this.#toCome = new Float64Array(to - from + 1);
    this.#toCome[to - from] = 0;
    for (let day = to - from - 1; day >= 0; day -= 1) {
      let least = Number.POSITIVE_INFINITY;
      for (let at = day * groupCount; at < (day + 1) * groupCount; at += 1) {
        least = Math.min(least, this.#costs[at] as number);
      }
      this.#toCome[day] = (this.#toCome[day + 1] as number) + least;
    }
  }

  /** What an end costs by the given prices, or adds to the spreads given everybody else; null: neither. */
  #endPrices(lines: PersonLines, person: number, { endPrice }: Pricing): EndPrices | null {
    const own = this.#roster.space.ends[person] as Float64Array;
    if (endPrice) {
      return {
        of: (end) => (own[end] as number) + endPrice(person, end),
        least: Number.NEGATIVE_INFINITY,
      };
    }
    const terms = this.#roster.space.spreads
      .filter(({ takesPart }) => takesPart[person] === 1)
      .flatMap((term) => {
        const range = this.#roster.rangeWithout(term, person);
        return range
          ? [{ ...range, price: term.priceCents, counts: lines.net.ends[term.measure] }]
          : [];
      });
    if (terms.length === 0) return null;
    const base = terms.reduce((sum, { price, most, least }) => sum + price * (most - least), 0);
    return {
      least: (this.#leastEnds[person] as number) + base,
      of: (end) => {
        let sum = own[end] as number;
        for (const { most, least, price, counts } of terms) {
          const count = counts[end] as number;
          sum += price * (Math.max(most, count) - Math.min(least, count));
        }
        return sum;
      },
    };
  }

  /** Position of a side limit that the path would break, or -1. */
  #findOverLimit(
    lines: PersonLines,
    person: number,
    from: number,
    to: number,
    last: number,
  ): number {
    if (lines.sideLimits.length === 0) return -1;
    const kept = this.#keptCounts(lines, person, from, to);
    const path = this.#pathCounts(lines, last, from, to);
    return lines.sideLimits.findIndex(
      ({ most }, index) => (kept[index] ?? 0) + (path[index] ?? 0) > most,
    );
  }

  #write(lines: PersonLines, person: number, from: number, to: number, last: number): void {
    const { cells, days } = this.#roster;
    const { groupCount } = lines.net;
    for (let node = last, day = to - 1; day >= from; day -= 1, node = this.#from[node] as number) {
      const group = this.#group[node] as number;
      cells[person * days + day] =
        group === 0 ? dayOff : (this.#columns[(day - from) * groupCount + group] as number);
    }
    this.#roster.trace(person, from);
  }
}
