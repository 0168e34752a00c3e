import type { Problem, ProblemPay, ProblemPerson, ProblemShift } from '../problem';
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

/** Pay that one shift brings by itself: premiums, and ordinary pay of people paid by hours. Not rounded. */
export const shiftPay = (problem: Problem, person: ProblemPerson, shift: ProblemShift): number =>
  premiumPay(problem, person, shift) +
  (person.paidBy === 'hours' ? centsFor(person.payCentsPerHour, shift.paidMinutes) : 0);

/**
 * Ordinary pay that is the same for every roster: the contract of people paid by contract, the credited
 * leave of people paid by hours, whose worked minutes stand on their shifts. Only the first is a sum by
 * itself, and rounded.
 */
export const constantPay = (person: ProblemPerson): number =>
  person.paidBy === 'contract'
    ? payFor(person.payCentsPerHour, person.contractMinutes)
    : centsFor(person.payCentsPerHour, person.creditMinutes);

/** Minutes beyond the contract: paid worked minutes and credited leave less contract minutes. */
export const overtimeOf = (person: ProblemPerson, workedMinutes: number): number =>
  Math.max(0, workedMinutes + person.creditMinutes - person.contractMinutes);

/** A part of somebody's overtime that is paid at one percentage. */
export interface OvertimeStep {
  readonly percent: number;
  /** Overtime minutes before this step, and at most in it. */
  readonly overMinutes: number;
  readonly mostMinutes: number;
}

/** The steps as stretches of overtime; the last one has no end. */
export const overtimeSteps = ({ overtimeSteps: steps }: ProblemPay): OvertimeStep[] =>
  steps.map(({ overMinutes, percent }, index) => ({
    percent,
    overMinutes,
    mostMinutes: (steps[index + 1]?.overMinutes ?? Number.POSITIVE_INFINITY) - overMinutes,
  }));

/** How many of some overtime minutes fall into a step. */
export const minutesInStep = (step: OvertimeStep, overtimeMinutes: number): number =>
  Math.min(step.mostMinutes, Math.max(0, overtimeMinutes - step.overMinutes));

/**
 * Ordinary pay and overtime pay in cents. Paid by contract: the contract in any case. Paid by hours:
 * the worked minutes and credited leave that are no overtime. Overtime is paid by steps. Ordinary pay
 * is rounded once for the whole period, overtime once for each step.
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
    overtime: overtimeSteps(pay).reduce(
      (sum, step) => sum + payFor(rate, minutesInStep(step, overtimeMinutes), step.percent),
      0,
    ),
  };
}

/** Cost of some minutes at a percentage of an hourly price, in cents and not rounded: a coefficient. */
export const centsFor = (centsPerHour: number, minutes: number, percent = 100): number =>
  (centsPerHour * minutes * percent) / 6000;
