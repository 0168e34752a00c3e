import type { ModelBuilder } from '../model-builder';
import type { PersonWork } from '../work-columns';

/**
 * At most one shift starts on a day. Sum of work(person, shifts of the day, posts) <= 1. Rows
 * day(person, day). Source: the roster holds one assignment for each person and day.
 */
export function addShiftADayRows(builder: ModelBuilder, { personIndex, byDay }: PersonWork): void {
  byDay.forEach((works, dayIndex) => {
    if (works.length < 2) return;
    builder.addRow({
      name: `day(p${personIndex},d${dayIndex})`,
      upper: 1,
      entries: works.map(({ column }) => [column, 1]),
    });
  });
}
