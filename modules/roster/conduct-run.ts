import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import { log } from '../../db/log';
import type { Actor } from '../access';
import { recordAudit } from '../access/server';
import type { PlannedRoster, Problem } from '../problem';
import type { Proof } from '../proof';
import type { RosterOutcome } from '../solver';
import { solveRoster } from '../solver/server';
import { assertNever } from '../units';
import type { ActiveRun } from './active-runs';
import { adoptRoster, findLostPin } from './adopt-roster';
import { findLawfulPlan } from './find-lawful-plan';
import { judgeOutcome, type Verdict } from './judge-outcome';
import { keepKnots } from './keep-knots';
import { recheckBound } from './recheck-bound';
import { reportProgress } from './report-progress';
import { endRun, keepRunRoster } from './store';
import type { Run } from './stored';

/**
 * Computes a run to its end, stores what comes of it and, when floors are not held, why. Never rejects:
 * what breaks ends the run as failed.
 */
export async function conductRun(
  actor: Actor,
  run: Run,
  problem: Problem,
  active: ActiveRun,
): Promise<void> {
  const stop = active.stop.signal;
  const reporter = reportProgress(run.id, (event) => active.feed.emit('report', event));
  try {
    const outcome = await solveRoster(problem, {
      limitSeconds: run.limitSeconds,
      start: findLawfulPlan(run.rosterId, problem),
      stop,
      onProgress: reporter.report,
      onRoster: (roster) => keepBest(run, roster),
    });
    reporter.flush();
    const verdict = await recheckBound(problem, outcome, judgeOutcome(problem, outcome), stop);
    settleRun(actor, run, problem, outcome, verdict);
    await keepKnots(run.id, problem, outcome, verdict, stop);
  } catch (cause) {
    log().error({ err: cause, runId: run.id }, 'run broke off');
    reporter.flush();
    failRun(run, 'The computation broke off. The draft is unchanged; run again.');
  }
}

/** Called from the solver's messages, where nobody would catch what is thrown. */
function keepBest(run: Run, roster: PlannedRoster): void {
  try {
    keepRunRoster(run.id, roster);
  } catch (cause) {
    log().error({ err: cause, runId: run.id }, 'best roster of a run could not be stored');
  }
}

function settleRun(
  actor: Actor,
  run: Run,
  problem: Problem,
  outcome: RosterOutcome,
  verdict: Verdict,
): void {
  switch (verdict.kind) {
    case 'adopt':
      settleAdopted(actor, run, problem, verdict);
      return;
    case 'nothing-found':
      endRun(run.id, { state: 'stopped', endedAtUtc: now(), failure: verdict.sentence });
      return;
    case 'refuse':
      if (verdict.proof) logDisagreement(run, outcome, verdict);
      else log().warn({ runId: run.id, err: causeOf(outcome) }, verdict.sentence);
      failRun(run, verdict.sentence, verdict.proof);
      return;
    default:
      assertNever(verdict);
  }
}

const causeOf = (outcome: RosterOutcome): unknown =>
  outcome.kind === 'failed' ? outcome.cause : undefined;

function settleAdopted(
  actor: Actor,
  run: Run,
  problem: Problem,
  { kind: _kind, ...found }: Extract<Verdict, { kind: 'adopt' }>,
): void {
  inTransaction(() => {
    const lost = findLostPin(run.rosterId, run.teamId, problem, found.roster);
    if (lost) {
      failRun(run, lost, found.proof);
      return;
    }
    if (!endRun(run.id, { ...found, endedAtUtc: now() })) return;
    const version = adoptRoster(run.rosterId, run.id, problem, found.roster, found.proof);
    recordAudit({
      actor,
      teamId: run.teamId,
      action: 'roster.adopt',
      subjectId: run.rosterId,
      detail: { runId: run.id, version: version.number, shifts: found.roster.length },
    });
  });
}

/** Both sides go to the log: one of the two has a fault. */
function logDisagreement(
  run: Run,
  outcome: RosterOutcome,
  { sentence, proof }: Extract<Verdict, { kind: 'refuse' }>,
): void {
  log().error({ runId: run.id, outcome, proof }, sentence);
}

function failRun(run: Run, failure: string, proof: Proof | null = null): void {
  endRun(run.id, { state: 'failed', endedAtUtc: now(), failure, proof });
}
