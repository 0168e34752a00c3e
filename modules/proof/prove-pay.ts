import type { Problem, ProblemPerson, ProblemShift } from '../problem';
import { workedMinutes } from './check-hours';
import type { Duty, Subject } from './duties';
import { quotientHalfUp } from './quotient';

/** Pay of a roster in whole cents, without any other price. */
export interface PayFinding {
  readonly contractPayCents: number;
  readonly premiumPayCents: number;
  readonly overtimePayCents: number;
  readonly overtimeMinutes: number;
}

/**
 * Pay of everybody. Ordinary: the contract's minutes, or of people paid by the hour the worked and
 * credited minutes up to the contract. Overtime: worked and credited minutes beyond the contract, by
 * steps. Rounded half up to a whole cent, once each: a person's ordinary pay, a person's pay of one
 * overtime step, each premium of a shift.
 */
export function provePay({ problem, duties, dutiesOf }: Subject): PayFinding {
  const sum = (amounts: readonly number[]): number =>
    amounts.reduce((total, amount) => total + amount, 0);
  const worked = problem.people.map((person) => ({
    person,
    minutes: workedMinutes(dutiesOf(person)),
  }));
  return {
    contractPayCents: sum(worked.map(({ person, minutes }) => ordinaryPay(person, minutes))),
    premiumPayCents: sum(duties.map(({ person, shift }) => premiumPay(problem, person, shift))),
    overtimePayCents: sum(
      worked.map(({ person, minutes }) => overtimePay(problem, person, minutes)),
    ),
    overtimeMinutes: sum(problem.people.map((person) => overtimeMinutes(person, dutiesOf(person)))),
  };
}

/** Worked and credited minutes beyond the contract. */
export const overtimeMinutes = (person: ProblemPerson, duties: readonly Duty[]): number =>
  overtimeOf(person, workedMinutes(duties));

const overtimeOf = (person: ProblemPerson, worked: number): number =>
  Math.max(0, worked + person.creditMinutes - person.contractMinutes);

/** Pay of a person who works so many paid minutes, premiums left out. */
export const timePay = (problem: Problem, person: ProblemPerson, worked: number): number =>
  ordinaryPay(person, worked) + overtimePay(problem, person, worked);

function ordinaryPay(person: ProblemPerson, worked: number): number {
  const minutes =
    person.paidBy === 'contract'
      ? person.contractMinutes
      : Math.min(worked + person.creditMinutes, person.contractMinutes);
  return pay(person.payCentsPerHour, minutes, 100);
}

function overtimePay({ pay: rules }: Problem, person: ProblemPerson, worked: number): number {
  const overtime = overtimeOf(person, worked);
  return rules.overtimeSteps.reduce((cents, { overMinutes, percent }, index) => {
    const until = rules.overtimeSteps[index + 1]?.overMinutes ?? overtime;
    const minutes = Math.max(0, Math.min(overtime, until) - overMinutes);
    return cents + pay(person.payCentsPerHour, minutes, percent);
  }, 0);
}

/** Night, weekend and holiday premiums of a person on a shift; they add up. */
export function premiumPay(problem: Problem, person: ProblemPerson, shift: ProblemShift): number {
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
