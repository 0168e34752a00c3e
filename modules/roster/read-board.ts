import { isDeepStrictEqual } from 'node:util';
import { now } from '../../db/clock';
import { type Actor, canInTeam, type TeamInfo } from '../access';
import { listHolidays } from '../coverage/server';
import type { Problem } from '../problem';
import { addDays, type Outcome, ok, type RosterId, toInstant, toLocal, weekdayOf } from '../units';
import { periodDays } from './axis';
import { boardKinds, boardPeople, toCells } from './board-parts';
import { axisMinutesOf, coverLanes } from './cover-lanes';
import { gatherProblem } from './gather-problem';
import { withoutPay } from './hide-pay';
import { noticeWarningOf } from './notice';
import { proofOf } from './prove-version';
import { requireRoster } from './require';
import {
  findRun,
  findRunningRun,
  getNewestVersion,
  listShifts,
  listTeamShifts,
  readRunDocuments,
} from './store';
import type { Roster, Version } from './stored';
import { summariseRun } from './summarise-run';
import { readTeamWords } from './team-words';
import type { Board, RunSummary } from './views';

/** Days before the period whose shifts are drawn pale. */
const daysBefore = 3;

/** Everything the roster page draws, of the newest version. Readers without `rosters.write` may not edit. */
export function readBoard(actor: Actor, rosterId: RosterId): Outcome<Board> {
  const found = requireRoster(actor, 'rosters.read', rosterId);
  if (!found.ok) return found;
  const { roster, team } = found.value;
  const maySeePay = canInTeam(actor, 'pay.read', team);
  const version = getNewestVersion(rosterId);
  const { publishedAtUtc } = version;
  const today = toLocal(now(), team.zone).date;
  const { problem, notes } = gatherProblem(team, roster);
  const drawing = readDrawing(team, roster, version, problem);
  return ok({
    rosterId,
    teamId: team.id,
    teamName: team.name,
    organisationName: team.organisationName,
    startsOn: roster.startsOn,
    endsOn: roster.endsOn,
    zone: team.zone,
    currency: team.currency,
    today,
    dayStartsAtMinute: team.dayStartsAtMinute,
    version: {
      id: version.id,
      number: version.number,
      publishedAtUtc,
      publishedByName: version.publishedByName,
      confirmBy: version.confirmBy,
    },
    ...drawing,
    proof: drawing.proof && !maySeePay ? withoutPay(drawing.proof) : drawing.proof,
    mayEdit: canInTeam(actor, 'rosters.write', team),
    maySeePay,
    noticeWarning: publishedAtUtc === null ? noticeWarningOf(team, roster.startsOn, today) : null,
    activeRunId: findRunningRun(rosterId)?.id ?? null,
    notes,
    run: runOf(version, maySeePay),
    isRunCurrent: isRunCurrent(version, problem),
  });
}

function readDrawing(team: TeamInfo, roster: Roster, version: Version, problem: Problem) {
  const words = readTeamWords(team.id);
  const shifts = listShifts(version.id);
  const origin = toInstant(roster.startsOn, 0, team.zone);
  const proof = proofOf(version, shifts, words, () => problem);
  const cells = toCells(shifts, origin);
  const before = listTeamShifts(
    team.id,
    addDays(roster.startsOn, -daysBefore),
    addDays(roster.startsOn, -1),
    false,
  );
  const cellsBefore = toCells(before, origin);
  const days = readDays(team, roster);
  const people = boardPeople(roster, version, problem, proof, cells, words);
  const skillsOf = new Map(people.map(({ id, skillIds }) => [id, skillIds]));
  const duties = cells.map((cell) => ({ ...cell, skillIds: skillsOf.get(cell.personId) ?? [] }));
  const axisMinutes = axisMinutesOf(problem.floors, duties, days.at(-1)?.endMinute ?? 0);
  const skills = words.skills.map(({ id, name }) => ({ id, name }));
  return {
    days,
    skills,
    kinds: boardKinds(words, [...cells, ...cellsBefore]),
    people,
    cells,
    cellsBefore,
    lanes: coverLanes(
      problem.floors,
      duties,
      skills.map(({ id }) => id),
      axisMinutes,
    ),
    proof,
  };
}

function readDays(team: TeamInfo, { startsOn, endsOn }: Roster): Board['days'] {
  const names = new Map(
    listHolidays(team.id, startsOn, endsOn).map(({ date, name }) => [date, name]),
  );
  return periodDays(startsOn, endsOn, team.zone).map((day) => ({
    ...day,
    holidayName: names.get(day.date) ?? null,
    isWeekend: weekdayOf(day.date) >= 5,
  }));
}

function runOf(version: Version, maySeePay: boolean): RunSummary | null {
  const run = version.runId === null ? null : findRun(version.runId);
  return run && summariseRun(run, maySeePay);
}

/** Whether the run that made a version had the floors, people and rules of today; its bound holds for no others. */
function isRunCurrent({ runId }: Version, problem: Problem): boolean {
  return runId !== null && isDeepStrictEqual(readRunDocuments(runId).problem, problem);
}
