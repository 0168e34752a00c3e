import { minutesInStep, overtimeOf } from './pay';
import { isOn, missingIn, workedMinutes } from './read-roster';
import type { RosterModel } from './roster-model';
import { measureAt } from './rows/measures';
import type { TeamRow } from './rows/team-rows';

/**
 * The full point of the model that belongs to the shifts of a solution: every other column at its least,
 * so that it is a solution when the shifts are lawful. Used as a start for the next solve.
 */
export function completeValues(model: RosterModel, values: ArrayLike<number>): Float64Array {
  const whole = new Float64Array(model.linear.columnNames.length);
  for (const { columns } of model.works) {
    for (const work of columns) whole[work.column] = isOn(work, values) ? 1 : 0;
  }
  completePeople(model, whole);
  for (const floor of model.floors) {
    for (const [short, missing] of missingIn(floor, whole)) whole[short.column] = missing;
  }
  for (const { excessColumn, covering, people } of model.ceilings) {
    const cover = covering.filter((work) => isOn(work, whole)).length;
    whole[excessColumn] = Math.max(0, cover - people);
  }
  for (const row of model.teamRows) {
    const { under, over } = distancesOf(row, whole);
    if (row.underColumn !== null) whole[row.underColumn] = under;
    if (row.overColumn !== null) whole[row.overColumn] = over;
  }
  completeFairness(model, whole);
  return whole;
}

/** How far the sum of a team row lies below its lower and above its upper bound. */
export function distancesOf(
  { entries, others, lower, upper }: TeamRow,
  values: ArrayLike<number>,
): { readonly under: number; readonly over: number } {
  let sum = 0;
  for (const { work, coefficient } of entries) if (isOn(work, values)) sum += coefficient;
  for (const [column, weight] of others) sum += weight * (values[column] ?? 0);
  return { under: Math.max(0, lower - sum), over: Math.max(0, sum - upper) };
}

function completePeople(model: RosterModel, whole: Float64Array): void {
  for (const { column, days } of model.weekends.flat()) {
    whole[column] = days.flat().some((work) => isOn(work, whole)) ? 1 : 0;
  }
  for (const { person, columns, personIndex } of model.works) {
    const minutes = overtimeOf(person, workedMinutes(columns, whole));
    for (const step of model.overtimes[personIndex] ?? []) {
      whole[step.column] = minutesInStep(step, minutes);
    }
  }
}

function completeFairness({ spreads, shares }: RosterModel, whole: Float64Array): void {
  for (const { mostColumn, leastColumn, people } of spreads) {
    const counts = people.map((measure) => measureAt(measure, whole));
    whole[mostColumn] = Math.max(...counts);
    whole[leastColumn] = Math.min(...counts);
  }
  for (const share of shares) {
    whole[share.column] = Math.max(0, measureAt(share, whole) - share.above);
  }
}
