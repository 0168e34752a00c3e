import type { PlannedRoster, Problem } from '../problem';
import { type Proof, proveRoster } from '../proof';
import type { RosterOutcome, SolvedRoster } from '../solver';
import { assertNever } from '../units';

/** What becomes of a solver's answer. */
export type Verdict =
  | {
      readonly kind: 'adopt';
      readonly state: 'done' | 'stopped';
      readonly roster: PlannedRoster;
      readonly proof: Proof;
      readonly boundCents: number;
      readonly shortageBoundMinutes: number;
      readonly isProvenOptimal: boolean;
    }
  | { readonly kind: 'nothing-found'; readonly sentence: string }
  | {
      readonly kind: 'refuse';
      readonly sentence: string;
      readonly roster: PlannedRoster | null;
      readonly proof: Proof | null;
    };

/**
 * Judges a solver's answer by the independent re-check. A roster is taken only when it breaks no rule,
 * rules that join people included, and when every figure is what the solver says: shortage and surplus to
 * the minute, the cost to the cent. Both round the same sums half up (a person's ordinary pay and pay of
 * an overtime step, a premium of a shift, a longest stretch of one wished floor or priced ceiling), so
 * that there is no rounding in which they may differ. The bound is whole cents and never above the cost.
 */
export function judgeOutcome(problem: Problem, outcome: RosterOutcome): Verdict {
  switch (outcome.kind) {
    case 'optimal':
    case 'good-enough':
    case 'out-of-time':
      return judgeRoster(problem, outcome, outcome.kind);
    case 'stopped':
      return outcome.best
        ? judgeRoster(problem, outcome.best, outcome.kind)
        : {
            kind: 'nothing-found',
            sentence: 'Stopped before a first roster was found. The draft is unchanged.',
          };
    case 'impossible':
      return refused(outcome.clashes.map(({ sentence }) => sentence).join(' '));
    case 'failed':
      return refused(`The computation failed: ${outcome.message} The draft is unchanged.`);
    default:
      return assertNever(outcome);
  }
}

function judgeRoster(problem: Problem, found: SolvedRoster, kind: RosterOutcome['kind']): Verdict {
  const { roster, boundCents, shortageBoundMinutes } = found;
  const proof = proveRoster(problem, roster);
  const doubt = findDoubt(found, proof);
  if (doubt) return { kind: 'refuse', sentence: doubt, roster, proof };
  return {
    kind: 'adopt',
    state: kind === 'stopped' ? 'stopped' : 'done',
    roster,
    proof,
    boundCents,
    shortageBoundMinutes,
    isProvenOptimal: kind === 'optimal',
  };
}

/** Why a roster cannot be trusted, in one sentence, or null. */
function findDoubt(found: SolvedRoster, proof: Proof): string | null {
  const [breach] = proof.breaches;
  if (breach) {
    const more = proof.breaches.length - 1;
    const others = more > 0 ? ` (and ${more} more)` : '';
    return unsound(`${breach.sentenceWithoutPay ?? breach.sentence}${others}`);
  }
  const difference = comparisons(found, proof).find(({ claimed, proven }) => claimed !== proven);
  if (difference) return unsound(difference.sentence);
  if (found.boundCents > proof.costCents) {
    return unsound(
      `The solver's bound of ${found.boundCents} lies above the cost of ${proof.costCents} minor units.`,
    );
  }
  return null;
}

interface Comparison {
  readonly claimed: number;
  readonly proven: number;
  readonly sentence: string;
}

/** Every figure that the solver gives, beside the one of the re-check. */
function comparisons(found: SolvedRoster, proof: Proof): Comparison[] {
  const compare = (claimed: number, proven: number, what: string): Comparison => ({
    claimed,
    proven,
    sentence: `The solver counts ${claimed} ${what}, the re-check ${proven}.`,
  });
  const priorities = proof.shortageByPriority;
  const others = found.levels.slice(0, found.levels.length - priorities.length);
  const shortages = found.levels.slice(others.length);
  return [
    // Levels in which nothing can be wrong are left out by the solver; units of broken rules are none here.
    compare(sumOf(others), proof.teamRuleUnits + proof.surplusMinutes, 'minutes above ceilings'),
    ...priorities.map(({ priority, minutes }, index) =>
      compare(shortages[index] ?? 0, minutes, `missing minutes of priority ${priority}`),
    ),
    compare(found.shortageMinutes, proof.shortageMinutes, 'missing minutes'),
    compare(found.costCents, proof.costCents, 'minor units of cost'),
  ];
}

const sumOf = (values: readonly number[]): number =>
  values.reduce((total, value) => total + value, 0);

const unsound = (finding: string): string =>
  `The independent re-check refused the roster: ${finding} The draft is unchanged.`;

const refused = (sentence: string): Verdict => ({
  kind: 'refuse',
  sentence,
  roster: null,
  proof: null,
});
