import type { Net } from './net';
import type { NetRules } from './net-rules';
import {
  canReachLeast,
  type EndCounts,
  firstState,
  mayEnd,
  readCounts,
  stateSize,
  stepState,
} from './net-states';
import { RowTable } from './row-table';

/** One layer while it is built: for each state and group the position in the next layer, or -1. */
interface Layer {
  readonly count: number;
  readonly targets: Int32Array;
}

/**
 * Builds the net of some rules: forward over every reachable history, then backward, dropping those
 * without a lawful end and joining those with the same future (minimisation of an acyclic automaton,
 * Revuz, Theoretical Computer Science 92, 1992, 181-189).
 */
export function buildNet(rules: NetRules): Net {
  const { layers, last } = expand(rules);
  const ends = joinEnds(rules, last);
  const joined = joinBackward(rules, layers, ends.nodeOf, ends.kept.length);
  return packNet(rules, joined, ends.kept);
}

function expand(rules: NetRules): { layers: Layer[]; last: RowTable } {
  const { groupCount } = rules.groups;
  const layers: Layer[] = [];
  const scratch = firstState(rules);
  const toCome = mostToCome(rules);
  let list = new RowTable(stateSize);
  list.place(scratch, 0);
  for (let day = 0; day < rules.dayCount; day += 1) {
    const targets = new Int32Array(list.count * groupCount).fill(-1);
    const following = new RowTable(stateSize);
    for (let group = 0; group < groupCount; group += 1) {
      if (group > 0 && !rules.groups.shiftOn(group, day)) continue;
      for (let node = 0; node < list.count; node += 1) {
        if (!stepState(rules, list.rows, node * stateSize, day, group, scratch)) continue;
        if (!canReachLeast(rules, scratch, toCome[day + 1] ?? 0)) continue;
        targets[node * groupCount + group] = following.place(scratch, 0);
      }
    }
    layers.push({ count: list.count, targets });
    list = following;
  }
  return { layers, last: list };
}

/** By day: most minutes that the days from it on can hold, one day off after each longest run. */
function mostToCome({ dayCount, groups, longestRun }: NetRules): Float64Array {
  const longest = groups.minutes.reduce((most, minutes) => Math.max(most, minutes), 0);
  return Float64Array.from({ length: dayCount + 1 }, (_, day) => {
    const days = dayCount - day;
    const free = Number.isFinite(longestRun) ? Math.floor(days / (longestRun + 1)) : 0;
    return (days - free) * longest;
  });
}

/** Ends differ only in what a price can see: minutes, Nights and weekends. */
function joinEnds(
  rules: NetRules,
  { rows, count }: RowTable,
): { readonly nodeOf: Int32Array; readonly kept: readonly EndCounts[] } {
  const found = new Map<number, number>();
  const kept: EndCounts[] = [];
  const nodeOf = new Int32Array(count).fill(-1);
  for (let position = 0; position < count; position += 1) {
    if (!mayEnd(rules, rows, position * stateSize)) continue;
    const end = readCounts(rules, rows, position * stateSize);
    const range = rules.dayCount + 1;
    const code = (end.minutes * range + end.nights) * range + end.weekends;
    const node = found.get(code) ?? kept.push(end) - 1;
    found.set(code, node);
    nodeOf[position] = node;
  }
  return { nodeOf, kept };
}

interface JoinedLayer {
  readonly count: number;
  /** By node x group count + group: node of the next layer, or -1. */
  readonly targets: Int32Array;
}

function joinBackward(
  rules: NetRules,
  layers: readonly Layer[],
  endOf: Int32Array,
  endCount: number,
): JoinedLayer[] {
  const joined: JoinedLayer[] = [{ count: endCount, targets: new Int32Array(0) }];
  let nodeOf = endOf;
  for (const layer of [...layers].reverse()) {
    const merged = joinLayer(layer, nodeOf, rules.groups.groupCount);
    joined.push({ count: merged.count, targets: merged.targets });
    nodeOf = merged.nodeOf;
  }
  return joined.reverse();
}

function joinLayer(
  { count, targets }: Layer,
  nextOf: Int32Array,
  groupCount: number,
): JoinedLayer & { readonly nodeOf: Int32Array } {
  const found = new RowTable(groupCount);
  const nodeOf = new Int32Array(count).fill(-1);
  const row = new Int32Array(groupCount);
  for (let node = 0; node < count; node += 1) {
    let hasFuture = false;
    for (let group = 0; group < groupCount; group += 1) {
      const target = targets[node * groupCount + group] as number;
      const next = target < 0 ? -1 : (nextOf[target] as number);
      row[group] = next;
      hasFuture ||= next >= 0;
    }
    if (hasFuture) nodeOf[node] = found.place(row, 0);
  }
  return { count: found.count, targets: found.rows, nodeOf };
}

function packNet(rules: NetRules, joined: readonly JoinedLayer[], ends: readonly EndCounts[]): Net {
  const { groupCount } = rules.groups;
  const isEmpty = joined.some(({ count }) => count === 0);
  const layers = new Int32Array(joined.length + 1);
  joined.forEach(({ count }, index) => {
    layers[index + 1] = (layers[index] ?? 0) + (isEmpty ? 0 : count);
  });
  const inner = isEmpty ? 0 : (layers[rules.dayCount] ?? 0);
  const next = new Int32Array(inner * groupCount).fill(-1);
  if (!isEmpty) {
    joined.slice(0, -1).forEach(({ count, targets }, day) => {
      const from = (layers[day] ?? 0) * groupCount;
      const offset = layers[day + 1] ?? 0;
      for (let index = 0; index < count * groupCount; index += 1) {
        const target = targets[index] as number;
        if (target >= 0) next[from + index] = offset + target;
      }
    });
  }
  const kept = isEmpty ? [] : ends;
  return {
    dayCount: rules.dayCount,
    groupCount,
    layers,
    next,
    ends: {
      minutes: Int32Array.from(kept, ({ minutes }) => minutes),
      nights: Int32Array.from(kept, ({ nights }) => nights),
      weekends: Int32Array.from(kept, ({ weekends }) => weekends),
    },
  };
}
