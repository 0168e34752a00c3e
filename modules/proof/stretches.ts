import type { Interval } from './minute-counts';

/** Neighbouring minutes with the same number of people missing or too many. */
export interface Stretch extends Interval {
  readonly people: number;
}

/**
 * Maximal stretches over [startMinute, endMinute) in which `peopleAt` stays the same and above 0.
 * `holdsTogether(minute)` says whether a stretch may go on from the minute before.
 */
export function findStretches(
  { startMinute, endMinute }: Interval,
  peopleAt: (minute: number) => number,
  holdsTogether: (minute: number) => boolean = () => true,
): Stretch[] {
  const stretches: Stretch[] = [];
  let from = startMinute;
  let people = 0;
  for (let minute = startMinute; minute <= endMinute; minute += 1) {
    const here = minute < endMinute ? peopleAt(minute) : 0;
    if (here === people && holdsTogether(minute)) continue;
    if (people > 0) stretches.push({ startMinute: from, endMinute: minute, people });
    from = minute;
    people = here;
  }
  return stretches;
}

/** Person-minutes of some stretches. */
export const personMinutes = (stretches: readonly Stretch[]): number =>
  stretches.reduce(
    (sum, { startMinute, endMinute, people }) => sum + people * (endMinute - startMinute),
    0,
  );
