import type { CalendarFrame, OwnPeriod, OwnShifts } from '@/modules/roster';
import type { LocalDate } from '@/modules/units';

/** What the calendar of a person draws around their shifts: published periods only. */
export function ownFrame(own: OwnShifts): CalendarFrame {
  const { zone, dayStartsAtMinute, today, nowMinute, holidays } = own;
  const periods = own.periods.map(({ startsOn, endsOn }) => ({
    startsOn,
    endsOn,
    isPublished: true,
  }));
  return { zone, dayStartsAtMinute, today, nowMinute, holidays, periods };
}

/** The published period that a day lies in. */
export const ownPeriodOn = (own: OwnShifts, date: LocalDate): OwnPeriod | null =>
  own.periods.find(({ startsOn, endsOn }) => startsOn <= date && date <= endsOn) ?? null;
