import type { Problem, ProblemPerson, ProblemShift } from '../problem';
import { payFor } from '../units';

/**
 * Premiums of one person on one shift in cents: night, weekend and holiday minutes at their percentages
 * of the ordinary rate. They add up; each is rounded by itself.
 */
export function premiumPay({ pay }: Problem, person: ProblemPerson, shift: ProblemShift): number {
  const rate = person.payCentsPerHour;
  return (
    payFor(rate, shift.nightMinutes, pay.nightPercent) +
    payFor(rate, shift.weekendMinutes, pay.weekendPercent) +
    payFor(rate, shift.holidayMinutes, pay.holidayPercent)
  );
}

/** Minutes beyond the contract: paid worked minutes and credited leave less contract minutes. */
export const overtimeOf = (person: ProblemPerson, workedMinutes: number): number =>
  Math.max(0, workedMinutes + person.creditMinutes - person.contractMinutes);

/**
 * Ordinary pay and overtime pay in cents. Paid by contract: the contract in any case. Paid by hours:
 * the worked minutes and credited leave that are no overtime. Overtime is paid at its percentage of the
 * rate. Each of the two is rounded once for the whole period.
 */
export function timePay(
  { pay }: Problem,
  person: ProblemPerson,
  workedMinutes: number,
): { readonly ordinary: number; readonly overtime: number } {
  const rate = person.payCentsPerHour;
  const overtimeMinutes = overtimeOf(person, workedMinutes);
  const ordinaryMinutes =
    person.paidBy === 'contract'
      ? person.contractMinutes
      : workedMinutes + person.creditMinutes - overtimeMinutes;
  return {
    ordinary: payFor(rate, ordinaryMinutes),
    overtime: payFor(rate, overtimeMinutes, pay.overtimePercent),
  };
}

/** Cost of one minute more at a percentage of the rate, in cents and not rounded: a model coefficient. */
export const centsPerMinute = (centsPerHour: number, percent = 100): number =>
  (centsPerHour * percent) / 6000;
