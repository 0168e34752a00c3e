import { findNewestRunEvent } from './store';
import type { Run } from './stored';
import type { RunSummary } from './views';

/**
 * The line of one run. While it runs, and when it ended without a proof, its figures are those it
 * reported last; a failed run has none, since nobody may lean on them. Money is left out for those who
 * may not see pay.
 */
export function summariseRun(run: Run, maySeePay: boolean): RunSummary {
  const { teamId: _teamId, startedBy: _startedBy, proof: stored, ...summary } = run;
  const isFailed = run.state === 'failed';
  const proof = isFailed ? null : stored;
  const reported = isFailed || proof ? null : findNewestRunEvent(run.id);
  return {
    ...summary,
    bestCostCents: maySeePay ? (proof?.costCents ?? reported?.bestCostCents ?? null) : null,
    boundCents: maySeePay ? (run.boundCents ?? reported?.boundCents ?? null) : null,
    shortageMinutes: proof?.shortageMinutes ?? reported?.shortageMinutes ?? null,
    shortageBoundMinutes: run.shortageBoundMinutes ?? reported?.shortageBoundMinutes ?? null,
  };
}
