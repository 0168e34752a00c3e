import type { LineDay } from './line-options';

/** When the shifts that a person may be on start. */
export interface RestStarts {
  /** In order. */
  readonly minutes: Float64Array;
  /** The first of each day or later; Infinity when there is none. */
  readonly firstFrom: Float64Array;
}

/** Collects the starts of all choices of a person. */
export function readRestStarts(days: readonly LineDay[]): RestStarts {
  const firstFrom = new Float64Array(days.length).fill(Number.POSITIVE_INFINITY);
  const minutes: number[] = [];
  let first = Number.POSITIVE_INFINITY;
  for (let day = days.length - 1; day >= 0; day -= 1) {
    for (const { shift } of days[day]?.options ?? []) {
      minutes.push(shift.startMinute);
      first = Math.min(first, shift.startMinute);
    }
    firstFrom[day] = first;
  }
  return { minutes: Float64Array.from(minutes).sort(), firstFrom };
}

/**
 * The latest start after a day that lies before `readyMinute`, at which rest is over, or -Infinity: which
 * starts are barred is all that rest needs to be remembered by.
 */
export function blockedBelow(
  { minutes, firstFrom }: RestStarts,
  dayIndex: number,
  readyMinute: number,
): number {
  let [from, to] = [0, minutes.length];
  while (from < to) {
    const middle = (from + to) >> 1;
    if ((minutes[middle] ?? 0) < readyMinute) from = middle + 1;
    else to = middle;
  }
  const latest = minutes[from - 1] ?? Number.NEGATIVE_INFINITY;
  const first = firstFrom[dayIndex + 1] ?? Number.POSITIVE_INFINITY;
  return latest >= first ? latest : Number.NEGATIVE_INFINITY;
}
