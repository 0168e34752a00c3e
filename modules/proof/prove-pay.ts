import type { Problem, ProblemPerson } from '../problem';
import { workedMinutes } from './check-hours';
import type { Duty, Subject } from './duties';
import { quotientHalfUp } from './quotient';

/** Pay of a roster in whole cents, without the price of wished floors. */
export interface PayFinding {
  readonly contractPayCents: number;
  readonly premiumPayCents: number;
  readonly overtimePayCents: number;
  readonly overtimeMinutes: number;
}

/**
 * Pay of everybody. Ordinary: the contract's minutes, or of people paid by the hour the worked and
 * credited minutes up to the contract. Overtime: worked and credited minutes beyond the contract, at
 * the overtime percentage. Each person's ordinary and overtime pay is rounded once, each premium of
 * each shift once, half up to a whole cent.
 */
export function provePay({ problem, duties, dutiesOf }: Subject): PayFinding {
  const sum = (amounts: readonly number[]): number =>
    amounts.reduce((total, amount) => total + amount, 0);
  const overtime = problem.people.map((person) => ({
    rate: person.payCentsPerHour,
    minutes: overtimeMinutes(person, dutiesOf(person)),
  }));
  return {
    contractPayCents: sum(problem.people.map((person) => ordinaryPay(person, dutiesOf(person)))),
    premiumPayCents: sum(duties.map((duty) => premiumPay(problem, duty))),
    overtimePayCents: sum(
      overtime.map(({ rate, minutes }) => pay(rate, minutes, problem.pay.overtimePercent)),
    ),
    overtimeMinutes: sum(overtime.map(({ minutes }) => minutes)),
  };
}

/** Worked and credited minutes beyond the contract. */
export const overtimeMinutes = (person: ProblemPerson, duties: readonly Duty[]): number =>
  Math.max(0, workedMinutes(duties) + person.creditMinutes - person.contractMinutes);

function ordinaryPay(person: ProblemPerson, duties: readonly Duty[]): number {
  const counted = workedMinutes(duties) + person.creditMinutes;
  const minutes =
    person.paidBy === 'contract'
      ? person.contractMinutes
      : Math.min(counted, person.contractMinutes);
  return pay(person.payCentsPerHour, minutes, 100);
}

function premiumPay(problem: Problem, { person, shift }: Duty): number {
  const rate = person.payCentsPerHour;
  return (
    pay(rate, shift.nightMinutes, problem.pay.nightPercent) +
    pay(rate, shift.weekendMinutes, problem.pay.weekendPercent) +
    pay(rate, shift.holidayMinutes, problem.pay.holidayPercent)
  );
}

/** In whole numbers throughout: cents per hour x minutes x percent / (60 x 100). */
const pay = (centsPerHour: number, minutes: number, percent: number): number =>
  quotientHalfUp(BigInt(centsPerHour) * BigInt(minutes) * BigInt(percent), 6000n);
