import type { ProblemPerson, ProblemShift } from './problem';

interface Stretch {
  readonly startMinute: number;
  readonly endMinute: number;
}

/** Whether two stretches share time; touching ends do not. */
export const isOver = (one: Stretch, other: Stretch): boolean =>
  one.startMinute < other.endMinute && other.startMinute < one.endMinute;

/** Whether a person can be posted on a shift in one of some skills. */
export const isPostable = (
  person: ProblemPerson,
  { postSkillIds }: ProblemShift,
  skillIds: readonly string[],
): boolean =>
  person.skillIds.some((id) => skillIds.includes(id) && (postSkillIds?.includes(id) ?? true));

/** Whether an absence or a contract without Nights keeps a person off a shift. */
export const isBarred = (person: ProblemPerson, shift: ProblemShift): boolean =>
  (shift.isNight && !person.mayWorkNights) ||
  person.absences.some((absence) => isOver(absence, shift));
