import { buildRosterModel, readRoster } from '../model';
import type { PlannedRoster, Problem } from '../problem';
import { explainClash } from './explain-clash';
import type { LinearSolver } from './highs-adapter';
import type { PersonClash } from './roster-outcome';

/** Every rule but the floors is about one person alone, so each person can be tested alone, exactly. */
export type AloneOutcome =
  | { readonly kind: 'lawful'; readonly roster: PlannedRoster }
  | { readonly kind: 'impossible'; readonly clashes: readonly PersonClash[] }
  /** Stopped, or out of time, before everybody was tested. */
  | { readonly kind: 'unfinished' };

/**
 * Finds for each person the cheapest lawful line of shifts, floors left aside. Together the lines are a
 * first lawful roster; a person without any has clashing rules of their own and is named.
 */
export function solveAlone(
  solve: LinearSolver,
  problem: Problem,
  remainingSeconds: () => number,
): AloneOutcome {
  const roster: PlannedRoster[] = [];
  const clashes: PersonClash[] = [];
  for (const person of problem.people) {
    const alone: Problem = { ...problem, people: [person], floors: [] };
    const model = buildRosterModel(alone);
    const outcome = solve(model.linear, 'cost', { limitSeconds: remainingSeconds() });
    switch (outcome.kind) {
      case 'optimal':
      case 'good-enough':
        roster.push(readRoster(model, outcome.solution.values));
        break;
      case 'infeasible':
        clashes.push({ personId: person.id, sentence: explainClash(solve, alone, person) });
        break;
      case 'failed':
      case 'unbounded':
        throw new Error(`The rules of one person could not be tested: ${outcome.kind}.`);
      default:
        return { kind: 'unfinished' };
    }
  }
  return clashes.length > 0
    ? { kind: 'impossible', clashes }
    : { kind: 'lawful', roster: roster.flat() };
}
