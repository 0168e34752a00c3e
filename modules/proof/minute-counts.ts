/** A half-open interval of whole minutes. */
export interface Interval {
  readonly startMinute: number;
  readonly endMinute: number;
}

/**
 * How many of the weighted intervals run over each minute of an axis. Minutes outside the axis are cut
 * off. Steps are noted where intervals begin and end, then summed up along the axis.
 */
export function countByMinute<T extends Interval>(
  axis: Interval,
  intervals: readonly T[],
  weigh: (interval: T) => number = () => 1,
): Int32Array {
  const length = axis.endMinute - axis.startMinute;
  const counts = new Int32Array(length + 1);
  for (const interval of intervals) {
    const from = Math.max(interval.startMinute, axis.startMinute) - axis.startMinute;
    const to = Math.min(interval.endMinute, axis.endMinute) - axis.startMinute;
    if (to <= from) continue;
    counts[from] = at(counts, from) + weigh(interval);
    counts[to] = at(counts, to) - weigh(interval);
  }
  for (let minute = 1; minute <= length; minute += 1) {
    counts[minute] = at(counts, minute) + at(counts, minute - 1);
  }
  return counts;
}

/** A count by position; 0 beyond the array. */
export const at = (counts: Int32Array, position: number): number => counts[position] ?? 0;

/** The hull of some intervals; an empty axis when there are none. */
export function axisOf(intervals: readonly Interval[]): Interval {
  let [startMinute, endMinute] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (const interval of intervals) {
    startMinute = Math.min(startMinute, interval.startMinute);
    endMinute = Math.max(endMinute, interval.endMinute);
  }
  return endMinute > startMinute ? { startMinute, endMinute } : { startMinute: 0, endMinute: 0 };
}
