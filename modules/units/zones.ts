import { TZDate, tzOffset } from '@date-fns/tz';
import { addDays, type LocalDate } from './dates';

/** An IANA zone name, e.g. `Europe/Berlin`. */
export type Zone = string;

/** An instant in milliseconds since 1970-01-01T00:00Z. */
export type UtcMilliseconds = number;

/** True when the machine knows the IANA zone. */
export function isZone(zone: string): boolean {
  return !Number.isNaN(tzOffset(zone, new Date(0)));
}

/**
 * The instant at which a team's wall clock shows `minuteOfDay` on `date`; minutes beyond 1440 fall on
 * later days. In a gap of the spring change the later reading is taken, in an overlap of the autumn
 * change the first (the "compatible" rule of Temporal).
 * `toInstant('2026-03-29', 150, 'Europe/Berlin')` is 01:30Z.
 */
export function toInstant(date: LocalDate, minuteOfDay: number, zone: Zone): UtcMilliseconds {
  const day = addDays(date, Math.floor(minuteOfDay / 1440));
  const minute = ((minuteOfDay % 1440) + 1440) % 1440;
  const asIfUtc = Date.parse(`${day}T00:00:00Z`) + minute * 60_000;
  const before = asIfUtc - tzOffset(zone, new Date(asIfUtc - 86_400_000)) * 60_000;
  const after = asIfUtc - tzOffset(zone, new Date(asIfUtc + 86_400_000)) * 60_000;
  for (const candidate of [Math.min(before, after), Math.max(before, after)]) {
    if (candidate + tzOffset(zone, new Date(candidate)) * 60_000 === asIfUtc) return candidate;
  }
  return before;
}

/** The wall clock of a zone at an instant: its date and the minute of that day. */
export function toLocal(
  instant: UtcMilliseconds,
  zone: Zone,
): { readonly date: LocalDate; readonly minute: number } {
  const local = new TZDate(instant, zone);
  const two = (value: number) => String(value).padStart(2, '0');
  return {
    date: `${local.getFullYear()}-${two(local.getMonth() + 1)}-${two(local.getDate())}`,
    minute: local.getHours() * 60 + local.getMinutes(),
  };
}

/** Whole minutes from one instant to another. A 22:00-06:00 shift takes 420 on Berlin's spring night. */
export const elapsedMinutes = (from: UtcMilliseconds, to: UtcMilliseconds): number =>
  Math.round((to - from) / 60_000);
