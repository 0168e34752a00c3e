import { payFor } from '../units';
import { premiumPay, timePay } from './pay';
import { isOn, missingIn, workedMinutes } from './read-roster';
import type { RosterModel } from './roster-model';

/** What a roster costs and lacks, in whole cents and minutes, from its shifts alone. */
export interface RosterFigures {
  readonly shortageMinutes: number;
  readonly costCents: number;
}

/** Reckons a solution anew from its shifts, without the errors of the solver's arithmetic. */
export function weighRoster(model: RosterModel, values: ArrayLike<number>): RosterFigures {
  const wishedMinutes = new Map<number, number>();
  let shortageMinutes = 0;
  for (const floor of model.floors) {
    for (const [short, missing] of missingIn(floor, values)) {
      const minutes = missing * (floor.endMinute - floor.startMinute);
      const price = short.priceCentsPerHour;
      if (price === null) shortageMinutes += minutes;
      else wishedMinutes.set(price, (wishedMinutes.get(price) ?? 0) + minutes);
    }
  }
  const wished = [...wishedMinutes].reduce(
    (sum, [price, minutes]) => sum + payFor(price, minutes),
    0,
  );
  return { shortageMinutes, costCents: payOf(model, values) + wished };
}

/**
 * How far the objective `cost` of the model can lie from the whole cents of `weighRoster`: half a cent
 * for each sum that is rounded once and whose cents a minute do not always come out whole.
 */
export function roundingSlackCents(model: RosterModel): number {
  const { problem } = model;
  const step = problem.shifts.map(({ paidMinutes }) => paidMinutes).reduce(greatestDivisor, 0);
  const isWhole = (centsPerHour: number, minutes: number, percent = 100) =>
    (centsPerHour * minutes * percent) % 6000 === 0;
  const sums = problem.people.flatMap((person) => {
    const minutes = [person.contractMinutes, person.creditMinutes].reduce(greatestDivisor, step);
    const overtime = isWhole(person.payCentsPerHour, minutes, problem.pay.overtimePercent);
    return person.paidBy === 'contract'
      ? [overtime]
      : [overtime, isWhole(person.payCentsPerHour, minutes)];
  });
  const prices = model.floors.flatMap(({ startMinute, endMinute, shorts }) =>
    shorts.map((short) => [short.priceCentsPerHour ?? 0, endMinute - startMinute] as const),
  );
  const broken = prices.filter(([price, minutes]) => !isWhole(price, minutes));
  const brokenPrices = new Set(broken.map(([price]) => price)).size;
  return (sums.filter((whole) => !whole).length + brokenPrices) / 2;
}

/** The shortage of any roster is a multiple of so many minutes; 1 without firm floors. */
export function shortageStepMinutes(model: RosterModel): number {
  const lengths = model.floors
    .filter(({ shorts }) => shorts.some(({ priceCentsPerHour }) => priceCentsPerHour === null))
    .map(({ startMinute, endMinute }) => endMinute - startMinute);
  return lengths.reduce(greatestDivisor, 0) || 1;
}

function greatestDivisor(one: number, other: number): number {
  return other === 0 ? Math.abs(one) : greatestDivisor(other, one % other);
}

function payOf({ problem, works }: RosterModel, values: ArrayLike<number>): number {
  return works.reduce((sum, { person, columns }) => {
    const on = columns.filter((work) => isOn(work, values));
    const premiums = on.reduce((cents, { shift }) => cents + premiumPay(problem, person, shift), 0);
    const { ordinary, overtime } = timePay(problem, person, workedMinutes(columns, values));
    return sum + premiums + ordinary + overtime;
  }, 0);
}
