import type { PlannedRoster, Problem, ProblemPerson } from '../../problem';
import type { NewAbsence } from './mending';

/** A problem after absences, and what is left of its roster. */
export interface AbsentProblem {
  readonly problem: Problem;
  readonly roster: PlannedRoster;
}

/**
 * Adds absences to a problem: shifts that overlap them are lost, pins on them too, and their paid minutes
 * are credited to the hours of the contract; without the credit the absent would have to make them up.
 */
export function withAbsences(
  problem: Problem,
  roster: PlannedRoster,
  absences: readonly NewAbsence[],
): AbsentProblem {
  const isLost = (personId: string, shiftIndex: number): boolean => {
    const shift = problem.shifts.find(({ index }) => index === shiftIndex);
    return absences.some(
      (absence) =>
        absence.personId === personId &&
        shift !== undefined &&
        absence.startMinute < shift.endMinute &&
        shift.startMinute < absence.endMinute,
    );
  };
  const lost = roster.filter(({ personId, shiftIndex }) => isLost(personId, shiftIndex));
  const people = problem.people.map((person): ProblemPerson => {
    const own = absences.filter(({ personId }) => personId === person.id);
    if (own.length === 0) return person;
    const credit = lost
      .filter(({ personId }) => personId === person.id)
      .map(({ shiftIndex }) => problem.shifts.find(({ index }) => index === shiftIndex))
      .reduce((sum, shift) => sum + (shift?.paidMinutes ?? 0), 0);
    return {
      ...person,
      creditMinutes: person.creditMinutes + credit,
      absences: [
        ...person.absences,
        ...own.map(({ startMinute, endMinute, reason }) => ({ startMinute, endMinute, reason })),
      ],
      pins: person.pins.filter(
        ({ shiftIndex }) => shiftIndex === null || !isLost(person.id, shiftIndex),
      ),
    };
  });
  return { problem: { ...problem, people }, roster: roster.filter((one) => !lost.includes(one)) };
}
