import type { PayRules } from '../rules';
import {
  addDays,
  elapsedMinutes,
  type LocalDate,
  toInstant,
  toLocal,
  type UtcMilliseconds,
  weekdayOf,
  type Zone,
} from '../units';

/** A stretch of work between two instants, with the unpaid break inside it. */
export interface Stint {
  readonly startsAtUtc: UtcMilliseconds;
  readonly endsAtUtc: UtcMilliseconds;
  readonly unpaidBreakMinutes: number;
}

/** Paid minutes of a stint and how many of them carry a premium; one minute may carry several. */
export interface PaidSplit {
  readonly paidMinutes: number;
  readonly nightMinutes: number;
  readonly weekendMinutes: number;
  readonly holidayMinutes: number;
}

/** What the split depends on besides the stint. */
export interface ClockRules {
  readonly zone: Zone;
  readonly pay: Pick<PayRules, 'nightStartMinute' | 'nightEndMinute'>;
  readonly isHoliday: (date: LocalDate) => boolean;
}

interface Span {
  readonly from: UtcMilliseconds;
  readonly to: UtcMilliseconds;
}

/**
 * Splits a stint by the wall clock of the team. Minutes are those that truly elapse: a 22:00-06:00
 * shift of Berlin's spring night has 420. Night: the window of the pay rules on any date; weekend:
 * Saturday 00:00 to Sunday 24:00; holiday: 00:00 to 24:00 of the date. When the break is taken is not
 * known, so it is taken out of the middle of the stint (an odd minute after it). A break as long as
 * the stint leaves nothing to pay.
 */
export function splitByClock(stint: Stint, { zone, pay, isHoliday }: ClockRules): PaidSplit {
  const paid = paidSpans(stint);
  // A night window may begin on the day before and end on the day after.
  const first = addDays(toLocal(stint.startsAtUtc, zone).date, -1);
  const last = toLocal(stint.endsAtUtc, zone).date;
  const split = { nightMinutes: 0, weekendMinutes: 0, holidayMinutes: 0 };
  for (let date = first; date <= last; date = addDays(date, 1)) {
    const window = (fromMinute: number, toMinute: number): number =>
      sharedMinutes(paid, {
        from: toInstant(date, fromMinute, zone),
        to: toInstant(date, toMinute, zone),
      });
    split.nightMinutes += window(pay.nightStartMinute, pay.nightEndMinute);
    if (weekdayOf(date) >= 5) split.weekendMinutes += window(0, 1440);
    if (isHoliday(date)) split.holidayMinutes += window(0, 1440);
  }
  return { paidMinutes: paid.reduce((sum, span) => sum + lengthOf(span), 0), ...split };
}

function paidSpans({ startsAtUtc, endsAtUtc, unpaidBreakMinutes }: Stint): Span[] {
  const elapsed = elapsedMinutes(startsAtUtc, endsAtUtc);
  const paid = Math.max(0, elapsed - unpaidBreakMinutes);
  const before = Math.floor(paid / 2);
  return [
    { from: startsAtUtc, to: startsAtUtc + before * 60_000 },
    { from: endsAtUtc - (paid - before) * 60_000, to: endsAtUtc },
  ];
}

const lengthOf = ({ from, to }: Span): number => Math.max(0, elapsedMinutes(from, to));

const sharedMinutes = (spans: readonly Span[], window: Span): number =>
  spans.reduce(
    (sum, { from, to }) =>
      sum + lengthOf({ from: Math.max(from, window.from), to: Math.min(to, window.to) }),
    0,
  );
