import { log } from '../../db/log';
import type { Problem } from '../problem';
import type { Proof } from '../proof';
import type { JobEnd, RosterOutcome, SolvedRoster } from '../solver';
import { runInThread } from '../solver/server';
import type { BoundAnswer, BoundJob } from './bound-worker';
import { judgeBound } from './judge-bound';
import type { Verdict } from './judge-outcome';

/** Seconds of a thread; reckoning four weeks of a large team takes a few. */
const limitSeconds = 30;

/**
 * Has the bound of a roster that was judged sound reckoned anew by separate code, in a thread, before the
 * roster is adopted. A bound that cannot be trusted refuses the run; one that there was no time to check
 * says so in the proof.
 */
export async function recheckBound(
  problem: Problem,
  outcome: RosterOutcome,
  verdict: Verdict,
  stop: AbortSignal,
): Promise<Verdict> {
  const found = solvedOf(outcome);
  if (verdict.kind !== 'adopt' || !found) return verdict;
  const end = await reckon(problem, found, verdict.proof, stop);
  if (end?.kind === 'broken') log().error({ err: end.cause }, 're-check of a bound broke off');
  const { bound, doubt } = judgeBound(found, verdict.proof, end, problem.currency);
  const proof = { ...verdict.proof, bound };
  if (doubt) return { kind: 'refuse', sentence: doubt, roster: verdict.roster, proof };
  const boundCents = Math.max(verdict.boundCents, bound.recheckedCents ?? verdict.boundCents);
  return { ...verdict, proof, boundCents };
}

function reckon(
  problem: Problem,
  { boundRecord }: SolvedRoster,
  proof: Proof,
  stop: AbortSignal,
): Promise<JobEnd<BoundAnswer>> | null {
  if (!boundRecord) return null;
  const { shortageByPriority, surplusMinutes } = proof;
  const job: BoundJob = {
    problem,
    record: boundRecord,
    figures: { shortageByPriority, surplusMinutes },
  };
  return runInThread<BoundAnswer>('bound', job, { limitSeconds, stop });
}

/** The roster of an answer, if it has one. */
export function solvedOf(outcome: RosterOutcome): SolvedRoster | null {
  switch (outcome.kind) {
    case 'optimal':
    case 'good-enough':
    case 'out-of-time':
      return outcome;
    case 'stopped':
      return outcome.best;
    default:
      return null;
  }
}
