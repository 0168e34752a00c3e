/** Minutes of a circle: a day (1440) or a week (10080). An end beyond the circle goes on at its start. */
export type CycleMinutes = 1440 | 10080;

/** A half-open interval on a circle: starts within it, lasts at most one round. */
export interface Arc {
  readonly startMinute: number;
  readonly endMinute: number;
}

const wrap = (minute: number, cycle: CycleMinutes): number => ((minute % cycle) + cycle) % cycle;

/** Puts an interval on the circle: the start is brought within it, the length stays. */
export function placeOnCircle(startMinute: number, endMinute: number, cycle: CycleMinutes): Arc {
  const start = wrap(startMinute, cycle);
  return { startMinute: start, endMinute: start + (endMinute - startMinute) };
}

/** Whether the arc runs over the minute that begins at `minute`. */
export function holdsMinute(arc: Arc, minute: number, cycle: CycleMinutes): boolean {
  return wrap(minute - arc.startMinute, cycle) < arc.endMinute - arc.startMinute;
}

/** Whether two arcs share at least a minute; arcs that only touch do not. */
export function arcsOverlap(one: Arc, other: Arc, cycle: CycleMinutes): boolean {
  return holdsMinute(one, other.startMinute, cycle) || holdsMinute(other, one.startMinute, cycle);
}

/** Cuts the circle at every start and end of the arcs; a single cut gives one piece of a whole round. */
export function cutCircle(arcs: readonly Arc[], cycle: CycleMinutes): Arc[] {
  const cuts = [
    ...new Set(arcs.flatMap((arc) => [wrap(arc.startMinute, cycle), wrap(arc.endMinute, cycle)])),
  ].sort((one, other) => one - other);
  return cuts.map((startMinute, index) => ({
    startMinute,
    endMinute: cuts[index + 1] ?? (cuts[0] ?? 0) + cycle,
  }));
}
