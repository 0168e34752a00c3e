import {
  addDays,
  datesOf,
  elapsedMinutes,
  type LocalDate,
  toInstant,
  weekdayOf,
  type Zone,
} from '@/modules/units';

/** A calendar day on the time axis: minutes that truly elapse from the first local midnight. */
export interface CoverDay {
  readonly date: LocalDate;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly holidayName: string | null;
  readonly isWeekend: boolean;
}

const minutesPerDay = 1440;
/** Clocks change in the small hours: later local times stand still when counted back from midnight. */
const afterClockChange = 240;

/** The days of a period for a drawing that brings none of its own; holidays are not known here. */
export function drawnDays(startsOn: LocalDate, endsOn: LocalDate, zone: Zone): CoverDay[] {
  const origin = toInstant(startsOn, 0, zone);
  const minuteOf = (date: LocalDate) => elapsedMinutes(origin, toInstant(date, 0, zone));
  return datesOf(startsOn, endsOn).map((date) => ({
    date,
    startMinute: minuteOf(date),
    endMinute: minuteOf(addDays(date, 1)),
    holidayName: null,
    isWeekend: weekdayOf(date) >= 5,
  }));
}

/**
 * The axis minute at which the wall clock shows `localMinute` on a day; minutes from 1440 on belong to
 * the following day. Right across a clock change for every time from 04:00 on.
 */
export function atLocalMinute(
  days: readonly CoverDay[],
  dayIndex: number,
  localMinute: number,
): number {
  const day = days[dayIndex];
  if (!day) return dayIndex * minutesPerDay + localMinute;
  if (localMinute >= minutesPerDay) {
    const rest = localMinute - minutesPerDay;
    return days[dayIndex + 1] ? atLocalMinute(days, dayIndex + 1, rest) : day.endMinute + rest;
  }
  return localMinute >= afterClockChange
    ? day.endMinute - (minutesPerDay - localMinute)
    : day.startMinute + localMinute;
}

/**
 * Edges of the day columns on the time axis, one more than there are days. A column runs from the start
 * of the earliest shift to the same time next day, so that a night stands in its own column.
 */
export function columnEdges(days: readonly CoverDay[], dayStartsAtMinute: number): number[] {
  if (days.length === 0) return [];
  const starts = days.map((_, index) => atLocalMinute(days, index, dayStartsAtMinute));
  return [...starts, atLocalMinute(days, days.length - 1, dayStartsAtMinute + minutesPerDay)];
}

/**
 * Where a minute lies, counted in columns: 0 is the left edge of the first day, 1.5 the middle of the
 * second. Outside the period columns of 24 hours go on, so days before it are negative.
 */
export function toColumn(edges: readonly number[], minute: number): number {
  const first = edges[0] ?? 0;
  const last = edges.at(-1) ?? first;
  if (minute < first) return (minute - first) / minutesPerDay;
  if (minute >= last) return edges.length - 1 + (minute - last) / minutesPerDay;
  const next = edges.findIndex((edge) => edge > minute);
  const start = edges[next - 1] ?? first;
  const end = edges[next] ?? last;
  return next - 1 + (minute - start) / (end - start);
}
