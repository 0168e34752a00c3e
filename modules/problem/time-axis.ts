import {
  elapsedMinutes,
  type LocalDate,
  toInstant,
  type UtcMilliseconds,
  type Zone,
} from '../units';

/** The time axis of a period: minutes that truly elapse from its first local midnight. */
export interface TimeAxis {
  /** The instant of minute 0. */
  readonly origin: UtcMilliseconds;
  /** Where the wall clock shows a minute of a date; minutes beyond 1440 fall on later days. */
  readonly minuteOf: (date: LocalDate, minuteOfDay: number) => number;
  readonly minuteAt: (instant: UtcMilliseconds) => number;
}

/** Makes the axis of a period that starts on a date. */
export function axisFrom(startsOn: LocalDate, zone: Zone): TimeAxis {
  const origin = toInstant(startsOn, 0, zone);
  const minuteAt = (instant: UtcMilliseconds): number => elapsedMinutes(origin, instant);
  return {
    origin,
    minuteAt,
    minuteOf: (date, minuteOfDay) => minuteAt(toInstant(date, minuteOfDay, zone)),
  };
}
