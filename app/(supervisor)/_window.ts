import { formatClock, formatHours, parseClock } from '@/modules/units';

/** A window as `FloorInput` and `ShiftKindInput` hold it; NaN where nothing could be read. */
export interface Window {
  readonly startMinute: number;
  readonly endMinute: number;
}

const minutesPerDay = 1440;

/**
 * Reads a window typed as two times of day. An end that is not after the start is meant on the next
 * day, so `23:00` to `07:00` ends at minute 1860 and `07:00` to `07:00` lasts 24 hours.
 */
export function readWindow(startText: string, endText: string): Window {
  const startMinute = parseClock(startText) ?? Number.NaN;
  const end = parseClock(endText) ?? Number.NaN;
  return { startMinute, endMinute: end <= startMinute ? end + minutesPerDay : end };
}

/** The two times of day that stand in the fields for a window. */
export const writeWindow = ({ startMinute, endMinute }: Window) => ({
  startMinute: formatClock(startMinute),
  endMinute: formatClock(endMinute),
});

/** What two typed times come to: `8 h`, or `8 h, ends the next day`; the rule while a time is missing. */
export function windowHint(startText: string, endText: string): string {
  const { startMinute, endMinute } = readWindow(startText, endText);
  if (Number.isNaN(endMinute - startMinute)) {
    return 'An end that is not after the start is on the next day.';
  }
  const length = `${formatHours(endMinute - startMinute)} h`;
  return endMinute > minutesPerDay ? `${length}, ends the next day` : length;
}
