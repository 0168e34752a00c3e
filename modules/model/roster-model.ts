import type { Problem } from '../problem';
import { CoverIndex } from './cover-index';
import { addLevels, type Level } from './levels';
import type { LinearModel } from './linear-model';
import { ModelBuilder } from './model-builder';
import { constantPay } from './pay';
import { addCeilingRows, type CeilingRow } from './rows/ceiling-rows';
import { addFairnessRows, type FairnessRows, pricesWeekends } from './rows/fairness-rows';
import { addFloorRows, type FloorRow } from './rows/floor-rows';
import { addHoursRow, addOvertime, type OvertimeColumn } from './rows/hours-rows';
import { addFollowRows, addKindLimitRows } from './rows/kind-rows';
import { addNightRow } from './rows/night-rows';
import { addPinRows } from './rows/pin-rows';
import { addRestRows } from './rows/rest-rows';
import { addDayRunRows, addNightRunRows } from './rows/run-rows';
import { addShiftADayRows } from './rows/shift-a-day-rows';
import { addShortestFreeRows, addShortestRunRows } from './rows/shortest-run-rows';
import { addTeamRows, type TeamRow } from './rows/team-rows';
import { addWeekendRows, type WeekendColumn } from './rows/weekend-rows';
import { wishCostBefore } from './wishes';
import { addWorkColumns, type PersonWork } from './work-columns';

/** A problem as a linear model, with the way back from columns to people and time. */
export interface RosterModel extends FairnessRows {
  readonly problem: Problem;
  /** Objectives: one for each level, and `cost` in cents. */
  readonly linear: LinearModel;
  readonly works: readonly PersonWork[];
  readonly floors: readonly FloorRow[];
  readonly ceilings: readonly CeilingRow[];
  readonly teamRows: readonly TeamRow[];
  /** In the order in which they count; the cost comes last. */
  readonly levels: readonly Level[];
  /** By person; none where overtime costs nothing. */
  readonly overtimes: readonly (readonly OvertimeColumn[])[];
  /** By person; none where nothing counts weekends. */
  readonly weekends: readonly (readonly WeekendColumn[])[];
}

/**
 * Builds the whole model of a problem: who may work when, the rules of each person, floors, ceilings, team
 * rules and fairness. What joins people is elastic, so the model has a solution exactly when each person
 * alone has one.
 */
export function buildRosterModel(problem: Problem): RosterModel {
  const builder = new ModelBuilder(`Roster of ${problem.teamName} from ${problem.days[0]?.date}`, {
    cost: 'minimise',
  });
  explainNames(builder, problem);
  const works = addWorkColumns(builder, problem);
  const persons = works.map((work) => addPersonRows(builder, problem, work));
  const overtimes = persons.map(({ overtime }) => overtime);
  const weekends = persons.map((person) => person.weekends);
  const index = new CoverIndex(problem, works);
  const floors = addFloorRows(builder, problem, index);
  const ceilings = addCeilingRows(builder, problem, index);
  const teamRows = addTeamRows(builder, { problem, works, index, overtimes });
  const fairness = addFairnessRows(builder, problem, works, weekends);
  const levels = addLevels(builder, floors, ceilings, teamRows);
  return {
    problem,
    linear: builder.build(),
    works,
    floors,
    ceilings,
    teamRows,
    levels,
    overtimes,
    weekends,
    ...fairness,
  };
}

function addPersonRows(
  builder: ModelBuilder,
  problem: Problem,
  work: PersonWork,
): { overtime: OvertimeColumn[]; weekends: WeekendColumn[] } {
  const { person } = work;
  addShiftADayRows(builder, work);
  addRestRows(builder, problem, work);
  addFollowRows(builder, problem, work);
  addDayRunRows(builder, problem, work);
  addNightRunRows(builder, problem, work);
  addShortestRunRows(builder, problem, work);
  addShortestFreeRows(builder, problem, work);
  addNightRow(builder, problem, work);
  addKindLimitRows(builder, work);
  addPinRows(builder, work);
  addHoursRow(builder, work);
  builder.addOffset('cost', constantPay(person) + wishCostBefore(person));
  const isPriced = !person.isOutside && pricesWeekends(problem);
  return {
    overtime: addOvertime(builder, problem, work),
    weekends: addWeekendRows(builder, problem, work, isPriced),
  };
}

function explainNames(builder: ModelBuilder, problem: Problem): void {
  const { people, shifts, skills, days } = problem;
  builder.explain('Minutes count from the first midnight of the period. Money is in cents.');
  people.forEach(({ name }, index) => {
    builder.explain(`p${index} = ${name}`);
  });
  skills.forEach(({ name }, index) => {
    builder.explain(`k${index} = ${name}`);
  });
  shifts.forEach(({ index, kindName, dayIndex }) => {
    builder.explain(`s${index} = ${days[dayIndex]?.date} ${kindName}`);
  });
  problem.teamRules.forEach(({ name }, index) => {
    builder.explain(`team(${index}) = ${name}`);
  });
}
