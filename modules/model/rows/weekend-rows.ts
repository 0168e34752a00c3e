import type { Problem } from '../../problem';
import { addDays, elapsedMinutes, type LocalDate, toInstant, weekdayOf } from '../../units';
import type { ModelBuilder } from '../model-builder';
import type { PersonWork, WorkColumn } from '../work-columns';

/** 1 when the person works on that weekend, and the columns that make it so, by day. */
export interface WeekendColumn {
  readonly column: number;
  readonly days: readonly (readonly WorkColumn[])[];
}

/**
 * Weekends of the period: a weekend is worked when a shift starts on its Saturday or Sunday, or, if
 * weekendCountsFridayNight, when a shift that starts on the Friday runs past Saturday 00:00. Rows
 * weekend(person, saturday, day): work of the day <= weekend(person, saturday), and weekends(person):
 * their sum <= weekendsPerPeriod. The mark is tied from one side only: it has no cost, so nothing is
 * gained by setting it for a free weekend. House rule; see `ruleSources`.
 */
export function addWeekendRows(
  builder: ModelBuilder,
  problem: Problem,
  work: PersonWork,
): WeekendColumn[] {
  const most = problem.rules.weekendsPerPeriod;
  if (most === null) return [];
  const weekends = [...findWeekends(problem, work)].map(([saturday, days]) => {
    const place = `p${work.personIndex},${saturday}`;
    const column = builder.addColumn({ name: `weekend(${place})`, upper: 1, isInteger: true });
    days.forEach((works, index) => {
      builder.addRow({
        name: `weekend(${place},${index})`,
        upper: 0,
        entries: [...works.map(({ column }) => [column, 1] as const), [column, -1]],
      });
    });
    return { column, days };
  });
  builder.addRow({
    name: `weekends(p${work.personIndex})`,
    upper: most,
    entries: weekends.map(({ column }) => [column, 1]),
  });
  return weekends;
}

/** By Saturday: the columns of each day that count. A weekend may lie in the period only in part. */
function findWeekends(problem: Problem, work: PersonWork): Map<LocalDate, WorkColumn[][]> {
  const weekends = new Map<LocalDate, WorkColumn[][]>();
  work.byDay.forEach((works, dayIndex) => {
    const date = problem.days[dayIndex]?.date ?? '';
    const saturday = addDays(date, 5 - weekdayOf(date));
    const counted = countedWorks(problem, works, dayIndex, weekdayOf(date));
    if (counted.length === 0) return;
    weekends.set(saturday, [...(weekends.get(saturday) ?? []), counted]);
  });
  return weekends;
}

function countedWorks(
  problem: Problem,
  works: readonly WorkColumn[],
  dayIndex: number,
  weekday: number,
): WorkColumn[] {
  if (weekday >= 5) return [...works];
  if (weekday !== 4 || !problem.rules.weekendCountsFridayNight) return [];
  const saturdayStarts = endOfDay(problem, dayIndex);
  return works.filter(({ shift }) => shift.endMinute > saturdayStarts);
}

/** Local midnight after a day on the time axis, also after the last day of the period. */
function endOfDay(problem: Problem, dayIndex: number): number {
  const next = problem.days[dayIndex + 1];
  if (next) return next.startMinute;
  const first = problem.days[0]?.date ?? '';
  const following = addDays(first, dayIndex + 1);
  return elapsedMinutes(toInstant(first, 0, problem.zone), toInstant(following, 0, problem.zone));
}
