/** A half-open stretch of time in minutes. */
export interface Stretch {
  readonly startMinute: number;
  readonly endMinute: number;
}

/** A stretch over which the same windows ask for cover. */
export interface Slice<W extends Stretch> extends Stretch {
  readonly windows: readonly W[];
}

/** Whether the stretch is on all through the other. */
export const holds = (outer: Stretch, inner: Stretch): boolean =>
  outer.startMinute <= inner.startMinute && inner.endMinute <= outer.endMinute;

/** Whether two stretches share time; touching ends do not. */
export const overlaps = (one: Stretch, other: Stretch): boolean =>
  one.startMinute < other.endMinute && other.startMinute < one.endMinute;

/**
 * Cuts the time of the windows at their own ends and at the given minutes (starts and ends of shifts),
 * so that nobody comes or goes inside a slice. Only slices with at least one window, in order.
 */
export function sliceWindows<W extends Stretch>(
  windows: readonly W[],
  cuts: readonly number[],
): Slice<W>[] {
  const ends = windows.flatMap(({ startMinute, endMinute }) => [startMinute, endMinute]);
  const minutes = [...new Set([...ends, ...cuts])].sort((one, other) => one - other);
  return minutes.slice(1).flatMap((endMinute, index) => {
    const slice = { startMinute: minutes[index] ?? endMinute, endMinute };
    const asking = windows.filter((window) => holds(window, slice));
    return asking.length === 0 ? [] : [{ ...slice, windows: asking }];
  });
}

/** Slices of one cover set, possibly made of several that touched. */
export interface CoveredSlice<W extends Stretch, C> extends Slice<W> {
  readonly covering: readonly C[];
}

/**
 * Finds who can cover each slice and joins touching slices in which neither the windows nor the cover
 * differ: they would give the same row twice. The minutes of the joined slice are the sum.
 */
export function coverSlices<W extends Stretch, C>(
  slices: readonly Slice<W>[],
  coveringOf: (slice: Stretch) => readonly C[],
): CoveredSlice<W, C>[] {
  const joined: CoveredSlice<W, C>[] = [];
  for (const slice of slices) {
    const covering = coveringOf(slice);
    const last = joined.at(-1);
    const isSame =
      last?.endMinute === slice.startMinute &&
      isSameList(last.windows, slice.windows) &&
      isSameList(last.covering, covering);
    if (last && isSame) joined[joined.length - 1] = { ...last, endMinute: slice.endMinute };
    else joined.push({ ...slice, covering });
  }
  return joined;
}

const isSameList = <T>(one: readonly T[], other: readonly T[]): boolean =>
  one.length === other.length && one.every((item, index) => item === other[index]);
