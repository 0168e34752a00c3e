import { addDays, daysBetween, type LocalDate } from '../../modules/units';

/** Days of one period; periods run Monday to Sunday in a fixed grid. */
export const periodDays = 28;

/** A Monday on which a period starts. */
const gridMonday = '2027-02-01';

/** First and last day, both included. */
export interface DemoPeriod {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
}

export interface DemoDates {
  /** Contains today. */
  readonly running: DemoPeriod;
  /** The next one, still a draft. */
  readonly draft: DemoPeriod;
  /** The one after that, which has no floors yet. */
  readonly next: DemoPeriod;
}

/** The demo's periods around a day. On `2027-01-14` they start on 4 Jan, 1 Feb and 1 Mar. */
export function demoDates(today: LocalDate): DemoDates {
  const number = Math.floor(daysBetween(gridMonday, today) / periodDays);
  return { running: period(number), draft: period(number + 1), next: period(number + 2) };
}

/** The date of a day of a period, counted from 1. */
export const dayOf = ({ startsOn }: DemoPeriod, day: number): LocalDate =>
  addDays(startsOn, day - 1);

function period(number: number): DemoPeriod {
  const startsOn = addDays(gridMonday, number * periodDays);
  return { startsOn, endsOn: addDays(startsOn, periodDays - 1) };
}
