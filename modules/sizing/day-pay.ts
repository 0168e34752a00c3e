import type { ShiftKind } from '../coverage';
import type { PayRules } from '../rules';
import { payFor } from '../units';

type Hours = Pick<ShiftKind, 'startMinute' | 'endMinute' | 'unpaidBreakMinutes'>;

/**
 * Pay in cents of one shift that starts on a normal weekday, Saturday or Sunday: paid hours at the rate
 * plus night and weekend premiums by the clock, premiums in proportion to the paid part of the shift.
 * On Sunday only the minutes before midnight are weekend; a Friday's minutes after midnight are not
 * counted as weekend, since a line has one pay for Monday to Friday.
 */
export function dayPay(
  kind: Hours,
  centsPerHour: number,
  pay: PayRules,
  startsOn: 'weekday' | 'saturday' | 'sunday',
): number {
  const length = kind.endMinute - kind.startMinute;
  const paid = length - kind.unpaidBreakMinutes;
  const paidPart = (minutes: number) => Math.round((minutes * paid) / length);
  const weekend = { weekday: 0, saturday: length, sunday: minutesWithin(kind, 0, 1440) };
  return (
    payFor(centsPerHour, paid) +
    payFor(centsPerHour, paidPart(nightMinutes(kind, pay)), pay.nightPercent) +
    payFor(centsPerHour, paidPart(weekend[startsOn]), pay.weekendPercent)
  );
}

/** Minutes in the night window of the day before, the day itself and the day after. */
const nightMinutes = (kind: Hours, { nightStartMinute, nightEndMinute }: PayRules): number =>
  [-1440, 0, 1440]
    .map((shift) => minutesWithin(kind, nightStartMinute + shift, nightEndMinute + shift))
    .reduce((sum, minutes) => sum + minutes, 0);

const minutesWithin = (kind: Hours, from: number, to: number): number =>
  Math.max(0, Math.min(kind.endMinute, to) - Math.max(kind.startMinute, from));
