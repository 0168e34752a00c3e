import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import { env } from '../../db/env';
import { log } from '../../db/log';
import type { Actor } from '../access';
import { recordAudit, requireTeam } from '../access/server';
import { listFloors, listShiftKinds } from '../coverage/server';
import { listSkills } from '../people/server';
import type { SizingAnswer, SizingProblem } from '../problem';
import type { SizingOutcome } from '../solver';
import { solveSizing } from '../solver/server';
import { assertNever, type Outcome, ok, refuse, type TeamId } from '../units';
import { newId } from '../units/server';
import { expandLines } from './expand-lines';
import { findDisagreement } from './find-disagreement';
import type { Sizing } from './sizing';
import type { SizingInput } from './sizing-input';
import { insertSizing } from './store';

/**
 * Sizes a team: expands the table against its floors and shift kinds, solves in a worker thread, has
 * the answer re-checked by code that shares nothing with the model, and stores it. `invalid` names the
 * fields that do not fit; `failed` when the two disagree, and then nothing is stored.
 */
export async function sizeTeam(
  actor: Actor,
  teamId: TeamId,
  input: SizingInput,
): Promise<Outcome<Sizing>> {
  const team = requireTeam(actor, 'sizing.run', teamId);
  if (!team.ok) return team;
  const problem = expandLines(input, {
    floors: listFloors(teamId),
    kinds: listShiftKinds(teamId),
    skills: listSkills(teamId),
  });
  if (!problem.ok) return problem;
  const outcome = await solveSizing(problem.value, { limitSeconds: env().RUN_SECONDS });
  const answer = takeAnswer(teamId, problem.value, outcome);
  if (!answer.ok) return answer;
  return inTransaction(() => {
    const sizing: Sizing = {
      id: newId('siz'),
      askedAtUtc: now(),
      input,
      problem: problem.value,
      answer: answer.value,
    };
    insertSizing(teamId, actor.userId, sizing);
    const { objective, shortageMinutes } = answer.value;
    const detail = { measure: input.objective, objective, shortageMinutes };
    recordAudit({ actor, teamId, action: 'sizing.run', subjectId: sizing.id, detail });
    return ok(sizing);
  });
}

/** The answer of the solver once its re-check agrees; what went wrong is logged with its cause. */
function takeAnswer(
  teamId: TeamId,
  problem: SizingProblem,
  outcome: SizingOutcome,
): Outcome<SizingAnswer> {
  switch (outcome.kind) {
    case 'answered': {
      const disagreement = findDisagreement(problem, outcome.answer);
      if (!disagreement) return ok(outcome.answer);
      log().error({ teamId, disagreement, problem, outcome }, 'a sizing failed its re-check');
      return refuse(
        'failed',
        'The answer was not confirmed by the separate re-check, so nothing was stored. Tell whoever runs this server.',
      );
    }
    case 'out-of-time':
    case 'stopped':
      return refuse('failed', 'No answer was found in time. Try again with fewer patterns.');
    case 'failed':
      log().error({ teamId, err: outcome.cause, problem }, 'a sizing broke off');
      return refuse('failed', 'The computation broke off, nothing was stored. Try again.');
    default:
      return assertNever(outcome);
  }
}
