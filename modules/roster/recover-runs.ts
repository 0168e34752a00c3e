import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import { log } from '../../db/log';
import { proveRoster } from '../proof';
import { findActiveRun } from './active-runs';
import { endRun, listRunningRuns, readRunDocuments } from './store';
import type { Run } from './stored';

/**
 * Marks runs that a crash or restart cut off as interrupted; to be called at start-up. The best roster
 * found stays with the run, re-checked; the draft is as it was before the run. Returns how many.
 */
export function recoverInterruptedRuns(): number {
  const lost = listRunningRuns().filter(({ id }) => !findActiveRun(id));
  for (const run of lost) interrupt(run);
  return lost.length;
}

function interrupt(run: Run): void {
  const { problem, roster } = readRunDocuments(run.id);
  const kept = roster
    ? 'The best roster found until then is shown with this run.'
    : 'No roster had been found yet.';
  inTransaction(() => {
    endRun(run.id, {
      state: 'interrupted',
      endedAtUtc: now(),
      proof: roster && proveRoster(problem, roster),
      failure: `The server stopped while this run was on. ${kept} The draft is unchanged; run again.`,
    });
  });
  log().warn({ runId: run.id, hasRoster: roster !== null }, 'run was interrupted');
}
