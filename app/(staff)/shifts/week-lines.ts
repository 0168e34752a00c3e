import type { OwnPeriod, OwnShift } from '@/modules/roster';
import { addDays, datesOf, daysBetween, type LocalDate, mondayOf } from '@/modules/units';

/** A line of a week: a shift, or days in a row without one. */
export type WeekLine =
  | { readonly is: 'shift'; readonly shift: OwnShift }
  | { readonly is: 'off' | 'leave'; readonly from: LocalDate; readonly to: LocalDate };

/** One week of a period from Monday; the first and last may be cut by the period. */
export interface Week {
  readonly from: LocalDate;
  readonly to: LocalDate;
  readonly lines: readonly WeekLine[];
  readonly shiftCount: number;
  readonly paidMinutes: number;
  readonly leaveDays: number;
}

/** The weeks of a period, Monday first, every day in one line; off days and leave in a row share one. */
export function weeksOf(period: OwnPeriod): Week[] {
  const weeks: Week[] = [];
  for (let from = period.startsOn; from <= period.endsOn; from = addDays(mondayOf(from), 7)) {
    const days = datesOf(from, addDays(mondayOf(from), 6));
    weeks.push(
      toWeek(
        period,
        days.filter((date) => date <= period.endsOn),
      ),
    );
  }
  return weeks;
}

/** Whether a week has all its seven days in the period. */
export const isWhole = ({ from, to }: Pick<Week, 'from' | 'to'>): boolean =>
  daysBetween(from, to) === 6;

function toWeek(period: OwnPeriod, days: readonly LocalDate[]): Week {
  const [from = period.startsOn] = days;
  const to = days.at(-1) ?? from;
  const shifts = period.shifts.filter(({ date }) => from <= date && date <= to);
  const lines: WeekLine[] = [];
  let leaveDays = 0;
  for (const date of days) {
    const ofDay = shifts.filter((shift) => shift.date === date);
    const isLeave = isOnLeave(period, date);
    if (isLeave) leaveDays += 1;
    if (ofDay.length > 0) lines.push(...ofDay.map((shift) => ({ is: 'shift' as const, shift })));
    else addFreeDay(lines, isLeave ? 'leave' : 'off', date);
  }
  const paidMinutes = shifts.reduce((sum, shift) => sum + shift.paidMinutes, 0);
  return { from, to, lines, shiftCount: shifts.length, paidMinutes, leaveDays };
}

/** Lengthens the last line by a day when it is of the same sort, else begins one. */
function addFreeDay(lines: WeekLine[], is: 'off' | 'leave', date: LocalDate): void {
  const last = lines.at(-1);
  if (last?.is === is) lines[lines.length - 1] = { ...last, to: date };
  else lines.push({ is, from: date, to: date });
}

const isOnLeave = ({ leave }: OwnPeriod, date: LocalDate): boolean =>
  leave.some(({ startsOn, endsOn }) => startsOn <= date && date <= endsOn);
