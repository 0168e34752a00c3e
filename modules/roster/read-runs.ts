import { type Actor, canInTeam } from '../access';
import { requireTeam } from '../access/server';
import { asksPerson, type PlannedRoster, type Problem } from '../problem';
import type { KnotsAnswer } from '../solver';
import { type Outcome, ok, type RunId, type SkillId, type TeamId } from '../units';
import { findActiveRun } from './active-runs';
import { periodDays } from './axis';
import { axisMinutesOf, coverLanes, type Duty } from './cover-lanes';
import { eventWithoutPay, withoutPay } from './hide-pay';
import type { KnotsView } from './knot-views';
import { requireRun } from './require';
import { ruleLines } from './rule-lines';
import { shortageLines } from './shortage-lines';
import { listRunEvents, listRunsOf, readRunDocuments } from './store';
import { summariseRun } from './summarise-run';
import type { CoverLane, RunSummary, RunView } from './views';
import { canCompareWays } from './work-out-ways';

/** The runs of a team, newest first. */
export function listRuns(actor: Actor, teamId: TeamId): Outcome<RunSummary[]> {
  const team = requireTeam(actor, 'rosters.read', teamId);
  if (!team.ok) return team;
  const maySeePay = canInTeam(actor, 'pay.read', team.value);
  return ok(listRunsOf(teamId).map((run) => summariseRun(run, maySeePay)));
}

/**
 * Everything the run page draws: figures so far, and of the best roster its cover and proof. Of a
 * failed run no cover is drawn; a proof it has tells why it was refused.
 */
export function readRun(actor: Actor, runId: RunId): Outcome<RunView> {
  const found = requireRun(actor, 'rosters.read', runId);
  if (!found.ok) return found;
  const { run, team } = found.value;
  const maySeePay = canInTeam(actor, 'pay.read', team);
  const { problem, roster, knots } = readRunDocuments(runId);
  const days = periodDays(run.startsOn, run.endsOn, team.zone);
  const isFailed = run.state === 'failed';
  const duties = dutiesOf(problem, isFailed ? [] : (roster ?? []));
  const axisMinutes = axisMinutesOf(problem.floors, duties, days.at(-1)?.endMinute ?? 0);
  const skillIds = problem.skills.map(({ id }) => id as SkillId);
  const lanes = coverLanes(problem.floors, duties, skillIds, axisMinutes);
  const events = listRunEvents(runId, 0);
  const mayWrite = canInTeam(actor, 'rosters.write', team);
  const isActive = findActiveRun(runId) !== null;
  return ok({
    ...summariseRun(run, maySeePay),
    currency: problem.currency,
    events: maySeePay ? events : events.map(eventWithoutPay),
    peopleCount: problem.people.length,
    dayCount: problem.days.length,
    bySkill: lanes.map((lane) => coverOf(lane, problem)),
    lanes,
    axisMinutes,
    proof: run.proof && !maySeePay ? withoutPay(run.proof) : run.proof,
    shortageLines: run.proof && !isFailed ? shortageLines(problem, run.proof.shortages) : [],
    rules: ruleLines(problem),
    knots: knots && knotsView(knots),
    isLookingForKnots: run.state !== 'running' && isActive,
    mayWorkOut: mayWrite && canCompareWays(run, roster),
    mayStop: mayWrite && (run.state === 'running' || isActive),
  });
}

const knotsView = ({ knots, isComplete }: KnotsAnswer): KnotsView => ({
  knots: knots.map(({ sentence, members, words, isMinimal }) => ({
    sentence,
    isMinimal,
    members: members.map((member, index) => ({
      words: words[index] ?? '',
      asksPerson: asksPerson(member),
    })),
  })),
  isComplete,
});

/** Who is on duty when, on the time axis of the problem. */
function dutiesOf(problem: Problem, roster: PlannedRoster): Duty[] {
  const skillsOf = new Map(problem.people.map(({ id, skillIds }) => [id, skillIds]));
  return roster.flatMap(({ personId, shiftIndex, postSkillId }) => {
    const shift = problem.shifts[shiftIndex];
    if (!shift) return [];
    const { startMinute, endMinute } = shift;
    return [{ startMinute, endMinute, postSkillId, skillIds: skillsOf.get(personId) ?? [] }];
  });
}

function coverOf({ skillId, slots }: CoverLane, problem: Problem): RunView['bySkill'][number] {
  const name = problem.skills.find(({ id }) => id === skillId)?.name ?? 'Anybody';
  let neededMinutes = 0;
  let missingMinutes = 0;
  for (const { startMinute, endMinute, need, have } of slots) {
    neededMinutes += need * (endMinute - startMinute);
    missingMinutes += Math.max(0, need - have) * (endMinute - startMinute);
  }
  return { skillId, name, neededMinutes, missingMinutes };
}
