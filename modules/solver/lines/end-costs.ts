import type { PersonLines } from '../../model';
import type { Problem } from '../../problem';

/**
 * What the end of a line costs beyond its shifts, in cents and not rounded: overtime by its steps and the
 * person's share terms of fairness. By end node.
 */
export function endCosts(problem: Problem, { person, net }: PersonLines): Float64Array {
  const ordinaryPercent = person.paidBy === 'contract' ? 0 : 100;
  const steps = problem.pay.overtimeSteps;
  const overtime = (minutes: number) => {
    const over = Math.max(0, minutes + person.creditMinutes - person.contractMinutes);
    return steps.reduce((cents, { overMinutes, percent }, index) => {
      const until = steps[index + 1]?.overMinutes ?? Number.POSITIVE_INFINITY;
      const here = Math.max(0, Math.min(over, until) - overMinutes);
      return cents + (person.payCentsPerHour * here * (percent - ordinaryPercent)) / 6000;
    }, 0);
  };
  const shares = problem.fairness.filter((term) => term.kind === 'share');
  return Float64Array.from(net.ends.minutes, (minutes, end) => {
    const counts = { nights: net.ends.nights[end] ?? 0, weekends: net.ends.weekends[end] ?? 0 };
    const share = person.isOutside
      ? 0
      : shares
          .flatMap(({ measure, steps: own }) => own.map((step) => ({ ...step, measure })))
          .reduce(
            (cents, { measure, above, priceCents }) =>
              cents + priceCents * Math.max(0, counts[measure] - above),
            0,
          );
    return overtime(minutes) + share;
  });
}
