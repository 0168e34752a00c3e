import type { HoursPerson } from '@/modules/hours';

/** What is added up at the foot of the table. */
export interface HoursSums {
  readonly contractMinutes: number;
  readonly plannedMinutes: number;
  readonly workedMinutes: number;
  readonly differenceMinutes: number;
  readonly nightMinutes: number;
  readonly weekendMinutes: number;
  readonly holidayMinutes: number;
  readonly leaveMinutes: number;
}

/** Totals over people, in minutes. */
export function sumPeople(people: readonly HoursPerson[]): HoursSums {
  const sum = (minutesOf: (person: HoursPerson) => number) =>
    people.reduce((total, person) => total + minutesOf(person), 0);
  return {
    contractMinutes: sum((person) => person.contractMinutes),
    plannedMinutes: sum((person) => person.plannedMinutes),
    workedMinutes: sum((person) => person.workedMinutes),
    differenceMinutes: sum((person) => person.differenceMinutes),
    nightMinutes: sum((person) => person.nightMinutes),
    weekendMinutes: sum((person) => person.weekendMinutes),
    holidayMinutes: sum((person) => person.holidayMinutes),
    leaveMinutes: sum((person) => person.leaveMinutes),
  };
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
