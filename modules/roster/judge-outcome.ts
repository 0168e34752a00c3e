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
      readonly boundCents: number | null;
      readonly shortageBoundMinutes: number | null;
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
 * Judges a solver's answer by the independent re-check. A roster is taken only when it breaks no rule
 * and when its shortage and its cost are what the solver says: the shortage to the minute, the cost to
 * one cent a person, since pay is rounded once a person.
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
  const doubt = findDoubt(problem, found, proof);
  if (doubt) return { kind: 'refuse', sentence: doubt, roster, proof };
  return {
    kind: 'adopt',
    state: kind === 'stopped' ? 'stopped' : 'done',
    roster,
    proof,
    boundCents: boundCents === null ? null : Math.min(boundCents, proof.costCents),
    shortageBoundMinutes,
    isProvenOptimal: kind === 'optimal',
  };
}

/** Why a roster cannot be trusted, in one sentence, or null. */
function findDoubt(problem: Problem, found: SolvedRoster, proof: Proof): string | null {
  const [breach] = proof.breaches;
  if (breach) {
    const more = proof.breaches.length - 1;
    const others = more > 0 ? ` (and ${more} more)` : '';
    return unsound(`${breach.sentence}${others}`);
  }
  if (found.shortageMinutes !== proof.shortageMinutes) {
    return unsound(
      `The solver counts ${found.shortageMinutes} missing minutes, the re-check ${proof.shortageMinutes}.`,
    );
  }
  const wished = proof.shortages.filter(({ isFirm }) => !isFirm).length;
  const tolerance = problem.people.length + wished;
  if (Math.abs(found.costCents - proof.costCents) > tolerance) {
    return unsound(
      `The solver counts a cost of ${found.costCents} minor units, the re-check ${proof.costCents}.`,
    );
  }
  if (found.boundCents !== null && found.boundCents > proof.costCents + tolerance) {
    return unsound(
      `The solver's bound of ${found.boundCents} lies above the cost of ${proof.costCents} minor units.`,
    );
  }
  return null;
}

const unsound = (finding: string): string =>
  `The independent re-check refused the roster: ${finding} The draft is unchanged.`;

const refused = (sentence: string): Verdict => ({
  kind: 'refuse',
  sentence,
  roster: null,
  proof: null,
});
