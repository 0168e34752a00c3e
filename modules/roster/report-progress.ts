import { log } from '../../db/log';
import type { RunId } from '../units';
import { findNewestRunEvent, insertRunEvent } from './store';
import type { RunEvent } from './views';

/** At most five reports a second are stored and sent; the newest of those held back follows. */
const leastMilliseconds = 200;

export interface ProgressReporter {
  readonly report: (event: Omit<RunEvent, 'sequence'>) => void;
  /** Stores what was held back; call it once, at the end. */
  readonly flush: () => void;
}

/** Stores the reports of a run with sequence numbers from 1 and hands each stored one on. */
export function reportProgress(
  runId: RunId,
  onStored: (event: RunEvent) => void,
): ProgressReporter {
  let sequence = findNewestRunEvent(runId)?.sequence ?? 0;
  let held: Omit<RunEvent, 'sequence'> | null = null;
  let timer: NodeJS.Timeout | null = null;
  const store = () => {
    if (!held) return;
    sequence += 1;
    const event = { ...held, sequence };
    held = null;
    try {
      insertRunEvent(runId, event);
      onStored(event);
    } catch (cause) {
      // A report that cannot be kept must not end the run, let alone the process from a timer.
      log().error({ err: cause, runId }, 'report of a run could not be stored');
    }
  };
  const later = () => {
    timer = null;
    if (!held) return;
    store();
    timer = setTimeout(later, leastMilliseconds);
  };
  return {
    report: (event) => {
      held = event;
      if (timer) return;
      store();
      timer = setTimeout(later, leastMilliseconds);
    },
    flush: () => {
      if (timer) clearTimeout(timer);
      store();
    },
  };
}
