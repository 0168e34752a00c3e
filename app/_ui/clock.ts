import { format, parseISO } from 'date-fns';
import {
  formatClock,
  formatDay,
  formatHours,
  type LocalDate,
  toLocal,
  type UtcMilliseconds,
  type Zone,
} from '@/modules/units';

/** `Friday 12 February`: in sentences and for screen readers. */
export const longDay = (date: LocalDate): string => format(parseISO(date), 'EEEE d MMMM');

/** `Fri`. */
export const weekdayName = (date: LocalDate): string => format(parseISO(date), 'EEE');

/** `February`. */
export const monthName = (date: LocalDate): string => format(parseISO(date), 'MMMM');

/** `12`. */
export const dayNumber = (date: LocalDate): string => format(parseISO(date), 'd');

/** `1–28 February` or `22 February–21 March`; `joiner` ` to ` for what is read aloud. */
export function dateRange(from: LocalDate, to: LocalDate, joiner = '–'): string {
  const end = format(parseISO(to), 'd MMMM');
  if (from === to) return end;
  const isOneMonth = from.slice(0, 7) === to.slice(0, 7);
  return `${format(parseISO(from), isOneMonth ? 'd' : 'd MMMM')}${joiner}${end}`;
}

/** `1–28 February 2027`. */
export const dateRangeWithYear = (from: LocalDate, to: LocalDate): string =>
  `${dateRange(from, to)} ${to.slice(0, 4)}`;

/** `07:00–15:00`, minutes of the local day; an end past midnight wraps. */
export const clockRange = (startMinute: number, endMinute: number): string =>
  `${formatClock(startMinute)}–${formatClock(endMinute)}`;

/** `7 to 15` or `7:30 to 15`: for screen readers. */
export const spokenClockRange = (startMinute: number, endMinute: number): string =>
  `${spokenClock(startMinute)} to ${spokenClock(endMinute)}`;

/** `88 h` of 5280 minutes. */
export const hours = (minutes: number): string => `${formatHours(minutes)} h`;

/** `Fri 15 Jan, 10:05` on the team's wall clock. */
export function formatInstant(instant: UtcMilliseconds, zone: Zone): string {
  const { date, minute } = toLocal(instant, zone);
  return `${formatDay(date)}, ${formatClock(minute)}`;
}

function spokenClock(minute: number): string {
  const [hour, rest] = formatClock(minute).split(':');
  return rest === '00' ? String(Number(hour)) : `${Number(hour)}:${rest}`;
}
