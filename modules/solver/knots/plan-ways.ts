import {
  asksPerson,
  describeRequirement,
  loosen,
  type Problem,
  type Requirement,
  requirementKey,
  requirementsOf,
  without,
} from '../../problem';
import type { AnalysisTools, TimeLeft } from '../analysis-tools';
import { firmPart } from './firm-part';
import type { WayOut } from './way-out';
import { isHoldable } from './whole-test';

/** A test of a knot alone is small. */
const testSeconds = 2;
/** Pairs are built of so many members at most. */
const mostPaired = 8;

/** A knot and the time to find ways out of it. */
export interface Trial {
  readonly tools: AnalysisTools;
  readonly time: TimeLeft;
  readonly problem: Problem;
  readonly members: readonly Requirement[];
}

/** A way out that has not been solved yet. */
export type Plan = Omit<WayOut, 'effect'>;

/** Single steps, whole floors, then pairs; those that undo the knot first. */
export function plansFor(trial: Trial, members: readonly Requirement[], most: number): Plan[] {
  const singles = members.slice(0, most).flatMap((member): Plan[] => {
    const step = planOf(trial, [member], 'step');
    const hasMore = member.kind === 'floor' || member.kind === 'ceiling';
    if (step.undoesKnot !== false || !hasMore) return [step];
    return [step, planOf(trial, [member], 'dropped')];
  });
  const isDone = singles.some(({ size, undoesKnot }) => size === 'step' && undoesKnot === true);
  const plans = isDone ? singles : [...singles, ...pairsOf(trial, members.slice(0, mostPaired))];
  const rank = ({ undoesKnot }: Plan) => (undoesKnot === true ? 0 : 1);
  return plans.toSorted((one, other) => rank(one) - rank(other)).slice(0, most);
}

/** Pairs of steps that undo the knot together. */
function pairsOf(trial: Trial, members: readonly Requirement[]): Plan[] {
  return members.flatMap((member, index) =>
    members
      .slice(index + 1)
      .map((other) => planOf(trial, [member, other], 'step'))
      .filter(({ undoesKnot }) => undoesKnot === true),
  );
}

function planOf(trial: Trial, changes: readonly Requirement[], size: WayOut['size']): Plan {
  return {
    changes,
    words: changes.map((change) => describeRequirement(trial.problem, change)),
    size,
    asksPerson: changes.some(asksPerson),
    undoesKnot: undoes(trial, changes, size),
  };
}

function undoes(
  { tools, time, problem, members }: Trial,
  changes: readonly Requirement[],
  size: WayOut['size'],
): boolean | null {
  const keys = new Set(members.map(requirementKey));
  const others = requirementsOf(problem).filter((one) => !keys.has(requirementKey(one)));
  const changed = firmPart(loosened(problem, { changes, size }));
  const limit = time.isOver() ? 0 : Math.min(testSeconds, time.seconds() / 4);
  const answer = isHoldable(tools, changed, others, limit);
  return answer === 'unknown' ? null : answer === 'yes';
}

/** The problem with the changes of a way out made; the app makes them so too. */
export const loosened = (
  problem: Problem,
  { changes, size }: Pick<WayOut, 'changes' | 'size'>,
): Problem => (size === 'dropped' ? without(problem, changes) : changes.reduce(loosen, problem));
