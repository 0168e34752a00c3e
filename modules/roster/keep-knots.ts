import { log } from '../../db/log';
import type { Problem } from '../problem';
import type { RosterOutcome } from '../solver';
import { solveKnots } from '../solver/server';
import type { RunId } from '../units';
import type { Verdict } from './judge-outcome';
import { keepRunKnots } from './store';

/** One thread for at most so long: runs that wait for it lose no time of their own. */
const limitSeconds = 10;
/** Knots that counting does not show; more than a few nobody reads. */
const mostKnots = 3;

/**
 * Looks for what stands in the way of the floors when a run could not hold them all, and keeps it with the
 * run, whose roster is stored already. Does nothing once the run was stopped. Never rejects.
 */
export async function keepKnots(
  runId: RunId,
  problem: Problem,
  outcome: RosterOutcome,
  verdict: Verdict,
  stop: AbortSignal,
): Promise<void> {
  const shortAtMinutes = findShortMinutes(outcome, verdict);
  if (shortAtMinutes === null || stop.aborted) return;
  try {
    const options = { limitSeconds, mostKnots, shortAtMinutes, stop };
    const end = await solveKnots(problem, options);
    if (end.kind === 'failed') log().error({ err: end.cause, runId }, 'search for knots broke off');
    // Nothing found in the time is told as that.
    const nothing = { knots: [], isComplete: false };
    keepRunKnots(runId, end.kind === 'answered' ? end.answer : nothing);
  } catch (cause) {
    log().error({ err: cause, runId }, 'knots of a run could not be kept');
  }
}

/** Where the roster is short of firm floors; none of a problem without any roster; null: all hold. */
function findShortMinutes(outcome: RosterOutcome, verdict: Verdict): readonly number[] | null {
  if (outcome.kind === 'impossible') return [];
  if (verdict.kind !== 'adopt' || verdict.proof.shortageMinutes === 0) return null;
  return verdict.proof.shortages
    .filter(({ isFirm }) => isFirm)
    .map(({ startMinute }) => startMinute);
}
