import { type Problem, rulesOf } from '../../problem';
import { addDays, type LocalDate, weekdayOf } from '../../units';
import type { ModelBuilder } from '../model-builder';
import { marksWeekend } from '../weekend-marks';
import type { PersonWork, WorkColumn } from '../work-columns';

/** 1 when the person works on that weekend, and the columns that make it so, by day. */
export interface WeekendColumn {
  readonly saturday: LocalDate;
  readonly column: number;
  readonly days: readonly (readonly WorkColumn[])[];
}

/**
 * Weekends of the period: a weekend is worked when a shift starts on its Saturday or Sunday, or, if
 * weekendCountsFridayNight, when a shift that starts on the Friday runs past Saturday 00:00. Rows
 * weekend(person, saturday, day): work of the day <= weekend(person, saturday), and weekends(person):
 * their sum <= weekendsPerPeriod. Where fairness prices weekends (`isPriced`) the mark is tied from the
 * other side too, or a free weekend could count as worked for the sake of the person with least: row
 * weekend(person, saturday): weekend <= sum of work. House rule; see `ruleSources`.
 */
export function addWeekendRows(
  builder: ModelBuilder,
  problem: Problem,
  work: PersonWork,
  isPriced: boolean,
): WeekendColumn[] {
  const most = rulesOf(problem, work.person).weekendsPerPeriod;
  if (most === null && !isPriced) return [];
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
    if (isPriced) {
      builder.addRow({
        name: `weekend(${place})`,
        upper: 0,
        entries: [[column, 1], ...days.flat().map(({ column }) => [column, -1] as const)],
      });
    }
    return { saturday, column, days };
  });
  if (most !== null) {
    builder.addRow({
      name: `weekends(p${work.personIndex})`,
      upper: most,
      entries: weekends.map(({ column }) => [column, 1]),
    });
  }
  return weekends;
}

/** By Saturday: the columns of each day that count. A weekend may lie in the period only in part. */
function findWeekends(problem: Problem, work: PersonWork): Map<LocalDate, WorkColumn[][]> {
  const countsFriday = rulesOf(problem, work.person).weekendCountsFridayNight;
  const weekends = new Map<LocalDate, WorkColumn[][]>();
  work.byDay.forEach((works, dayIndex) => {
    const date = problem.days[dayIndex]?.date ?? '';
    const weekday = weekdayOf(date);
    if (weekday < 4) return;
    const counted = works.filter(({ shift }) => marksWeekend(problem, countsFriday, shift));
    if (counted.length === 0) return;
    const saturday = addDays(date, 5 - weekday);
    weekends.set(saturday, [...(weekends.get(saturday) ?? []), counted]);
  });
  return weekends;
}
