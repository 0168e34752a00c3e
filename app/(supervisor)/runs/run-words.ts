import { dateRange } from '@/app/_ui/clock';
import type { RunState, RunView } from '@/modules/roster';

export const runStateWords: Record<RunState, string> = {
  running: 'running',
  done: 'done',
  stopped: 'stopped, best kept',
  failed: 'failed',
  interrupted: 'cut off by a restart',
};

/** The title of a run's sheet: what it does or what came of it. */
export function runVerdict(run: RunView): string {
  const period = dateRange(run.startsOn, run.endsOn);
  switch (run.state) {
    case 'running':
      return `Run ${run.number} is making the roster of ${period}`;
    case 'done':
    case 'stopped':
      return run.proof
        ? `Run ${run.number}, ${period}: ${coverVerdict(run)}`
        : `Run ${run.number} was stopped`;
    case 'failed':
      return `Run ${run.number} found no roster to keep`;
    case 'interrupted':
      return `Run ${run.number} was cut off`;
  }
}

function coverVerdict({ shortageMinutes, shortageBoundMinutes }: RunView): string {
  if (shortageMinutes === 0) return 'every floor holds';
  const isLeast = shortageMinutes !== null && shortageBoundMinutes === shortageMinutes;
  return isLeast ? 'the floors cannot all be held' : 'some floors are not held';
}

/** The line below the title: what the reader can do or should know. */
export function runLead(run: RunView): string {
  switch (run.state) {
    case 'running':
      return 'You can leave this page. The run goes on, and the best roster so far is always kept.';
    case 'done':
    case 'stopped':
      return run.proof
        ? `Re-checked by separate code: ${run.proof.breaches.length} problems. The roster stands in the draft.`
        : (run.failure ?? 'Nothing was found before it was stopped. The draft is unchanged.');
    case 'failed':
      return run.failure ?? 'The draft is unchanged.';
    case 'interrupted':
      return 'The server was restarted while it ran. The draft is unchanged; run again.';
  }
}

/** The verdict of stage one. */
export function stageOneVerdict(run: RunView): string {
  const { shortageMinutes, shortageBoundMinutes } = run;
  if (shortageMinutes === 0) return 'Yes, every one.';
  if (shortageMinutes === null) return run.state === 'running' ? 'Looking…' : 'Not found out.';
  const isLeast = shortageBoundMinutes === shortageMinutes;
  if (isLeast) return 'No. This is the least that must stay short.';
  return run.state === 'running' ? 'Not yet.' : 'Time ran out: less may be possible.';
}
