import { type Actor, canInTeam } from '../access';
import { buildRosterModel, withRowBounds, writeLp } from '../model';
import { type Outcome, ok, type RunId, refuse } from '../units';
import { requireRun } from './require';
import { findNewestRunEvent, readRunDocuments } from './store';

/** A text file and the name it is saved under. */
export interface TextFile {
  readonly fileName: string;
  readonly text: string;
}

/**
 * The model of a run's stage two in the CPLEX LP format, so that any solver can check the run: least
 * cost with the shortage at most what the run found. It holds pay.
 */
export function readRunModel(actor: Actor, runId: RunId): Outcome<TextFile> {
  const found = requireRun(actor, 'rosters.read', runId);
  if (!found.ok) return found;
  const { run, team } = found.value;
  if (!canInTeam(actor, 'pay.read', team)) {
    return refuse('not-allowed', 'The model holds pay, which your role does not show.');
  }
  const shortageMinutes =
    run.proof?.shortageMinutes ?? findNewestRunEvent(runId)?.shortageMinutes ?? null;
  if (shortageMinutes === null) {
    return refuse('conflict', 'This run found no roster, so that there is no stage two to write.');
  }
  const { linear, shortageRow } = buildRosterModel(readRunDocuments(runId).problem);
  const model = withRowBounds(linear, shortageRow, Number.NEGATIVE_INFINITY, shortageMinutes);
  return ok({
    fileName: `roster-${run.startsOn}-run-${run.number}.lp`,
    text: writeLp(model, 'cost'),
  });
}
