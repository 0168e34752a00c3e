import { setTimeout as pause } from 'node:timers/promises';
import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import { type Actor, canInTeam } from '../access';
import { recordAudit } from '../access/server';
import { type Outcome, ok, type RunId, refuse } from '../units';
import { findActiveRun } from './active-runs';
import { requireRun } from './require';
import { endRun, findRun } from './store';
import { summariseRun } from './summarise-run';
import type { RunSummary } from './views';

/** How long the answer waits for the solver to hand over its best roster. */
const patienceMilliseconds = 10_000;

/**
 * Stops a run and keeps its best roster; once its roster is stored, the search for what stands in the
 * floors' way. Answers when that has ended, or after ten seconds with a run that is still stopping.
 */
export async function stopRun(actor: Actor, runId: RunId): Promise<Outcome<RunSummary>> {
  const found = requireRun(actor, 'rosters.write', runId);
  if (!found.ok) return found;
  const { run, team } = found.value;
  const active = findActiveRun(runId);
  if (run.state !== 'running' && !active) {
    return refuse('conflict', `Run ${run.number} has ended already; there is nothing to stop.`);
  }
  inTransaction(() => {
    const detail = { rosterId: run.rosterId };
    recordAudit({ actor, teamId: team.id, action: 'run.stop', subjectId: runId, detail });
  });
  if (active) {
    active.stop.abort();
    await Promise.race([active.done, pause(patienceMilliseconds, undefined, { ref: false })]);
  } else {
    const failure = 'No process was computing this run any more. Start another run.';
    endRun(runId, { state: 'interrupted', endedAtUtc: now(), failure });
  }
  return ok(summariseRun(findRun(runId) ?? run, canInTeam(actor, 'pay.read', team)));
}
