import type { Problem, ProblemPerson } from '../../problem';
import { weekdayOf } from '../../units';
import { CostTable } from './cost-table';
import { countOf, type LineCounter, type LineCounters, readLineCounters } from './line-counters';
import { endCosts } from './line-ends';
import { buildLineGraph, type LineArc, type LineGraph } from './line-graph';
import { readLineRules } from './line-memory';
import { type LinePrices, lineDays } from './line-options';

/**
 * Least cost in cents of one person's lawful line over the whole period at the prices of a bound, pay and
 * fairness of the person included; null when there is no lawful line. Dynamic program from day to day over
 * what the rules remember (resource-constrained shortest path: Irnich and Desaulniers, Column Generation,
 * 2005, 33-65).
 */
export function cheapestLine(
  problem: Problem,
  person: ProblemPerson,
  prices: LinePrices,
): number | null {
  if (person.pins.some((pin) => pin.shiftIndex !== null && !problem.days[pin.dayIndex]))
    return null;
  const days = lineDays(problem, person, prices);
  const counters = readLineCounters(problem, person, days);
  if (!counters) return null;
  const rules = readLineRules(problem, person, days, weekendDays(problem, counters, prices));
  const graph = buildLineGraph(rules, days, counters, prices.units.weekends);
  return cheapestEnd(
    walk(graph, counters),
    counters,
    endCosts(problem, person, prices.payWorth, counters),
  );
}

/**
 * The cheapest way to every history at the end. A history is the place of a memory times the size of the
 * counters, plus the counters.
 */
function walk(graph: LineGraph, counters: LineCounters): CostTable {
  let costs = new CostTable();
  let next = new CostTable();
  costs.lower(0, 0);
  for (const dayIndex of graph.arcs.keys()) {
    const steps = readSteps(graph, counters, dayIndex);
    for (let place = 0; place < costs.count; place += 1) {
      const key = costs.keyAt(place);
      const memory = Math.floor(key / counters.size);
      const counted = key - memory * counters.size;
      const cost = costs.costAt(place);
      if (isDominated(costs, counters, key, counted, cost)) continue;
      for (const step of steps[memory] ?? []) {
        if (hasRoom(step, counted)) next.lower(key + step.move, cost + step.cents);
      }
    }
    [costs, next] = [next, costs];
    next.clear();
  }
  return costs;
}

/** A choice as it changes the number of a history. */
interface Step {
  readonly move: number;
  readonly cents: number;
  /** Counters that must lie within limits before the choice. */
  readonly limits: readonly (Pick<LineCounter, 'unit' | 'radix'> & {
    readonly from: number;
    readonly upTo: number;
  })[];
}

/** The choices of a day by memory; those that never reach the end are left out. */
function readSteps(graph: LineGraph, counters: LineCounters, dayIndex: number): Step[][] {
  const { list, size } = counters;
  const after = dayIndex + 1;
  return (graph.arcs[dayIndex] ?? []).map((arcs, memory) =>
    arcs
      .filter(({ to }) => Number.isFinite(graph.mostAhead[after]?.[to]))
      .map((arc) => ({
        move: (arc.to - memory) * size + sumOf(list, ({ unit }, index) => unit * at(arc, index)),
        cents: arc.cents,
        limits: list.flatMap(({ kind, unit, radix }, index) => {
          if (kind !== 'minutes') {
            const upTo = radix - 1 - at(arc, index);
            return at(arc, index) === 0 ? [] : [{ unit, radix, from: 0, upTo }];
          }
          return [{ unit, radix, ...minuteLimits(graph, counters, arc, after) }];
        }),
      })),
  );
}

/** Steps of minutes that a line may have before a choice, so that what lies ahead can make it lawful. */
function minuteLimits(
  graph: LineGraph,
  { minuteStep, leastMinutes, mostMinutes }: LineCounters,
  { to, minutes }: LineArc,
  after: number,
): { from: number; upTo: number } {
  const most = minutes + (graph.mostAhead[after]?.[to] ?? 0);
  const least = minutes + (graph.leastAhead[after]?.[to] ?? 0);
  return {
    from: Math.ceil((leastMinutes - most) / minuteStep),
    upTo: Math.floor((mostMinutes - least) / minuteStep),
  };
}

const at = ({ amounts }: LineArc, index: number): number => amounts[index] ?? 0;

const sumOf = <T>(items: readonly T[], weigh: (item: T, index: number) => number): number =>
  items.reduce((sum, item, index) => sum + weigh(item, index), 0);

function hasRoom({ limits }: Step, counted: number): boolean {
  for (const { unit, radix, from, upTo } of limits) {
    const count = Math.floor(counted / unit) % radix;
    if (count < from || count > upTo) return false;
  }
  return true;
}

/**
 * Whether the same history with one Night, weekend or shift of a kind less costs no more. Whatever may
 * follow this one may follow that one, and fairness never rewards having more.
 */
function isDominated(
  costs: CostTable,
  { list }: LineCounters,
  key: number,
  counted: number,
  cost: number,
): boolean {
  for (const counter of list) {
    if (counter.kind === 'minutes' || countOf(counter, counted) === 0) continue;
    if (costs.costOf(key - counter.unit) <= cost) return true;
  }
  return false;
}

function cheapestEnd(
  costs: CostTable,
  { size }: LineCounters,
  endCost: (counted: number) => number | null,
): number | null {
  let best: number | null = null;
  for (let place = 0; place < costs.count; place += 1) {
    const end = endCost(costs.keyAt(place) % size);
    if (end === null) continue;
    const total = costs.costAt(place) + end;
    if (best === null || total < best) best = total;
  }
  return best;
}

/** For each day whether the next one belongs to the same weekend; nowhere when weekends do not matter. */
function weekendDays({ days }: Problem, { list }: LineCounters, { units }: LinePrices): boolean[] {
  const matters = units.weekends !== 0 || list.some(({ kind }) => kind === 'weekends');
  return days.map(({ date }) => matters && [4, 5].includes(weekdayOf(date)));
}
