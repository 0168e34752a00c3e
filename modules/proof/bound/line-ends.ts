import type { Problem, ProblemPerson } from '../../problem';
import { shareCost } from '../prove-fairness';
import { timePay } from '../prove-pay';
import { countOf, type LineCounter, type LineCounters } from './line-counters';

/**
 * What the sums of a line cost at its end, by the number that holds its counters: pay for time at a price
 * of pay, and the person's share terms of fairness. null when the least hours are not reached.
 */
export function endCosts(
  problem: Problem,
  person: ProblemPerson,
  payWorth: number,
  { list, minuteStep, leastMinutes }: LineCounters,
): (counted: number) => number | null {
  const counterOf = (kind: LineCounter['kind']) => list.find((counter) => counter.kind === kind);
  const minutes = counterOf('minutes');
  const counters = { nights: counterOf('nights'), weekends: counterOf('weekends') };
  const shares = person.isOutside ? [] : problem.fairness.filter((term) => term.kind === 'share');
  const payOf = new Map<number, number>();
  return (counted) => {
    const worked = minutes ? countOf(minutes, counted) * minuteStep : 0;
    if (worked < leastMinutes) return null;
    const pay = payOf.get(worked) ?? timePay(problem, person, worked);
    payOf.set(worked, pay);
    return shares.reduce(
      (sum, term) => {
        const counter = counters[term.measure];
        return sum + (counter ? shareCost(term, countOf(counter, counted)) : 0);
      },
      (1 - payWorth) * pay,
    );
  };
}
