import type { Interval } from './minute-counts';

/** Neighbouring minutes with the same number of people missing. */
export interface Stretch extends Interval {
  readonly missingPeople: number;
}

/**
 * Maximal stretches over [startMinute, endMinute) in which the same number, above 0, is missing.
 * `holdsTogether(minute)` says whether a stretch may go on from the minute before.
 */
export function missingStretches(
  { startMinute, endMinute }: Interval,
  missingAt: (minute: number) => number,
  holdsTogether: (minute: number) => boolean = () => true,
): Stretch[] {
  const stretches: Stretch[] = [];
  let from = startMinute;
  let missingPeople = 0;
  for (let minute = startMinute; minute <= endMinute; minute += 1) {
    const missing = minute < endMinute ? missingAt(minute) : 0;
    if (missing === missingPeople && holdsTogether(minute)) continue;
    if (missingPeople > 0) stretches.push({ startMinute: from, endMinute: minute, missingPeople });
    from = minute;
    missingPeople = missing;
  }
  return stretches;
}

/** Missing person-minutes of some stretches. */
export const missingMinutes = (stretches: readonly Stretch[]): number =>
  stretches.reduce(
    (sum, stretch) => sum + stretch.missingPeople * (stretch.endMinute - stretch.startMinute),
    0,
  );
