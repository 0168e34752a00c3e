import { inTransaction } from '../../db/client';
import { now } from '../../db/clock';
import { env } from '../../db/env';
import type { Actor, TeamInfo } from '../access';
import { recordAudit } from '../access/server';
import type { Problem } from '../problem';
import { formatDay, type Outcome, ok, type RosterId, type RunId, refuse } from '../units';
import { newId } from '../units/server';
import { activate } from './active-runs';
import { conductRun } from './conduct-run';
import { gatherProblem } from './gather-problem';
import { matchShifts } from './match-shifts';
import { requireRoster } from './require';
import type { StartRunInput } from './roster-input';
import { findRun, findRunningRun, getNewestVersion, insertRun, listShifts } from './store';
import type { Roster, Run } from './stored';
import { summariseRun } from './summarise-run';
import { readTeamWords } from './team-words';
import type { RunSummary } from './views';

/**
 * Starts a run of a roster and returns at once; it is computed beside everything else. Refused while
 * another run of the roster is on, and when there is nothing to compute.
 */
export function startRun(
  actor: Actor,
  rosterId: RosterId,
  { limitSeconds = env().RUN_SECONDS }: StartRunInput,
): Outcome<RunSummary> {
  const found = requireRoster(actor, 'rosters.write', rosterId);
  if (!found.ok) return found;
  const { roster, team } = found.value;
  const longest = env().RUN_SECONDS;
  if (limitSeconds > longest) {
    return refuse('invalid', 'The run would take longer than this server allows.', [
      { path: 'limitSeconds', message: `Write at most ${longest} seconds.` },
    ]);
  }
  const running = findRunningRun(rosterId);
  if (running) {
    return refuse(
      'conflict',
      `Run ${running.number} of this period is still on. Wait for it or stop it first.`,
    );
  }
  const { problem } = gatherProblem(team, roster);
  const obstacle = findObstacle(team, roster, problem);
  if (obstacle) return refuse('conflict', obstacle);
  const run = insertRunning(actor, roster, problem, limitSeconds);
  activate(run.id, (active) => conductRun(actor, run, problem, active));
  return ok(summariseRun(run, true));
}

/** What a run would lack, with the fix, or null. */
function findObstacle(team: TeamInfo, roster: Roster, problem: Problem): string | null {
  const period = `${formatDay(roster.startsOn)} to ${formatDay(roster.endsOn)}`;
  if (roster.closedAtUtc !== null) return 'This period is closed. Open a later one.';
  if (!problem.floors.some(({ people }) => people > 0)) {
    return `No floor asks for anybody from ${period}. Add floors, or let earlier ones continue, first.`;
  }
  if (problem.shifts.length === 0) return 'There are no shift kinds. Add at least one first.';
  if (problem.people.length === 0) {
    return `Nobody in ${team.name} has a contract and a valid skill from ${period}. Add people first.`;
  }
  const words = readTeamWords(team.id);
  const pinned = listShifts(getNewestVersion(roster.id).id).filter(({ isPinned }) => isPinned);
  const [stale] = matchShifts(problem, pinned, {
    person: words.person,
    kind: (id) => words.kind(id).name,
  }).breaches;
  return stale ? `A pin does not fit any more: ${stale.sentence}` : null;
}

function insertRunning(actor: Actor, roster: Roster, problem: Problem, limitSeconds: number): Run {
  const id = newId('run');
  return inTransaction(() => {
    insertRun({
      id,
      rosterId: roster.id,
      limitSeconds,
      startedAtUtc: now(),
      startedBy: actor.userId,
      problem,
    });
    recordAudit({
      actor,
      teamId: roster.teamId,
      action: 'run.start',
      subjectId: id,
      detail: { rosterId: roster.id, limitSeconds },
    });
    return getRun(id);
  });
}

function getRun(id: RunId): Run {
  const run = findRun(id);
  if (!run) throw new Error(`No run ${id}`);
  return run;
}
