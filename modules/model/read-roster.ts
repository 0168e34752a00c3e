import type { PlannedRoster, ProblemFloor } from '../problem';
import type { RosterModel } from './roster-model';
import type { FloorRow, ShortColumn } from './rows/floor-rows';
import type { WorkColumn } from './work-columns';

/** The solver's 0 and 1 carry small errors: above this a column counts as 1. */
const onThreshold = 0.5;

/** The planned shifts in a solution, in the order of people and time. */
export function readRoster(
  { problem, works }: RosterModel,
  values: ArrayLike<number>,
): PlannedRoster {
  return works.flatMap(({ columns }) =>
    columns
      .filter(({ column }) => (values[column] ?? 0) > onThreshold)
      .map(({ personIndex, shift, postSkillId }) => ({
        personId: problem.people[personIndex]?.id ?? '',
        shiftIndex: shift.index,
        postSkillId,
      })),
  );
}

/**
 * The work columns of a roster set to 1, all others 0. Where the model lacks the post, another post on
 * the same shift takes its place; a shift the person cannot work is left out.
 */
export function placeRoster(
  { problem, works, linear }: RosterModel,
  roster: PlannedRoster,
): Float64Array {
  const values = new Float64Array(linear.columnNames.length);
  const workOf = new Map(problem.people.map(({ id }, index) => [id, works[index]?.columns ?? []]));
  for (const { personId, shiftIndex, postSkillId } of roster) {
    const onShift = (workOf.get(personId) ?? []).filter(({ shift }) => shift.index === shiftIndex);
    const chosen = onShift.find((work) => work.postSkillId === postSkillId) ?? onShift[0];
    if (chosen) values[chosen.column] = 1;
  }
  return values;
}

/**
 * What a roster leaves open, as floors of their own: with them the rest of the people can be planned
 * around it.
 */
export function openFloors(model: RosterModel, values: ArrayLike<number>): ProblemFloor[] {
  return model.floors.flatMap((floor) => {
    const { skillId, counting, startMinute, endMinute } = floor;
    return missingIn(floor, values)
      .filter(([, people]) => people > 0)
      .map(([{ priceCentsPerHour, priority }, people]) => ({
        floorId: 'open',
        dayIndex: 0,
        startMinute,
        endMinute,
        skillId,
        people,
        counting,
        priceCentsPerHour,
        priority: priority ?? 1,
      }));
  });
}

/** Paid minutes of one person's columns that are on. */
export const workedMinutes = (columns: readonly WorkColumn[], values: ArrayLike<number>): number =>
  columns.reduce((sum, work) => sum + (isOn(work, values) ? work.shift.paidMinutes : 0), 0);

/** Whether the shift of a column is planned. */
export const isOn = ({ column }: WorkColumn, values: ArrayLike<number>): boolean =>
  (values[column] ?? 0) > onThreshold;

/** How many people each short column of a floor row must stand for. */
export function missingIn(floor: FloorRow, values: ArrayLike<number>): [ShortColumn, number][] {
  const cover = floor.covering.filter((work) => isOn(work, values)).length;
  let missing = Math.max(0, floor.people - cover);
  return floor.shorts.map((short) => {
    const here = Math.min(missing, short.people);
    missing -= here;
    return [short, here];
  });
}
