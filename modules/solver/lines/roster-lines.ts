import { firstEnd, startNode } from '../../model';
import type { SearchSpace, SpreadTerm } from './search-space';

// Indexes are in range by construction here; `as number` says so where a check would cost a hot loop.

/** A day without a shift in `cells`. */
export const dayOff = -1;

/**
 * A roster as lines: for each person and day the work column or a day off, the nodes of the nets the lines
 * run through, and the values of the rows that join people, kept up to date from change to change. A
 * person may be taken out for a while; their line then counts nowhere.
 */
export class RosterLines {
  readonly space: SearchSpace;
  readonly people: number;
  readonly days: number;
  /** By person x days + day. */
  readonly cells: Int32Array;
  /** By person x (days + 1) + day: the node before that day. */
  readonly nodes: Int32Array;
  /** By row: its value. */
  readonly values: Int32Array;
  /** By row: change of its cost by one more. */
  readonly gains: Float64Array;
  /** By person: 1 while their line counts. */
  readonly isIn: Uint8Array;
  /** Cost of all rows, and of the shifts and ends of the lines that are in; without spreads. */
  cost = 0;

  constructor(space: SearchSpace) {
    this.space = space;
    this.people = space.lines.length;
    this.days = space.dayCount;
    this.cells = new Int32Array(this.people * this.days).fill(dayOff);
    this.nodes = new Int32Array(this.people * (this.days + 1)).fill(-1);
    this.values = new Int32Array(space.rows.count);
    this.gains = new Float64Array(space.rows.count);
    this.isIn = new Uint8Array(this.people);
    this.recount();
  }

  /** Cost with spreads. */
  get total(): number {
    return this.cost + this.spreadCost;
  }

  get spreadCost(): number {
    return this.space.spreads.reduce((sum, term) => sum + this.#spread(term), 0);
  }

  /** Change of the rows' cost if the column were worked as well. */
  marginal(column: number): number {
    const { starts, rows, coefficients } = this.space.columns;
    const end = starts[column + 1] as number;
    let sum = 0;
    for (let at = starts[column] as number; at < end; at += 1) {
      const row = rows[at] as number;
      const coefficient = coefficients[at] as number;
      if (coefficient === 1) sum += this.gains[row] as number;
      else {
        const value = this.values[row] as number;
        sum += this.rowCost(row, value + coefficient) - this.rowCost(row, value);
      }
    }
    return sum;
  }

  /** Puts a person's line in (+1) or takes it out (-1) over some days; the end is counted by `countEnd`. */
  countDays(person: number, from: number, to: number, sign: 1 | -1): void {
    for (let cell = person * this.days + from; cell < person * this.days + to; cell += 1) {
      const column = this.cells[cell] as number;
      if (column >= 0) this.#count(column, sign);
    }
  }

  /** Counts the end of a person's line, or takes it out. */
  countEnd(person: number, sign: 1 | -1): void {
    this.isIn[person] = sign === 1 ? 1 : 0;
    this.cost += sign * (this.space.ends[person]?.[this.endOf(person)] ?? 0);
  }

  /** The end node of a person's line as a position among the ends of the net. */
  endOf(person: number): number {
    const lines = this.space.lines[person];
    const node = this.nodes[person * (this.days + 1) + this.days] as number;
    return lines ? node - firstEnd(lines.net) : -1;
  }

  /** Runs a person's cells through their net from a day on; false where a rule forbids the line. */
  trace(person: number, fromDay = 0): boolean {
    const lines = this.space.lines[person];
    if (!lines) return false;
    const { next, groupCount } = lines.net;
    const base = person * (this.days + 1);
    if (fromDay === 0) this.nodes[base] = startNode;
    for (let day = fromDay; day < this.days; day += 1) {
      const column = this.cells[person * this.days + day] as number;
      const group = column < 0 ? 0 : (this.space.columns.group[column] as number);
      if (group < 0 || (column < 0 && lines.mayBeFree[day] === 0)) return false;
      const target = next[(this.nodes[base + day] as number) * groupCount + group];
      if (target === undefined || target < 0) return false;
      this.nodes[base + day + 1] = target;
    }
    return true;
  }

  /** Reckons values, gains and cost anew from the cells of everybody who is in. */
  recount(): void {
    this.values.fill(0);
    this.cost = 0;
    for (let row = 0; row < this.space.rows.count; row += 1) {
      this.cost += this.rowCost(row, 0);
      this.#renewGain(row);
    }
    for (let person = 0; person < this.people; person += 1) {
      if (this.isIn[person] === 0) continue;
      this.countDays(person, 0, this.days, 1);
      this.countEnd(person, 1);
    }
  }

  /** Cost of a row at a value. */
  rowCost(row: number, value: number): number {
    const { table, offsets, least } = this.space.rows;
    return table[(offsets[row] as number) + value - (least[row] as number)] as number;
  }

  /**
   * Most and least of a spread's count over everybody in who takes part but one person; null when there
   * is nobody.
   */
  rangeWithout(term: SpreadTerm, without: number): { most: number; least: number } | null {
    return this.#range(term, (person) => person === without);
  }

  /** The same over everybody in but some people. */
  rangeOutside(
    term: SpreadTerm,
    without: ReadonlySet<number>,
  ): { most: number; least: number } | null {
    return this.#range(term, (person) => without.has(person));
  }

  #range(
    term: SpreadTerm,
    isLeftOut: (person: number) => boolean,
  ): { most: number; least: number } | null {
    let [most, least] = [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY];
    for (let person = 0; person < this.people; person += 1) {
      if (isLeftOut(person) || !this.isIn[person] || !term.takesPart[person]) continue;
      const count = this.space.lines[person]?.net.ends[term.measure][this.endOf(person)] as number;
      if (count > most) most = count;
      if (count < least) least = count;
    }
    return most < least ? null : { most, least };
  }

  #spread(term: SpreadTerm): number {
    const range = this.rangeWithout(term, -1);
    return range ? term.priceCents * (range.most - range.least) : 0;
  }

  #count(column: number, sign: 1 | -1): void {
    const { starts, rows, coefficients, cost } = this.space.columns;
    const end = starts[column + 1] as number;
    this.cost += sign * (cost[column] as number);
    for (let at = starts[column] as number; at < end; at += 1) {
      const row = rows[at] as number;
      const before = this.values[row] as number;
      const after = before + sign * (coefficients[at] as number);
      this.values[row] = after;
      this.cost += this.rowCost(row, after) - this.rowCost(row, before);
      this.#renewGain(row);
    }
  }

  #renewGain(row: number): void {
    const value = this.values[row] as number;
    this.gains[row] = this.rowCost(row, value + 1) - this.rowCost(row, value);
  }
}
