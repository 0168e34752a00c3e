import type { LimitName, Problem, Requirement } from '../../problem';

/** Which limit stands behind rows of a person, by the first word of their name (see the row builders). */
const limitOfRow: { readonly [name: string]: LimitName } = {
  rest: 'restMinutes',
  run: 'longestRunDays',
  nightrun: 'longestRunNights',
  nights: 'nightsPerPeriod',
  weekends: 'weekendsPerPeriod',
  shortrun: 'shortestRunDays',
  shortfree: 'shortestRunFreeDays',
  follow: 'kindsThatMayNotFollow',
};

/**
 * The requirement that a row of one person's rules or pins is there for, by the row's name; null for rows
 * that always hold (one shift a day, what ties overtime and weekends to shifts) and for those that several
 * requirements share.
 */
export function ownerOfRow(problem: Problem, rowName: string): Requirement | null {
  const match = /^(\w+)\(p(\d+)(?:,(\d+))?/.exec(rowName);
  const person = problem.people[Number(match?.[2] ?? -1)];
  const word = match?.[1] ?? '';
  if (!person) return null;
  const { id: personId } = person;
  if (word === 'pin') {
    const dayIndex = person.pins[Number(match?.[3] ?? -1)]?.dayIndex;
    return dayIndex === undefined ? null : { kind: 'pin', personId, dayIndex };
  }
  const limit = limitOfRow[word];
  if (!limit) return null;
  return person.rules ? { kind: 'ownLimit', personId, limit } : { kind: 'limit', limit };
}
