import { type Actor, canInTeam } from '../access';
import {
  buildRosterModel,
  type Level,
  type LinearModel,
  levelSlacks,
  type RosterModel,
  withRowBounds,
  writeLp,
  writeMps,
} from '../model';
import type { Proof } from '../proof';
import { type Outcome, ok, type RunId, refuse } from '../units';
import { requireRun } from './require';
import type { ModelFormat } from './roster-input';
import { findNewestRunEvent, readRunDocuments } from './store';

/** A text file and the name it is saved under. */
export interface TextFile {
  readonly fileName: string;
  readonly text: string;
}

const writers = { lp: writeLp, mps: writeMps };

/**
 * The model of a run's stage two in the CPLEX LP or the free MPS format, so that any solver can check
 * the run: least cost with the shortage at most what the run found. It holds pay.
 */
export function readRunModel(actor: Actor, runId: RunId, format: ModelFormat): Outcome<TextFile> {
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
  const model = buildRosterModel(readRunDocuments(runId).problem);
  return ok({
    fileName: `roster-${run.startsOn}-run-${run.number}.${format}`,
    text: writers[format](fixLevels(model, run.proof, shortageMinutes), 'cost'),
  });
}

/** The model with at most what the run reached on each level; before a proof only the shortage is known. */
function fixLevels(model: RosterModel, proof: Proof | null, shortageMinutes: number): LinearModel {
  const slacks = levelSlacks(model);
  return model.levels.reduce((fixed, level, index) => {
    const most = proof ? reachedBy(proof, level) : shortageMinutes;
    if (!proof && level.name !== 'shortage') return fixed;
    return withRowBounds(fixed, level.row, Number.NEGATIVE_INFINITY, most + (slacks[index] ?? 0));
  }, model.linear);
}

function reachedBy(proof: Proof, { name, priority }: Level): number {
  if (name === 'teamRules') return proof.teamRuleUnits;
  if (name === 'surplus') return proof.surplusMinutes;
  const own = proof.shortageByPriority.find((one) => one.priority === priority);
  return own?.minutes ?? proof.shortageMinutes;
}
