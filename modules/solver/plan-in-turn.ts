import {
  buildRosterModel,
  openFloors,
  placeRoster,
  type RosterModel,
  readRoster,
  withBlend,
} from '../model';
import type { PlannedRoster, Problem, ProblemPerson } from '../problem';
import { explainClash } from './explain-clash';
import type { LinearSolver } from './linear-solver';
import type { PersonClash } from './roster-outcome';

/** Every rule but the floors is about one person alone, so each person can be tested alone, exactly. */
export type TurnsOutcome =
  | { readonly kind: 'lawful'; readonly roster: PlannedRoster }
  | { readonly kind: 'impossible'; readonly clashes: readonly PersonClash[] }
  /** Stopped, or out of time, before everybody was planned. */
  | { readonly kind: 'unfinished' };

/** Cents a missing minute counts for: far more than any minute of work costs. */
const centsPerMissingMinute = 10_000;

/**
 * Plans one person after the other, each at best for the floors that those before leave open. The
 * result is a lawful roster, a start for the search; a person without any lawful line of shifts has
 * clashing rules of their own and is named.
 */
export function planInTurn(
  solve: LinearSolver,
  model: RosterModel,
  remainingSeconds: () => number,
): TurnsOutcome {
  const { problem } = model;
  const roster: PlannedRoster[] = [];
  const clashes: PersonClash[] = [];
  for (const person of problem.people) {
    const floors = openFloors(model, placeRoster(model, roster.flat()));
    const alone = buildRosterModel(planOf(problem, person, floors));
    const linear = withBlend(alone.linear, 'turn', ['shortage', centsPerMissingMinute, 'cost']);
    const outcome = solve(linear, 'turn', { limitSeconds: remainingSeconds(), targetGap: turnGap });
    switch (outcome.kind) {
      case 'optimal':
      case 'good-enough':
        roster.push(readRoster(alone, outcome.solution.values));
        break;
      case 'infeasible':
        clashes.push({ personId: person.id, sentence: explainClash(solve, alone.problem, person) });
        break;
      case 'out-of-time':
      case 'interrupted':
        return { kind: 'unfinished' };
      default:
        throw new Error(`The rules of one person could not be tested: ${outcome.kind}.`);
    }
  }
  return clashes.length > 0
    ? { kind: 'impossible', clashes }
    : { kind: 'lawful', roster: roster.flat() };
}

/** A start need not be the best of its kind. */
const turnGap = 0.01;

/** The problem of one person, with the open floors they can help with. */
function planOf(problem: Problem, person: ProblemPerson, floors: Problem['floors']): Problem {
  return {
    ...problem,
    people: [person],
    floors: floors.filter(({ skillId }) => skillId === null || person.skillIds.includes(skillId)),
  };
}
