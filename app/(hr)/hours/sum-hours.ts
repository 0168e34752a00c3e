import type { HoursPerson } from '@/modules/hours';
import type { FormatHours } from './format-hours';

/** The columns of figures of the table, in order; each is added up at its foot. */
export const hoursColumns = [
  'contractMinutes',
  'plannedMinutes',
  'workedMinutes',
  'differenceMinutes',
  'nightMinutes',
  'weekendMinutes',
  'holidayMinutes',
  'leaveMinutes',
] as const satisfies readonly (keyof HoursPerson)[];
export type HoursColumn = (typeof hoursColumns)[number];
export type HoursFormats = Readonly<Record<HoursColumn, FormatHours>>;
export type HoursSums = Readonly<Record<HoursColumn, number>>;

/** Totals over people, in minutes. */
export function sumPeople(people: readonly HoursPerson[]): HoursSums {
  const sums = hoursColumns.map((column) => [
    column,
    people.reduce((total, person) => total + person[column], 0),
  ]);
  return Object.fromEntries(sums) as HoursSums;
}

/** Whether worked time differs from the plan on any day, also where the differences cancel out. */
export const hasDifference = ({ days }: HoursPerson): boolean =>
  days.some(
    ({ plannedMinutes, workedMinutes }) =>
      workedMinutes !== null && workedMinutes !== plannedMinutes,
  );

/** Days of people with planned or worked time, and on how many of them work is recorded. */
export function countDays(people: readonly HoursPerson[]): {
  readonly days: number;
  readonly recorded: number;
} {
  const days = people.flatMap((person) => person.days);
  return {
    days: days.length,
    recorded: days.filter(({ workedMinutes }) => workedMinutes !== null).length,
  };
}

/** Whether any work of a person is recorded. */
export const isRecorded = (person: HoursPerson): boolean => countDays([person]).recorded > 0;
