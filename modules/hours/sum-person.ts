import type { HoursDay, HoursPerson } from './views';

type Sums = Pick<
  HoursPerson,
  | 'plannedMinutes'
  | 'workedMinutes'
  | 'differenceMinutes'
  | 'nightMinutes'
  | 'weekendMinutes'
  | 'holidayMinutes'
>;

/** Totals of a person's days. The difference counts days with recorded work only. */
export function sumPerson(days: readonly HoursDay[]): Sums {
  const sums = {
    plannedMinutes: 0,
    workedMinutes: 0,
    differenceMinutes: 0,
    nightMinutes: 0,
    weekendMinutes: 0,
    holidayMinutes: 0,
  };
  for (const day of days) {
    sums.plannedMinutes += day.plannedMinutes;
    sums.nightMinutes += day.nightMinutes;
    sums.weekendMinutes += day.weekendMinutes;
    sums.holidayMinutes += day.holidayMinutes;
    if (day.workedMinutes === null) continue;
    sums.workedMinutes += day.workedMinutes;
    sums.differenceMinutes += day.workedMinutes - day.plannedMinutes;
  }
  return sums;
}
