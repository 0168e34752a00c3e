import type { ProblemPerson, ProblemShift, Wish } from '../problem';

/** Whether a shift is one that a wish names: the shift itself, or any of its day. */
const isMeant = (wish: Wish, shift: ProblemShift): boolean =>
  wish.shiftIndex === null ? wish.dayIndex === shift.dayIndex : wish.shiftIndex === shift.index;

/**
 * Wishes as costs. A wish not to work costs its price on each shift it names; a wish to work costs its
 * price in any case and gives it back on each shift it names. At most one shift starts on a day, so that
 * each wish counts once.
 */
export const wishCostOn = (person: ProblemPerson, shift: ProblemShift): number =>
  sumOver(person, shift, ({ priceCents }) => priceCents);

/** The part of the cost of wishes that stands before any shift is planned. */
export const wishCostBefore = (person: ProblemPerson): number =>
  person.wishes.reduce((sum, wish) => sum + (wish.wants === 'on' ? wish.priceCents : 0), 0);

/** How much one shift changes the number of wishes refused, in the same way. */
export const refusalsOn = (person: ProblemPerson, shift: ProblemShift): number =>
  sumOver(person, shift, () => 1);

/** Wishes that are refused while nothing is planned. */
export const refusalsBefore = (person: ProblemPerson): number =>
  person.wishes.filter(({ wants }) => wants === 'on').length;

/** Prices of the wishes that these shifts of a person leave refused. */
export const refusedPrices = (person: ProblemPerson, shifts: readonly ProblemShift[]): number =>
  shifts.reduce((sum, shift) => sum + wishCostOn(person, shift), wishCostBefore(person));

function sumOver(
  person: ProblemPerson,
  shift: ProblemShift,
  weigh: (wish: Wish) => number,
): number {
  let sum = 0;
  for (const wish of person.wishes) {
    if (isMeant(wish, shift)) sum += wish.wants === 'off' ? weigh(wish) : -weigh(wish);
  }
  return sum;
}
