export { waitForRun } from './active-runs';
export { confirmRoster } from './confirm-roster';
export { followRun, type RunFollower } from './follow-run';
export { openPeriod } from './open-period';
export { readOwnShifts } from './own-shifts';
export { publishRoster } from './publish-roster';
/* Reading for the use-cases of other modules, which decide who may see it: no permission check here. */
export { listPublishedPeriods, listPublishedShifts } from './published-shifts';
export { readBoard } from './read-board';
export { readOwnCalendar, readTeamCalendar } from './read-calendar';
export { readCalendarFrame } from './read-calendar-frame';
export { readFooting } from './read-footing';
export { listRosters, suggestNextStart } from './read-periods';
export { listRuns, readRun } from './read-runs';
export { recoverInterruptedRuns } from './recover-runs';
export { readRunModel, type TextFile } from './run-model';
export { startRun } from './start-run';
export { stopRun } from './stop-run';
export { readTeamWords, type TeamWords } from './team-words';
