import type { PlannedRoster, ProblemFloor } from '../problem';
import { payFor } from '../units';
import { centsPerMinute, overtimeOf, premiumPay, timePay } from './pay';
import type { RosterModel } from './roster-model';
import type { FloorRow, ShortColumn } from './rows/floor-rows';
import type { WorkColumn } from './work-columns';

/** The solver's 0 and 1 carry small errors: above this a column counts as 1. */
const onThreshold = 0.5;

/** The planned shifts in a solution, in the order of people and time. */
export function readRoster(
  { problem, works }: RosterModel,
  values: ArrayLike<number>,
): PlannedRoster {
  return works.flatMap(({ columns }) =>
    columns
      .filter(({ column }) => (values[column] ?? 0) > onThreshold)
      .map(({ personIndex, shift, postSkillId }) => ({
        personId: problem.people[personIndex]?.id ?? '',
        shiftIndex: shift.index,
        postSkillId,
      })),
  );
}

/**
 * The work columns of a roster set to 1, all others 0. Where the model lacks the post, another post on
 * the same shift takes its place; a shift the person cannot work is left out.
 */
export function placeRoster(
  { problem, works, linear }: RosterModel,
  roster: PlannedRoster,
): Float64Array {
  const values = new Float64Array(linear.columnNames.length);
  const workOf = new Map(problem.people.map(({ id }, index) => [id, works[index]?.columns ?? []]));
  for (const { personId, shiftIndex, postSkillId } of roster) {
    const onShift = (workOf.get(personId) ?? []).filter(({ shift }) => shift.index === shiftIndex);
    const chosen = onShift.find((work) => work.postSkillId === postSkillId) ?? onShift[0];
    if (chosen) values[chosen.column] = 1;
  }
  return values;
}

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
 * The full point of the model that belongs to the shifts of a solution: every other column at its
 * least. Used as a start for the next solve.
 */
export function completeValues(model: RosterModel, values: ArrayLike<number>): Float64Array {
  const whole = new Float64Array(model.linear.columnNames.length);
  for (const { columns } of model.works) {
    for (const work of columns) whole[work.column] = isOn(work, values) ? 1 : 0;
  }
  for (const { column, days } of model.weekends) {
    whole[column] = days.flat().some((work) => isOn(work, values)) ? 1 : 0;
  }
  model.works.forEach(({ person, columns, personIndex }) => {
    const column = model.overtimes[personIndex];
    if (column != null) whole[column] = overtimeOf(person, workedMinutes(columns, values));
  });
  for (const floor of model.floors) {
    for (const [short, missing] of missingIn(floor, values)) whole[short.column] = missing;
  }
  return whole;
}

/**
 * What a roster leaves open, as floors of their own: with them the rest of the people can be planned
 * around it.
 */
export function openFloors(model: RosterModel, values: ArrayLike<number>): ProblemFloor[] {
  return model.floors.flatMap((floor) => {
    const { skillId, counting, startMinute, endMinute } = floor;
    return missingIn(floor, values)
      .filter(([, people]) => people > 0)
      .map(([{ priceCentsPerHour }, people]) => ({
        floorId: 'open',
        dayIndex: 0,
        startMinute,
        endMinute,
        skillId,
        people,
        counting,
        priceCentsPerHour,
      }));
  });
}

/**
 * How far the objective `cost` of the model can lie from the whole cents of `weighRoster`: half a cent
 * for each sum that is rounded once and whose cents a minute do not always come out whole.
 */
export function roundingSlackCents(model: RosterModel): number {
  const { problem } = model;
  const step = problem.shifts.reduce(
    (sum, { paidMinutes }) => greatestDivisor(sum, paidMinutes),
    0,
  );
  const isWhole = (centsPerHour: number, minutes: number, percent = 100) =>
    Number.isInteger(centsPerMinute(centsPerHour, percent) * minutes);
  const sums = problem.people.flatMap((person) => {
    const minutes = [person.contractMinutes, person.creditMinutes].reduce(greatestDivisor, step);
    const overtime = isWhole(person.payCentsPerHour, minutes, problem.pay.overtimePercent);
    return person.paidBy === 'contract'
      ? [overtime]
      : [overtime, isWhole(person.payCentsPerHour, greatestDivisor(step, person.creditMinutes))];
  });
  const prices = model.floors.flatMap(({ startMinute, endMinute, shorts }) =>
    shorts.map((short) => [short.priceCentsPerHour ?? 0, endMinute - startMinute] as const),
  );
  const broken = prices.filter(([price, minutes]) => !isWhole(price, minutes));
  const brokenPrices = new Set(broken.map(([price]) => price)).size;
  return (sums.filter((whole) => !whole).length + brokenPrices) / 2;
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

const workedMinutes = (columns: readonly WorkColumn[], values: ArrayLike<number>): number =>
  columns.reduce((sum, work) => sum + (isOn(work, values) ? work.shift.paidMinutes : 0), 0);

const isOn = ({ column }: WorkColumn, values: ArrayLike<number>): boolean =>
  (values[column] ?? 0) > onThreshold;

/** How many people each short column of a floor row must stand for. */
function missingIn(floor: FloorRow, values: ArrayLike<number>): [ShortColumn, number][] {
  const cover = floor.covering.filter((work) => isOn(work, values)).length;
  let missing = Math.max(0, floor.people - cover);
  return floor.shorts.map((short) => {
    const here = Math.min(missing, short.people);
    missing -= here;
    return [short, here];
  });
}
