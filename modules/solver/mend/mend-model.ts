import {
  type ColumnInput,
  completeValues,
  type Entry,
  type LinearModel,
  type RosterModel,
  type RowInput,
  type WorkColumn,
} from '../../model';
import { extendModel } from '../extend-model';
import type { MendOptions } from './mending';

/** Whether somebody's day differs from the roster before. */
export interface DayMark {
  readonly personIndex: number;
  readonly dayIndex: number;
  readonly column: number;
  readonly before: WorkColumn | null;
  /** Columns of the day. */
  readonly works: readonly WorkColumn[];
}

/** The compact model within a window, with marks for what changes. */
export interface MendModel {
  readonly model: RosterModel;
  /** Objectives: those of the model, `touched` and `moved`. */
  readonly linear: LinearModel;
  readonly marks: readonly DayMark[];
  /** By person: the column that is 1 when any day is changed. */
  readonly touched: readonly number[];
  readonly touchedRow: number;
  readonly movedRow: number;
}

/**
 * Freezes the roster outside the window and marks changed days and touched people:
 * changed(p, d) >= 1 - work before, or >= sum of work on a day that was free; touched(p) >= changed(p, d).
 */
export function buildMendModel(
  model: RosterModel,
  before: Float64Array,
  { fromMinute, untilMinute }: Pick<MendOptions, 'fromMinute' | 'untilMinute'>,
): MendModel {
  const frozen = freeze(model, before, fromMinute, untilMinute);
  const columns: ColumnInput[] = [];
  const rows: RowInput[] = [];
  const first = frozen.columnNames.length;
  const addColumn = (column: ColumnInput): number => first + columns.push(column) - 1;
  const marks: DayMark[] = [];
  const touched = model.works.map(({ byDay, personIndex }) => {
    const touch = addColumn({
      name: `touched(p${personIndex})`,
      upper: 1,
      isInteger: true,
      costs: { touched: 1 },
    });
    byDay.forEach((works, dayIndex) => {
      if (!works.some(({ shift }) => isWithin(shift, fromMinute, untilMinute))) return;
      const kept = works.find(({ column }) => before[column] === 1) ?? null;
      const place = `p${personIndex},d${dayIndex}`;
      const column = addColumn({ name: `changed(${place})`, upper: 1, costs: { moved: 1 } });
      rows.push(changedRow(place, column, kept, works));
      rows.push({
        name: `touch(${place})`,
        upper: 0,
        entries: [
          [column, 1],
          [touch, -1],
        ],
      });
      marks.push({ personIndex, dayIndex, column, before: kept, works });
    });
    return touch;
  });
  const sums = [
    { name: 'touched', entries: touched.map((column): Entry => [column, 1]) },
    { name: 'moved', entries: marks.map(({ column }): Entry => [column, 1]) },
  ];
  const touchedRow = frozen.rowNames.length + rows.length;
  const linear = extendModel(frozen, {
    columns,
    rows: [...rows, ...sums],
    objectives: ['touched', 'moved'],
  });
  return { model, linear, marks, touched, touchedRow, movedRow: touchedRow + 1 };
}

const isWithin = ({ startMinute }: WorkColumn['shift'], from: number, until: number): boolean =>
  from <= startMinute && startMinute < until;

function changedRow(
  place: string,
  changed: number,
  kept: WorkColumn | null,
  works: readonly WorkColumn[],
): RowInput {
  if (kept) {
    return {
      name: `changed(${place})`,
      lower: 1,
      entries: [
        [changed, 1],
        [kept.column, 1],
      ],
    };
  }
  return {
    name: `changed(${place})`,
    upper: 0,
    entries: [...works.map(({ column }): Entry => [column, 1]), [changed, -1]],
  };
}

/** Shifts that start outside the window stay as they are. */
function freeze(
  { linear, works }: RosterModel,
  before: Float64Array,
  from: number,
  until: number,
): LinearModel {
  const columnLower = linear.columnLower.slice();
  const columnUpper = linear.columnUpper.slice();
  for (const { column, shift } of works.flatMap(({ columns }) => columns)) {
    if (isWithin(shift, from, until)) continue;
    columnLower[column] = before[column] ?? 0;
    columnUpper[column] = before[column] ?? 0;
  }
  return { ...linear, columnLower, columnUpper };
}

/** The point of the mending model that belongs to the shifts of some values. */
export function completeMending(
  { model, linear, marks, touched }: MendModel,
  values: ArrayLike<number>,
): Float64Array {
  const whole = new Float64Array(linear.columnNames.length);
  whole.set(completeValues(model, values));
  for (const { personIndex, column, before, works } of marks) {
    const now = works.find((work) => whole[work.column] === 1) ?? null;
    if (now === before) continue;
    whole[column] = 1;
    whole[touched[personIndex] ?? -1] = 1;
  }
  return whole;
}
