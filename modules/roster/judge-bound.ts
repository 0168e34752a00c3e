import type { CheckedBound, Proof } from '../proof';
import type { JobEnd, SolvedRoster } from '../solver';
import { formatMoney } from '../units';
import type { BoundAnswer } from './bound-worker';

/** What the re-check of a bound says: `doubt` is why the run cannot be trusted, in one sentence, or null. */
export interface BoundVerdict {
  readonly bound: CheckedBound;
  readonly doubt: string | null;
}

type Found = Pick<SolvedRoster, 'boundCents' | 'recordedBoundCents'>;
type Judged = Pick<Proof, 'costCents' | 'shortageMinutes'>;

/**
 * Weighs the solver's bound against the one reckoned anew from its record. In doubt when the record is
 * none of this problem, when no roster could cost as little as this one does, and when the record gives
 * less than the solver says, by more than rounding. It may give more: the solver prices some rules less
 * closely, and with more missing minutes than the roster has in the end. `end`: null without a record.
 */
export function judgeBound(
  found: Found,
  proof: Judged,
  end: JobEnd<BoundAnswer> | null,
  currency: string,
): BoundVerdict {
  const solverCents = found.boundCents;
  if (end?.kind !== 'answered') {
    const sentence = uncheckedSentence(solverCents, end, currency);
    return { bound: { recheckedCents: null, solverCents, sentence }, doubt: null };
  }
  const { proof: answer, plainCents, roundingCents } = end.answer;
  if (answer.kind === 'refused') {
    return doubtful({ recheckedCents: null, solverCents }, answer.sentence);
  }
  const recheckedCents = Math.max(answer.boundCents, plainCents);
  const figures = { recheckedCents, solverCents };
  const finding = findDoubt(found, proof, answer.boundCents, end.answer);
  if (finding) return doubtful(figures, finding);
  const roster = proof.shortageMinutes === 0 ? 'No roster' : 'No roster as well covered';
  const source =
    answer.boundCents >= plainCents
      ? 'from the prices of the floors'
      : 'from the cheapest lawful plan of each person';
  const checked = `${roster} can cost less than ${money(recheckedCents, currency)}: reckoned anew ${source} by separate code.`;
  const raised = `The higher bound of ${money(solverCents, currency)} comes from the solver's search tree and was not reckoned anew.`;
  const isRaised = solverCents > recheckedCents + roundingCents;
  return {
    bound: { ...figures, sentence: isRaised ? `${checked} ${raised}` : checked },
    doubt: null,
  };
}

/** Why the figures contradict each other, in one sentence, or null. */
function findDoubt(
  { recordedBoundCents: recorded }: Found,
  { costCents }: Judged,
  byRecord: number,
  { plainCents, roundingCents }: BoundAnswer,
): string | null {
  const highest = Math.max(byRecord, plainCents);
  if (highest > costCents) {
    return `Reckoned anew it is ${highest}, above the cost of ${costCents} minor units.`;
  }
  if (recorded !== null && recorded > byRecord + roundingCents) {
    return `The solver reckons ${recorded} minor units from its record, the re-check ${byRecord}; rounding explains ${roundingCents} at most.`;
  }
  return null;
}

const doubtful = (figures: Omit<CheckedBound, 'sentence'>, finding: string): BoundVerdict => ({
  bound: { ...figures, sentence: finding },
  doubt: `The independent re-check refused the bound: ${finding} The draft is unchanged.`,
});

const money = (cents: number, currency: string): string => formatMoney(cents, currency, 'en-GB', 2);

function uncheckedSentence(
  solverCents: number,
  end: Exclude<JobEnd<BoundAnswer>, { kind: 'answered' }> | null,
  currency: string,
): string {
  const bound = `The bound of ${money(solverCents, currency)} was not re-checked`;
  if (end === null) return `${bound}: the solver kept no record of prices for it.`;
  if (end.kind === 'broken') return `${bound}: the re-check broke off.`;
  return end.wasStopped ? `${bound}: the run was stopped.` : `${bound}: the time for it ran out.`;
}
