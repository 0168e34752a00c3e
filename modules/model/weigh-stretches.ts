import type { ProblemFloor } from '../problem';
import { payFor } from '../units';
import { isOn } from './read-roster';
import type { RosterModel } from './roster-model';
import type { FloorRow } from './rows/floor-rows';
import type { Stretch } from './time-slices';

/**
 * Price of wished floors that are not held and of priced ceilings that are passed: person-minutes times
 * the price of an hour, rounded once for each floor or ceiling and each longest stretch over which the
 * same number of people is missing or too many.
 */
export function pricedStretches(model: RosterModel, whole: ArrayLike<number>): number {
  const stretches = new StretchSum();
  for (const row of model.floors) {
    for (const [floor, people] of wishedMissing(row, whole)) {
      stretches.add(floor, row, people, floor.priceCentsPerHour ?? 0);
    }
  }
  for (const ceiling of model.ceilings) {
    const price = ceiling.priceCentsPerHour;
    if (price === null) continue;
    const key = model.problem.ceilings[ceiling.ceilingIndex] ?? ceiling;
    stretches.add(key, ceiling, whole[ceiling.excessColumn] ?? 0, price);
  }
  return stretches.cents();
}

/** Stretches as they grow, slice by slice in the order of time. */
class StretchSum {
  readonly #open = new Map<object, { people: number; endMinute: number; minutes: number }>();
  readonly #prices = new Map<object, number>();
  #closedCents = 0;

  add(of: object, { startMinute, endMinute }: Stretch, people: number, price: number): void {
    const last = this.#open.get(of);
    this.#prices.set(of, price);
    if (last?.endMinute === startMinute && last.people === people) {
      last.minutes += endMinute - startMinute;
      last.endMinute = endMinute;
      return;
    }
    if (last) this.#closedCents += payFor(price, last.people * last.minutes);
    this.#open.set(of, { people, endMinute, minutes: endMinute - startMinute });
  }

  cents(): number {
    let sum = this.#closedCents;
    for (const [of, { people, minutes }] of this.#open) {
      sum += payFor(this.#prices.get(of) ?? 0, people * minutes);
    }
    return sum;
  }
}

/** What each wished floor of a slice lacks: firm floors are served first, then the dearest. */
function wishedMissing(row: FloorRow, whole: ArrayLike<number>): [ProblemFloor, number][] {
  const wished = row.floors.filter(({ priceCentsPerHour }) => priceCentsPerHour !== null);
  if (wished.length === 0) return [];
  const asked = wished.reduce((sum, { people }) => sum + people, 0);
  const cover = row.covering.filter((work) => isOn(work, whole)).length;
  let left = Math.max(0, cover - (row.people - asked));
  return wished
    .sort((one, other) => (other.priceCentsPerHour ?? 0) - (one.priceCentsPerHour ?? 0))
    .map((floor) => {
      const served = Math.min(floor.people, left);
      left -= served;
      return [floor, floor.people - served];
    });
}
