import { addWholeColumns, type Entry, type LinearModel, ModelBuilder } from '../../model';
import type { LinearSession } from '../linear-session';
import { costOf } from './line-cost';
import { fixedValues, type Part, touchedRows } from './part';
import { dayOff, type RosterLines } from './roster-lines';
import type { SearchSpace } from './search-space';

/** One person's days of a part as a column of the master: the work column or a day off, by day. */
export interface Pattern {
  readonly person: number;
  /** The whole line; days outside the part are those of the roster. */
  readonly cells: Int32Array;
  /** Cost of its shifts and its end, in cents. */
  readonly cost: number;
  readonly end: number;
}

/** Opens a linear program; see `LinearSession`. */
export type OpenSession = (model: LinearModel, objectiveName: string) => LinearSession;

/** Prices of the rows of the master, in the terms of the space. */
export interface MasterPrices {
  /** By row of the space: what one unit more is worth. */
  readonly rows: Float64Array;
  /** By person: what having a line at all is worth. */
  readonly people: Float64Array;
  /** By spread x people + person: share of the price of most, and of least. */
  readonly most: Float64Array;
  readonly least: Float64Array;
}

/**
 * The master over whole patterns (Dantzig and Wolfe, Operations Research 8, 1960, 101-111): each person of
 * the part has one pattern, the rows that join people are those of the compact model with their elastic
 * columns, less what the rest of the roster gives them.
 *   min  sum cost x pattern + elastic columns + spreads
 *   s.t. row:          sum of coefficients x pattern + elastic in [lower, upper] - rest
 *        person(p):    sum of the person's patterns = 1
 *        most(s, p):   sum count x pattern - most(s) <= 0;  least(s, p): sum count x pattern - least(s) >= 0
 */
export class PatternMaster {
  readonly linear: LinearModel;
  readonly #space: SearchSpace;
  readonly #part: Part;
  /** Row of the master by row of the space, or -1. */
  readonly #rowOf: Int32Array;
  /** By row of the space: what one unit more is worth where the rest of the roster stands. */
  readonly #restPrices: Float64Array;
  /** By person, or -1. */
  readonly #personRow: Int32Array;
  /** By spread x people + person: its row of most; the one of least follows. -1 where there is none. */
  readonly #spreadRow: Int32Array;

  /** The rest of the roster is read from `roster`; for a part of everybody and all days there is none. */
  constructor(roster: RosterLines, part: Part) {
    const { space } = roster;
    this.#space = space;
    this.#part = part;
    const builder = new ModelBuilder('Patterns', { cost: 'minimise' });
    this.#rowOf = addCouplingRows(builder, roster, part);
    this.#restPrices = roster.gains.map((gain) => -gain);
    this.#personRow = new Int32Array(space.lines.length).fill(-1);
    for (const person of part.people) {
      const row = builder.addRow({ name: `person(p${person})`, lower: 1, upper: 1, entries: [] });
      this.#personRow[person] = row;
    }
    this.#spreadRow = addSpreadRows(builder, roster, part);
    this.linear = builder.build();
  }

  /** Adds patterns as columns of a session over `linear`. */
  add(session: LinearSession, patterns: readonly Pattern[]): void {
    const rows: number[] = [];
    const values: number[] = [];
    const starts = [0];
    for (const pattern of patterns) {
      for (const [row, value] of this.#entriesOf(pattern)) {
        if (value === 0) continue;
        rows.push(row);
        values.push(value);
      }
      starts.push(rows.length);
    }
    session.addColumns({
      costs: patterns.map(({ cost }) => cost),
      lower: patterns.map(() => 0),
      upper: patterns.map(() => Number.POSITIVE_INFINITY),
      starts,
      rows,
      values,
    });
  }

