import type { LineCounters } from './line-counters';
import { type LineMemory, type LineRules, mayEnd, stepMemory } from './line-memory';
import type { LineDay, LineOption } from './line-options';

/** One choice of a day after a memory: where it leads, what it costs and what it adds to the counters. */
export interface LineArc {
  readonly to: number;
  readonly cents: number;
  readonly minutes: number;
  /** By counter. */
  readonly amounts: readonly number[];
}

/** All memories of a person by day, and the choices between them; sums over the period are left out. */
export interface LineGraph {
  /** Choices by day and by the place of the memory before it. */
  readonly arcs: readonly (readonly (readonly LineArc[])[])[];
  /**
   * Least and most minutes that can still be worked from a memory to the end, by days gone by and its
   * place; more than can be and less than none where the end cannot be reached.
   */
  readonly leastAhead: readonly Float64Array[];
  readonly mostAhead: readonly Float64Array[];
}

/** Goes through the days once forwards, finding the memories, and once backwards, finding what lies ahead. */
export function buildLineGraph(
  rules: LineRules,
  days: readonly LineDay[],
  counters: LineCounters,
  weekendCents: number,
): LineGraph {
  let memories: readonly LineMemory[] = [rules.start];
  const arcs = days.map((day, dayIndex) => {
    const book = new MemoryBook();
    const choices = memories.map((memory) =>
      arcsFrom(rules, memory, dayIndex, day, counters, weekendCents, book),
    );
    memories = book.memories;
    return choices;
  });
  const ends = memories.map((memory) => mayEnd(rules, memory));
  return {
    arcs,
    leastAhead: lookAhead(arcs, ends, Math.min, Number.POSITIVE_INFINITY),
    mostAhead: lookAhead(arcs, ends, Math.max, Number.NEGATIVE_INFINITY),
  };
}

function arcsFrom(
  rules: LineRules,
  memory: LineMemory,
  dayIndex: number,
  day: LineDay,
  counters: LineCounters,
  weekendCents: number,
  book: MemoryBook,
): LineArc[] {
  const arcs = new Map<string, LineArc>();
  const add = (option: LineOption | null, ownCents: number): void => {
    const after = stepMemory(rules, memory, dayIndex, option);
    if (!after) return;
    const isNewWeekend = option?.marksWeekend === true && !memory.hasWeekend;
    const arc = {
      to: book.placeOf(after),
      cents: ownCents + (isNewWeekend ? weekendCents : 0),
      minutes: option?.shift.paidMinutes ?? 0,
      amounts: counters.list.map((counter) => (option ? counter.add(option, isNewWeekend) : 0)),
    };
    // Of choices that are the same to every rule only the cheapest is of use.
    const key = `${arc.to} ${arc.minutes} ${arc.amounts}`;
    const known = arcs.get(key);
    if (!known || arc.cents < known.cents) arcs.set(key, arc);
  };
  for (const option of day.options) add(option, option.cents);
  if (day.freeCents !== null) add(null, day.freeCents);
  return [...arcs.values()];
}

function lookAhead(
  arcs: LineGraph['arcs'],
  ends: readonly boolean[],
  better: (one: number, other: number) => number,
  none: number,
): Float64Array[] {
  const ahead: Float64Array[] = [];
  ahead[arcs.length] = Float64Array.from(ends, (isEnd) => (isEnd ? 0 : none));
  for (let day = arcs.length - 1; day >= 0; day -= 1) {
    const next = ahead[day + 1] ?? new Float64Array();
    ahead[day] = Float64Array.from(arcs[day] ?? [], (choices) =>
      choices.reduce((best, { to, minutes }) => better(best, minutes + (next[to] ?? none)), none),
    );
  }
  return ahead;
}

/** Gives equal memories the same place. */
class MemoryBook {
  readonly memories: LineMemory[] = [];
  readonly #places = new Map<string, number>();

  placeOf(memory: LineMemory): number {
    const { blockedThrough, lastKindId, run, due, nightRun, hasWeekend } = memory;
    const key = `${blockedThrough},${lastKindId},${run},${due},${nightRun},${hasWeekend}`;
    const known = this.#places.get(key);
    if (known !== undefined) return known;
    this.#places.set(key, this.memories.length);
    return this.memories.push(memory) - 1;
  }
}
