import type { Problem } from '../../problem';

/**
 * The part of a problem that decides whether floors can be held: without what is only wished or priced, and
 * without the cost of anything; pay stays where a firm budget counts it.
 */
export function firmPart(problem: Problem): Problem {
  const hasBudget = problem.teamRules.some(
    ({ kind, priceCents }) => kind === 'budget' && priceCents === null,
  );
  return {
    ...problem,
    floors: problem.floors
      .filter(({ priceCentsPerHour, people }) => priceCentsPerHour === null && people > 0)
      .map((floor) => ({ ...floor, priority: 1 })),
    ceilings: problem.ceilings.filter(({ priceCentsPerHour }) => priceCentsPerHour === null),
    teamRules: problem.teamRules.filter(({ priceCents }) => priceCents === null),
    people: problem.people.map((person) => ({
      ...person,
      wishes: [],
      paidBy: hasBudget ? person.paidBy : 'hours',
    })),
    fairness: [],
    pay: hasBudget ? problem.pay : { ...problem.pay, overtimeSteps: unpricedOvertime },
  };
}

/** With everybody paid by hours: overtime costs nothing more and needs no columns. */
const unpricedOvertime = [{ overMinutes: 0, percent: 100 }];
