import type { Problem } from '../problem';
import type { LinearModel } from './linear-model';
import { ModelBuilder } from './model-builder';
import { addFloorRows, type FloorRow } from './rows/floor-rows';
import { addConstantPay, addHoursRow, addOvertime } from './rows/hours-rows';
import { addNightRow } from './rows/night-rows';
import { addPinRows } from './rows/pin-rows';
import { addRestRows } from './rows/rest-rows';
import { addDayRunRows, addNightRunRows } from './rows/run-rows';
import { addShiftADayRows } from './rows/shift-a-day-rows';
import { addWeekendRows, type WeekendColumn } from './rows/weekend-rows';
import { addWorkColumns, type PersonWork } from './work-columns';

/** A problem as a linear model, with the way back from columns to people and time. */
export interface RosterModel {
  readonly problem: Problem;
  /** Objectives: `shortage` in person-minutes of firm floors, `cost` in cents. */
  readonly linear: LinearModel;
  readonly works: readonly PersonWork[];
  readonly floors: readonly FloorRow[];
  /** Overtime column of each person, null where there is none. */
  readonly overtimes: readonly (number | null)[];
  readonly weekends: readonly WeekendColumn[];
  /** The row that holds the whole firm shortage; stage two puts the least shortage on it. */
  readonly shortageRow: number;
}

/**
 * Builds the whole model of a problem: who may work when, the rules of each person, the floors. Every
 * rule is about one person alone; only the floors join people, and they are elastic, so the model has a
 * solution exactly when each person alone has one.
 */
export function buildRosterModel(problem: Problem): RosterModel {
  const builder = new ModelBuilder(`Roster of ${problem.teamName} from ${problem.days[0]?.date}`, {
    shortage: 'minimise',
    cost: 'minimise',
  });
  explainNames(builder, problem);
  const works = addWorkColumns(builder, problem);
  const persons = works.map((work) => addPersonRows(builder, problem, work));
  const floors = addFloorRows(builder, problem, works);
  const shortageRow = addShortageRow(builder, floors);
  return {
    problem,
    linear: builder.build(),
    works,
    floors,
    overtimes: persons.map(({ overtime }) => overtime),
    weekends: persons.flatMap(({ weekends }) => weekends),
    shortageRow,
  };
}

function addPersonRows(
  builder: ModelBuilder,
  problem: Problem,
  work: PersonWork,
): { overtime: number | null; weekends: WeekendColumn[] } {
  addShiftADayRows(builder, work);
  addRestRows(builder, problem, work);
  addDayRunRows(builder, problem, work);
  addNightRunRows(builder, problem, work);
  addNightRow(builder, problem, work);
  addPinRows(builder, work);
  addHoursRow(builder, work);
  addConstantPay(builder, work);
  return {
    overtime: addOvertime(builder, problem, work),
    weekends: addWeekendRows(builder, problem, work),
  };
}

/** Whole firm shortage: sum of minutes x short. Row shortage, without a limit until stage two sets one. */
function addShortageRow(builder: ModelBuilder, floors: readonly FloorRow[]): number {
  const entries = floors.flatMap(({ startMinute, endMinute, shorts }) =>
    shorts
      .filter(({ priceCentsPerHour }) => priceCentsPerHour === null)
      .map(({ column }) => [column, endMinute - startMinute] as const),
  );
  return builder.addRow({ name: 'shortage', entries });
}

function explainNames(builder: ModelBuilder, { people, shifts, skills, days }: Problem): void {
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
}
