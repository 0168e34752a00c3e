import { type ClockRules, splitByClock } from '../problem';
import { elapsedMinutes, type LocalDate, type UtcMilliseconds } from '../units';
import type { HoursDay } from './views';

/** Time on duty between two instants; what is not paid of it was the break. */
export interface PaidTime {
  readonly startsAtUtc: UtcMilliseconds;
  readonly endsAtUtc: UtcMilliseconds;
  readonly paidMinutes: number;
}

export interface PlannedTime extends PaidTime {
  readonly shift: string;
  readonly post: string;
}

export interface WorkedTime extends PaidTime {
  readonly reason: string;
}

/**
 * The line of one person on one date. Night, weekend and holiday minutes are those of the worked time
 * where any is recorded, else of the plan, split by the team's wall clock; one minute may be several.
 */
export function sumDay(
  date: LocalDate,
  planned: readonly PlannedTime[],
  worked: readonly WorkedTime[],
  clock: ClockRules,
): HoursDay {
  const isRecorded = worked.length > 0;
  const split = (isRecorded ? worked : planned).map((time) =>
    splitByClock({ ...time, unpaidBreakMinutes: breakOf(time) }, clock),
  );
  const sum = (minutes: readonly number[]) => minutes.reduce((total, one) => total + one, 0);
  const joined = (texts: readonly string[]) =>
    [...new Set(texts.filter((text) => text !== ''))].join('; ');
  return {
    date,
    shift: joined(planned.map(({ shift }) => shift)),
    post: joined(planned.map(({ post }) => post)),
    plannedMinutes: sum(planned.map(({ paidMinutes }) => paidMinutes)),
    workedMinutes: isRecorded ? sum(worked.map(({ paidMinutes }) => paidMinutes)) : null,
    nightMinutes: sum(split.map(({ nightMinutes }) => nightMinutes)),
    weekendMinutes: sum(split.map(({ weekendMinutes }) => weekendMinutes)),
    holidayMinutes: sum(split.map(({ holidayMinutes }) => holidayMinutes)),
    reason: joined(worked.map(({ reason }) => reason)),
  };
}

const breakOf = ({ startsAtUtc, endsAtUtc, paidMinutes }: PaidTime): number =>
  Math.max(0, elapsedMinutes(startsAtUtc, endsAtUtc) - paidMinutes);
