import { type Problem, rulesOf } from '../../problem';
import type { Entry, ModelBuilder } from '../model-builder';
import type { PersonWork } from '../work-columns';

/**
 * Shortest run of days with a shift: no run of fewer than shortestRunDays days strictly inside the period.
 * For each such length k and first day d the pattern free, k worked days, free is cut off:
 * sum of work over the run - work(day before) - work(day after) <= k - 1.
 * Rows shortrun(person, first day, length). The cut that excludes one pattern of 0 and 1: Balas and
 * Jeroslow, SIAM J. Appl. Math. 23, 1972, 61-69. Runs that touch the first or last day are exempt, since
 * their other part lies outside. House rule.
 */
export function addShortestRunRows(
  builder: ModelBuilder,
  problem: Problem,
  work: PersonWork,
): void {
  const shortest = rulesOf(problem, work.person).shortestRunDays ?? 1;
  eachInnerRun(work.byDay.length, shortest, (first, length) => {
    const days = daysFrom(first, length);
    // A day on which nobody lets the person work breaks the pattern by itself.
    if (days.some((day) => !work.byDay[day]?.length)) return;
    builder.addRow({
      name: `shortrun(p${work.personIndex},d${first},${length})`,
      upper: length - 1,
      entries: [
        ...days.flatMap((day) => entriesOf(work, day, 1)),
        ...entriesOf(work, first - 1, -1),
        ...entriesOf(work, first + length, -1),
      ],
    });
  });
}

/**
 * Shortest run of days off, in the same way with work and free exchanged:
 * work(day before) + work(day after) - sum of work over the run <= 1.
 * Rows shortfree(person, first day, length). House rule.
 */
export function addShortestFreeRows(
  builder: ModelBuilder,
  problem: Problem,
  work: PersonWork,
): void {
  const shortest = rulesOf(problem, work.person).shortestRunFreeDays ?? 1;
  eachInnerRun(work.byDay.length, shortest, (first, length) => {
    const after = first + length;
    if (!work.byDay[first - 1]?.length || !work.byDay[after]?.length) return;
    builder.addRow({
      name: `shortfree(p${work.personIndex},d${first},${length})`,
      upper: 1,
      entries: [
        ...entriesOf(work, first - 1, 1),
        ...entriesOf(work, after, 1),
        ...daysFrom(first, length).flatMap((day) => entriesOf(work, day, -1)),
      ],
    });
  });
}

/** Every run shorter than `shortest` that leaves a day of the period before and after it. */
function eachInnerRun(
  dayCount: number,
  shortest: number,
  visit: (first: number, length: number) => void,
): void {
  for (let length = 1; length < shortest; length += 1) {
    for (let first = 1; first + length < dayCount; first += 1) visit(first, length);
  }
}

const daysFrom = (first: number, length: number): number[] =>
  Array.from({ length }, (_, index) => first + index);

const entriesOf = (work: PersonWork, day: number, sign: 1 | -1): Entry[] =>
  (work.byDay[day] ?? []).map(({ column }) => [column, sign]);
