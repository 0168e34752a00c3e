import type { SearchSpace } from './search-space';

/** Cost of a line in cents: its shifts and its end. */
export function costOf(
  { columns, ends }: SearchSpace,
  person: number,
  cells: Int32Array,
  end: number,
): number {
  return cells.reduce(
    (sum, column) => sum + (column < 0 ? 0 : (columns.cost[column] ?? 0)),
    ends[person]?.[end] ?? 0,
  );
}

/** The same with the shifts of some days only. */
export const costWithin = (
  space: SearchSpace,
  person: number,
  cells: Int32Array,
  end: number,
  { from, to }: { readonly from: number; readonly to: number },
): number => costOf(space, person, cells.subarray(from, to), end);
