import { type Floor, type FloorNeeds, peopleSchema } from '@/modules/coverage';
import type { FloorId } from '@/modules/units';
import { edgesOf, type GridSelection, numberColumns } from './grid-selection';

/** One cell of the floors table before and after a change. */
export interface NeedChange {
  readonly floorId: FloorId;
  /** 0 Monday to 6 Sunday, 7 holiday. */
  readonly day: number;
  readonly before: number;
  readonly after: number;
}

type Row = Pick<Floor, 'id' | 'needs'>;

/** Sets every selected number to the same number of people. Cells that have it already are left out. */
export const setPeople = (
  rows: readonly Row[],
  selection: GridSelection,
  people: number,
): NeedChange[] => changes(rows, selection, () => people);

/** Copies the first selected number of each row to the right, or of each column down. */
export function fill(
  rows: readonly Row[],
  selection: GridSelection,
  towards: 'right' | 'down',
): NeedChange[] {
  const { top, left } = edgesOf(selection);
  return changes(rows, selection, (row, column) =>
    towards === 'right' ? needAt(rows, row, left) : needAt(rows, top, column),
  );
}

/** The number of people that was typed, or what is wrong with it. */
export function readPeople(text: string): { people: number } | { problem: string } {
  const outcome = peopleSchema.safeParse(/^\s*\d+\s*$/.test(text) ? Number(text) : Number.NaN);
  if (outcome.success) return { people: outcome.data };
  return { problem: outcome.error.issues[0]?.message ?? '' };
}

/** What is sent for changes: the numbers after them. */
export const toCells = (made: readonly NeedChange[]): FloorNeeds =>
  made.map(({ floorId, day, after }) => ({ floorId, day, people: after }));

/** The floors with numbers put into their cells; others stay as they are. */
export function withNeeds(floors: readonly Floor[], cells: FloorNeeds): Floor[] {
  return floors.map((floor) => {
    const own = new Map(
      cells.filter(({ floorId }) => floorId === floor.id).map(({ day, people }) => [day, people]),
    );
    if (own.size === 0) return floor;
    return { ...floor, needs: floor.needs.map((people, day) => own.get(day) ?? people) };
  });
}

function changes(
  rows: readonly Row[],
  selection: GridSelection,
  peopleAt: (row: number, column: number) => number,
): NeedChange[] {
  const { top, bottom, left, right } = edgesOf(selection);
  return rows.slice(top, bottom + 1).flatMap(({ id, needs }, index) =>
    needs.slice(left, Math.min(right + 1, numberColumns)).flatMap((before, offset) => {
      const after = peopleAt(top + index, left + offset);
      return after === before ? [] : [{ floorId: id, day: left + offset, before, after }];
    }),
  );
}

const needAt = (rows: readonly Row[], row: number, column: number): number =>
  rows[row]?.needs[column] ?? 0;
