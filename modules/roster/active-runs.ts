import { EventEmitter } from 'node:events';
import { log } from '../../db/log';
import type { RunId } from '../units';
import type { RunEvent } from './views';

/** A run that this process is computing. */
export interface ActiveRun {
  /** Aborting it asks the solver to stop and to hand over its best roster. */
  readonly stop: AbortController;
  /** `report` carries each stored RunEvent, `end` nothing. */
  readonly feed: EventEmitter<{ report: [RunEvent]; end: [] }>;
  /** Settles when the run has been stored, never rejects. */
  done: Promise<void>;
}

/** Kept on globalThis: pages, routes and start-up are separate bundles of one process. */
const shared = globalThis as typeof globalThis & { floorwrightRuns?: Map<RunId, ActiveRun> };

function activeRuns(): Map<RunId, ActiveRun> {
  shared.floorwrightRuns ??= new Map();
  return shared.floorwrightRuns;
}

export const findActiveRun = (runId: RunId): ActiveRun | null => activeRuns().get(runId) ?? null;

/** Does the work of a run beside everything else and tells followers when it has ended. */
export function activate(runId: RunId, work: (active: ActiveRun) => Promise<void>): void {
  const active: ActiveRun = {
    stop: new AbortController(),
    feed: new EventEmitter(),
    done: Promise.resolve(),
  };
  active.feed.setMaxListeners(0);
  activeRuns().set(runId, active);
  active.done = work(active)
    .catch((cause) => log().error({ err: cause, runId }, 'run could not be stored'))
    .finally(() => {
      activeRuns().delete(runId);
      active.feed.emit('end');
    });
}

/** Waits until a run of this process has been stored; returns at once for any other. */
export async function waitForRun(runId: RunId): Promise<void> {
  await findActiveRun(runId)?.done;
}
