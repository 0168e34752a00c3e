import { type Actor, canInTeam } from '../access';
import { type Outcome, ok, type RunId } from '../units';
import { findActiveRun } from './active-runs';
import { eventWithoutPay } from './hide-pay';
import { requireRun } from './require';
import { findRun, listRunEvents } from './store';
import { summariseRun } from './summarise-run';
import type { RunEvent, RunSummary } from './views';

/** Who is told what a run reports. */
export interface RunFollower {
  readonly onEvent: (event: RunEvent) => void;
  /** Called once, last. */
  readonly onEnd: (summary: RunSummary) => void;
}

/**
 * Tells a follower every report of a run after a sequence number (0: from the start), those to come
 * included, and its end; for a run that has ended, all at once. Returns what stops the telling.
 */
export function followRun(
  actor: Actor,
  runId: RunId,
  after: number,
  follower: RunFollower,
): Outcome<() => void> {
  const found = requireRun(actor, 'rosters.read', runId);
  if (!found.ok) return found;
  const { run, team } = found.value;
  const maySeePay = canInTeam(actor, 'pay.read', team);
  const tell = (event: RunEvent) => follower.onEvent(maySeePay ? event : eventWithoutPay(event));
  const end = () => follower.onEnd(summariseRun(findRun(runId) ?? run, maySeePay));
  for (const event of listRunEvents(runId, after)) tell(event);
  const active = findActiveRun(runId);
  if (!active) {
    end();
    return ok(() => {});
  }
  active.feed.on('report', tell);
  active.feed.once('end', end);
  return ok(() => {
    active.feed.off('report', tell);
    active.feed.off('end', end);
  });
}