  /** The master with whole patterns as one linear model; patterns come after the other columns. */
  withPatterns(patterns: readonly Pattern[]): LinearModel {
    return addWholeColumns(
      this.linear,
      patterns.map((pattern) => ({ cost: pattern.cost, entries: this.#entriesOf(pattern) })),
    );
  }

  /** Cost of a pattern less what it earns by some prices of this master. */
  reducedCost(pattern: Pattern, rowDuals: Float64Array): number {
    let reduced = pattern.cost;
    for (const [row, value] of this.#entriesOf(pattern)) reduced -= value * (rowDuals[row] ?? 0);
    return reduced;
  }

  /** What the part of a roster costs in this master: its lines, the rows it touches and the spreads. */
  valueOf(roster: RosterLines): number {
    let sum = 0;
    for (const person of this.#part.people) {
      const cells = roster.cells.subarray(person * roster.days, (person + 1) * roster.days);
      sum += costOf(this.#space, person, cells, roster.endOf(person));
    }
    this.#rowOf.forEach((row, position) => {
      if (row >= 0) sum += roster.rowCost(position, roster.values[position] ?? 0);
    });
    return sum + roster.spreadCost;
  }

  /**
   * Reads the duals of the rows as prices. Rows that the part cannot change have the price at which they
   * stand: without one, a bound would let people cover what nobody can.
   */
  readPrices(rowDuals: Float64Array): MasterPrices {
    const people = this.#space.lines.length;
    const read = (row: number) => (row < 0 ? 0 : (rowDuals[row] ?? 0));
    const spreads = this.#spreadRow.length;
    const most = new Float64Array(spreads);
    const least = new Float64Array(spreads);
    this.#spreadRow.forEach((row, at) => {
      most[at] = Math.max(0, -read(row));
      least[at] = row < 0 ? 0 : Math.max(0, read(row + 1));
    });
    return {
      rows: Float64Array.from(this.#rowOf, (row, position) =>
        row < 0 ? (this.#restPrices[position] ?? 0) : read(row),
      ),
      people: Float64Array.from({ length: people }, (_, person) =>
        read(this.#personRow[person] ?? -1),
      ),
      most,
      least,
    };
  }

  /** Entries of a pattern's column, by row of the master. */
  #entriesOf({ person, cells, end }: Pattern): Map<number, number> {
    const entries = new Map<number, number>();
    const { starts, rows, coefficients } = this.#space.columns;
    for (let day = this.#part.from; day < this.#part.to; day += 1) {
      const column = cells[day] ?? dayOff;
      if (column === dayOff) continue;
      for (let at = starts[column] ?? 0; at < (starts[column + 1] ?? 0); at += 1) {
        const row = this.#rowOf[rows[at] ?? 0] ?? -1;
        entries.set(row, (entries.get(row) ?? 0) + (coefficients[at] ?? 0));
      }
    }
    entries.set(this.#personRow[person] ?? -1, 1);
    const people = this.#space.lines.length;
    this.#space.spreads.forEach((term, index) => {
      const row = this.#spreadRow[index * people + person] ?? -1;
      const count = this.#space.lines[person]?.net.ends[term.measure][end] ?? 0;
      if (row < 0 || count === 0) return;
      entries.set(row, count);
      entries.set(row + 1, count);
    });
    return entries;
  }
}

/** The rows that the part can change, with the elastic columns they have in the compact model. */
function addCouplingRows(builder: ModelBuilder, roster: RosterLines, part: Part): Int32Array {
  const { model, rows, columns } = roster.space;
  const { linear } = model;
  const rest = fixedValues(roster, part);
  const rowOf = new Int32Array(rows.count).fill(-1);
  for (const position of touchedRows(roster.space, part)) {
    const row = rows.modelRows[position] ?? 0;
    const entries: Entry[] = [];
    for (let at = linear.starts[row] ?? 0; at < (linear.starts[row + 1] ?? 0); at += 1) {
      const column = linear.indices[at] ?? 0;
      if (columns.isWork[column]) continue;
      const added = builder.addColumn({
        name: linear.columnNames[column] ?? '',
        lower: linear.columnLower[column] ?? 0,
        upper: rows.isUnbounded[column]
          ? Number.POSITIVE_INFINITY
          : (linear.columnUpper[column] ?? Number.POSITIVE_INFINITY),
        costs: { cost: columns.cost[column] ?? 0 },
      });
      entries.push([added, linear.values[at] ?? 0]);
    }
    rowOf[position] = builder.addRow({
      name: linear.rowNames[row] ?? '',
      lower: (linear.rowLower[row] ?? Number.NEGATIVE_INFINITY) - (rest[position] ?? 0),
      upper: (linear.rowUpper[row] ?? Number.POSITIVE_INFINITY) - (rest[position] ?? 0),
      entries,
    });
  }
  return rowOf;
}

/** Spreads between the people of the part, and against those outside it, whose counts stand. */
function addSpreadRows(builder: ModelBuilder, roster: RosterLines, part: Part): Int32Array {
  const { spreads, lines } = roster.space;
  const inPart = new Set(part.people);
  const rowOf = new Int32Array(spreads.length * lines.length).fill(-1);
  spreads.forEach((term, index) => {
    const range = roster.rangeOutside(term, inPart);
    const most = builder.addColumn({
      name: `most(${index})`,
      lower: range?.most ?? 0,
      costs: { cost: term.priceCents },
    });
    const least = builder.addColumn({
      name: `least(${index})`,
      upper: range?.least ?? roster.days,
      costs: { cost: -term.priceCents },
    });
    for (const person of part.people) {
      if (!term.takesPart[person]) continue;
      rowOf[index * lines.length + person] = builder.addRow({
        name: `most(${index},p${person})`,
        upper: 0,
        entries: [[most, -1]],
      });
      builder.addRow({ name: `least(${index},p${person})`, lower: 0, entries: [[least, -1]] });
    }
  });
  return rowOf;
}
