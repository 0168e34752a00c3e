import type { RosterLines } from './roster-lines';
import type { SearchSpace } from './search-space';

/** Some people over some days [from, to), to be laid anew together while the rest of the roster stays. */
export interface Part {
  readonly people: readonly number[];
  readonly from: number;
  readonly to: number;
}

/** Everybody over all days. */
export const wholeOf = (space: SearchSpace): Part => ({
  people: space.lines.map((_, person) => person),
  from: 0,
  to: space.dayCount,
});

/** Whether a bound of the part is one of the whole roster. */
export const isWholePart = (
  { lines, dayCount }: SearchSpace,
  { people, from, to }: Part,
): boolean => people.length === lines.length && from === 0 && to === dayCount;

/** Values of the rows without the part's own cells. */
export function fixedValues(roster: RosterLines, { people, from, to }: Part): Int32Array {
  const values = roster.values.slice();
  const { starts, rows, coefficients } = roster.space.columns;
  for (const person of people) {
    for (let day = from; day < to; day += 1) {
      const column = roster.cells[person * roster.days + day] ?? -1;
      if (column < 0 || roster.isIn[person] === 0) continue;
      for (let at = starts[column] ?? 0; at < (starts[column + 1] ?? 0); at += 1) {
        const row = rows[at] ?? 0;
        values[row] = (values[row] ?? 0) - (coefficients[at] ?? 0);
      }
    }
  }
  return values;
}

/** The rows that any choice of the part can change, by position in the space. */
export function touchedRows(space: SearchSpace, { people, from, to }: Part): number[] {
  const isTouched = new Uint8Array(space.rows.count);
  const { starts, rows } = space.columns;
  for (const person of people) {
    const lines = space.lines[person];
    if (!lines) continue;
    const { groupCount } = lines.net;
    for (const works of lines.options.slice(from * groupCount, to * groupCount)) {
      for (const { column } of works) {
        for (let at = starts[column] ?? 0; at < (starts[column + 1] ?? 0); at += 1) {
          isTouched[rows[at] ?? 0] = 1;
        }
      }
    }
  }
  return Array.from(isTouched.keys()).filter((row) => isTouched[row] === 1);
}
