import type { Problem, ProblemShift } from '../problem';
import { holds, type Stretch } from './time-slices';
import type { PersonWork, WorkColumn } from './work-columns';

/** Finds who can be on duty all through a stretch of time, without looking at every shift. */
export class CoverIndex {
  readonly #onShift: WorkColumn[][];
  /** By start. */
  readonly #shifts: readonly ProblemShift[];
  readonly #edges: readonly number[];
  readonly #longestMinutes: number;

  constructor(problem: Problem, works: readonly PersonWork[]) {
    this.#onShift = problem.shifts.map(() => []);
    for (const { columns } of works) {
      for (const work of columns) this.#onShift[work.shift.index]?.push(work);
    }
    this.#shifts = [...problem.shifts].sort((one, other) => one.startMinute - other.startMinute);
    const edges = problem.shifts.flatMap(({ startMinute, endMinute }) => [startMinute, endMinute]);
    this.#edges = [...new Set(edges)].sort((one, other) => one - other);
    this.#longestMinutes = problem.shifts.reduce(
      (most, { startMinute, endMinute }) => Math.max(most, endMinute - startMinute),
      0,
    );
  }

  /** Minutes inside a stretch at which somebody may come or go. */
  edgesWithin({ startMinute, endMinute }: Stretch): readonly number[] {
    const from = firstIndex(this.#edges, (edge) => edge > startMinute);
    const to = firstIndex(this.#edges, (edge) => edge >= endMinute);
    return this.#edges.slice(from, to);
  }

  /** Columns that put somebody on duty all through a stretch. */
  covering(stretch: Stretch, counts: (work: WorkColumn) => boolean): WorkColumn[] {
    const earliest = stretch.endMinute - this.#longestMinutes;
    const first = firstIndex(this.#shifts, ({ startMinute }) => startMinute >= earliest);
    const found: WorkColumn[] = [];
    for (let position = first; position < this.#shifts.length; position += 1) {
      const shift = this.#shifts[position];
      if (!shift || shift.startMinute > stretch.startMinute) break;
      if (!holds(shift, stretch)) continue;
      for (const work of this.#onShift[shift.index] ?? []) if (counts(work)) found.push(work);
    }
    return found;
  }

  /** Columns of one shift. */
  onShift(shiftIndex: number): readonly WorkColumn[] {
    return this.#onShift[shiftIndex] ?? [];
  }
}

/** Position of the first item that passes a test which all later ones pass too; the length if none. */
function firstIndex<T>(items: readonly T[], passes: (item: T) => boolean): number {
  let from = 0;
  let to = items.length;
  while (from < to) {
    const middle = (from + to) >> 1;
    const item = items[middle];
    if (item !== undefined && passes(item)) to = middle;
    else from = middle + 1;
  }
  return from;
}
