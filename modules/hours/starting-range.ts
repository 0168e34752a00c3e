import { addDays, type DateRange, type LocalDate } from '../units';

interface Period {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
}

/**
 * The dates a reader of hours most likely wants: the published period that holds today, else the last
 * one before, else the first one after, else the calendar month of today. Periods come earliest first.
 */
export function startingRange(periods: readonly Period[], today: LocalDate): DateRange {
  const begun = periods.filter(({ startsOn }) => startsOn <= today).at(-1);
  const period = begun ?? periods[0];
  return period ? { from: period.startsOn, to: period.endsOn } : monthOf(today);
}

function monthOf(today: LocalDate): DateRange {
  const from = `${today.slice(0, 7)}-01`;
  const nextMonth = addDays(from, 31).slice(0, 7);
  return { from, to: addDays(`${nextMonth}-01`, -1) };
}
