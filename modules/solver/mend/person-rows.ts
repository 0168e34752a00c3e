import type { RosterModel } from '../../model';

/** Tests one person's shifts against all rules of that person, without a solver. */
export type IsLawful = (personIndex: number, columns: ReadonlySet<number>) => boolean;

const tolerance = 1e-6;

/**
 * Reads each person's own rows off the model: those that hold nothing but their shifts and weekends. A few
 * microseconds a test, for enumerations of thousands.
 */
export function personRows({ linear, works, weekends }: RosterModel): IsLawful {
  const { starts, indices, values, rowLower, rowUpper } = linear;
  const owner = new Int32Array(linear.columnNames.length).fill(-1);
  for (const { personIndex, columns } of works) {
    for (const { column } of columns) owner[column] = personIndex;
    for (const { column } of weekends[personIndex] ?? []) owner[column] = personIndex;
  }
  const rowsOf: number[][] = works.map(() => []);
  linear.rowNames.forEach((_, row) => {
    const held = indices.subarray(starts[row] ?? 0, starts[row + 1] ?? 0);
    const person = owner[held[0] ?? -1] ?? -1;
    if (person >= 0 && held.every((column) => owner[column] === person)) rowsOf[person]?.push(row);
  });
  return (personIndex, columns) => {
    const worked = new Set(columns);
    for (const { column, days } of weekends[personIndex] ?? []) {
      if (days.flat().some((work) => columns.has(work.column))) worked.add(column);
    }
    return (rowsOf[personIndex] ?? []).every((row) => {
      let sum = 0;
      for (let at = starts[row] ?? 0; at < (starts[row + 1] ?? 0); at += 1) {
        if (worked.has(indices[at] ?? -1)) sum += values[at] ?? 0;
      }
      return sum >= (rowLower[row] ?? 0) - tolerance && sum <= (rowUpper[row] ?? 0) + tolerance;
    });
  };
}
