import type { Leave } from '../people';
import { addDays, daysBetween, type LocalDate } from '../units';
import type { ProblemPerson } from './problem';
import type { TimeAxis } from './time-axis';

type Absence = ProblemPerson['absences'][number];

/** A period by its first and last date, both included. */
export interface Period {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
}

/**
 * Leave as times away: whole local days, 00:00 of the first to 24:00 of the last. Leave that begins on
 * the day after the period still matters to its last night.
 */
export function absencesOf(
  leave: readonly Leave[],
  { startsOn, endsOn }: Period,
  axis: TimeAxis,
): Absence[] {
  return leave
    .filter((away) => away.endsOn >= startsOn && away.startsOn <= addDays(endsOn, 1))
    .map((away) => ({
      startMinute: axis.minuteOf(away.startsOn, 0),
      endMinute: axis.minuteOf(away.endsOn, 1440),
      reason: 'Leave',
    }));
}

/**
 * The part of a leave's credit that falls into the period, by days. Rounded on the running sum, so
 * that the parts of neighbouring periods add up to the whole credit.
 */
export function creditIn(leave: Leave, { startsOn, endsOn }: Period): number {
  const days = daysBetween(leave.startsOn, leave.endsOn) + 1;
  const creditUntil = (date: LocalDate): number => {
    const passed = Math.min(days, Math.max(0, daysBetween(leave.startsOn, date)));
    return Math.round((leave.creditMinutes * passed) / days);
  };
  return creditUntil(addDays(endsOn, 1)) - creditUntil(startsOn);
}

/** Times away for dates without a contract; neighbouring dates become one. */
export function absencesWithoutContract(dates: readonly LocalDate[], axis: TimeAxis): Absence[] {
  const absences: Absence[] = [];
  for (const date of dates) {
    const startMinute = axis.minuteOf(date, 0);
    const endMinute = axis.minuteOf(date, 1440);
    const last = absences.at(-1);
    if (last?.endMinute === startMinute) last.endMinute = endMinute;
    else absences.push({ startMinute, endMinute, reason: 'No contract' });
  }
  return absences;
}
