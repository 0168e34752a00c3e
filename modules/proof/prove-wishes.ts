import type { ProblemPerson, Wish } from '../problem';
import type { Subject } from './duties';

/** Wishes that a roster does not grant, and what that weighs. */
export interface WishFinding {
  readonly refusedWishes: number;
  readonly refusedWishCents: number;
}

/** Goes through the wishes of everybody, outside cover included. */
export function proveWishes(subject: Subject): WishFinding {
  const refused = subject.problem.people.flatMap((person) => refusedWishes(subject, person));
  return {
    refusedWishes: refused.length,
    refusedWishCents: refused.reduce((sum, { priceCents }) => sum + priceCents, 0),
  };
}

/** The wishes of one person that the roster does not grant. */
export function refusedWishes({ dutiesOf }: Subject, person: ProblemPerson): Wish[] {
  const started = new Set(dutiesOf(person).map(({ shift }) => shift.index));
  const workedDays = new Set(dutiesOf(person).map(({ shift }) => shift.dayIndex));
  return person.wishes.filter(({ dayIndex, shiftIndex, wants }) => {
    const isOn = shiftIndex === null ? workedDays.has(dayIndex) : started.has(shiftIndex);
    return isOn === (wants === 'off');
  });
}
