import type { ProblemPerson } from './problem';

/**
 * Minutes of leave credit that stand for one absence: all absences of the period share the credit by
 * their length, rounded. A problem keeps one sum of credit, so that with several absences it is a
 * share and not a record.
 */
export function creditOf(
  person: ProblemPerson,
  absence: { readonly startMinute: number; readonly endMinute: number },
): number {
  const inAll = person.absences.reduce((sum, each) => sum + lengthOf(each), 0);
  return inAll === 0 ? 0 : Math.round((person.creditMinutes * lengthOf(absence)) / inAll);
}

const lengthOf = ({ startMinute, endMinute }: { startMinute: number; endMinute: number }): number =>
  endMinute - startMinute;
