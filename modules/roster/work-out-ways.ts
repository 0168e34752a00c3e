import { log } from '../../db/log';
import { type Actor, canInTeam } from '../access';
import type { PlannedRoster, Problem } from '../problem';
import type { Proof } from '../proof';
import type { Knot, WayOut } from '../solver';
import { solveWaysOut } from '../solver/server';
import { assertNever, type Outcome, ok, type RunId, refuse } from '../units';
import type { WayOutView } from './knot-views';
import { requireRun } from './require';
import type { WaysOutInput } from './roster-input';
import { readRunDocuments } from './store';
import type { Run } from './stored';
import { changeOf } from './way-words';

/** Seconds of a thread, shared by all ways that are tried. */
const limitSeconds = 60;
const mostWays = 6;

interface Question {
  readonly problem: Problem;
  readonly knot: Knot;
  readonly roster: PlannedRoster;
  readonly proof: Proof;
}

/**
 * Works out what loosening the members of one knot of a run would do to shortage and cost, each way solved
 * anew against the run's roster. Changes nothing and chooses none; limits with a law behind them are never
 * tried. `stop` ends it: what was worked out until then is answered.
 */
export async function workOutWays(
  actor: Actor,
  runId: RunId,
  input: WaysOutInput,
  stop: AbortSignal,
): Promise<Outcome<WayOutView[]>> {
  const found = requireRun(actor, 'rosters.write', runId);
  if (!found.ok) return found;
  const { run, team } = found.value;
  const question = readQuestion(run, input);
  if (!question.ok) return question;
  const { problem, knot, roster, proof } = question.value;
  const { shortageMinutes, costCents } = proof;
  const today = { roster, shortageMinutes, costCents };
  const options = { limitSeconds, today, mostWays, triesLawBased: false, stop };
  const end = await solveWaysOut(problem, knot.members, options);
  switch (end.kind) {
    case 'answered': {
      const maySeePay = canInTeam(actor, 'pay.read', team);
      return ok(end.answer.map((way) => viewOf(problem, way, maySeePay)));
    }
    case 'ended':
      return refuse('conflict', 'The time was over before a way out was worked out. Try again.');
    case 'failed':
      log().error({ err: end.cause, runId }, 'ways out broke off');
      return refuse('failed', `No way out was worked out: ${end.message}`);
    default:
      return assertNever(end);
  }
}

/** Ways out are measured against the roster of a run that was taken over. */
export const canCompareWays = (
  { state, proof }: Pick<Run, 'state' | 'proof'>,
  roster: PlannedRoster | null,
): boolean => (state === 'done' || state === 'stopped') && proof !== null && roster !== null;

function readQuestion(run: Run, input: WaysOutInput): Outcome<Question> {
  const { problem, roster, knots } = readRunDocuments(run.id);
  const knot = knots?.knots[input.knot];
  if (!knot) return refuse('not-found', 'This run has no such knot. Load the page again.');
  const { proof } = run;
  if (!roster || !proof || !canCompareWays(run, roster)) {
    return refuse(
      'conflict',
      'This run has no roster to measure ways out against. Change one of the members and run again.',
    );
  }
  return ok({ problem, knot, roster, proof });
}

function viewOf(
  problem: Problem,
  { changes, words, size, undoesKnot, effect }: WayOut,
  maySeePay: boolean,
): WayOutView {
  return {
    changes: changes.map((change, index) => changeOf(problem, change, words[index] ?? '', size)),
    undoesKnot,
    effect: effect && {
      shortageChangeMinutes: effect.shortageChangeMinutes,
      costChangeCents: maySeePay ? effect.costChangeCents : null,
      isProven: effect.isProven,
    },
  };
}
