import { greatestDivisor } from './levels';
import { objectiveOf } from './linear-model';
import { overtimeSteps } from './pay';
import type { RosterModel } from './roster-model';

/**
 * How far the objective `cost` of the model can lie from the whole cents of `weighRoster`: half a cent
 * for each sum that is rounded once and whose cents a minute do not always come out whole.
 */
export function roundingSlackCents(model: RosterModel): number {
  const paySlack = paySlackCents(model);
  const wished = model.floors.flatMap((row) =>
    row.floors.map((floor) => [floor.priceCentsPerHour, row.endMinute - row.startMinute] as const),
  );
  const ceilings = model.ceilings.map(
    (row) => [row.priceCentsPerHour, row.endMinute - row.startMinute] as const,
  );
  const broken = [...wished, ...ceilings].filter(
    ([price, minutes]) => price !== null && !isWhole(price, minutes),
  );
  const budgets = model.teamRows.filter(({ kind }) => kind === 'budget');
  const budgetPrices = budgets.reduce((sum, { priceCents }) => sum + (priceCents ?? 0), 0);
  return paySlack * (1 + budgetPrices) + broken.length / 2;
}

/**
 * How far the value of a level in the model can lie from that of `weighRoster`, in the order of the
 * levels: 0 but for firm budgets, which are held against pay in whole cents.
 */
export function levelSlacks(model: RosterModel): number[] {
  const budgets = model.teamRows.filter(
    ({ kind, priceCents }) => kind === 'budget' && priceCents === null,
  ).length;
  const slack = budgets === 0 ? 0 : budgets * paySlackCents(model);
  return model.levels.map(({ name }) => (name === 'teamRules' ? slack : 0));
}

/** No roster costs less than this, in cents of the model: the constant, and the cheapest shift of each day. */
export function leastCostCents({ linear, works }: RosterModel): number {
  const { offset, costs } = objectiveOf(linear, 'cost');
  // Every other column costs 0 or more; of a spread, most and least together do.
  return works.reduce((sum, { byDay }) => {
    const cheapest = byDay.map((columns) =>
      columns.reduce((least, { column }) => Math.min(least, costs[column] ?? 0), 0),
    );
    return cheapest.reduce((total, cost) => total + cost, sum);
  }, offset);
}

function paySlackCents({ problem, works }: RosterModel): number {
  const step = problem.shifts.map(({ paidMinutes }) => paidMinutes).reduce(greatestDivisor, 0);
  const sums = works.flatMap(({ person }) => {
    const rate = person.payCentsPerHour;
    const minutes = [person.contractMinutes, person.creditMinutes].reduce(greatestDivisor, step);
    const overtimes = overtimeSteps(problem.pay).map(({ overMinutes, mostMinutes, percent }) => {
      const ends = Number.isFinite(mostMinutes) ? [overMinutes, mostMinutes] : [overMinutes];
      return isWhole(rate, ends.reduce(greatestDivisor, minutes), percent);
    });
    return person.paidBy === 'contract' ? overtimes : [...overtimes, isWhole(rate, minutes)];
  });
  return sums.filter((whole) => !whole).length / 2;
}

/** Whether any multiple of some minutes costs whole cents. */
const isWhole = (centsPerHour: number, minutes: number, percent = 100): boolean =>
  (centsPerHour * minutes * percent) % 6000 === 0;
