import { type Floor, needOn } from '../coverage';
import type { LocalDate } from '../units';
import type { ProblemFloor } from './problem';
import type { TimeAxis } from './time-axis';

/**
 * The floors of one date, on the time axis of the period: the date's own number, else the holiday
 * column, else the weekday. Floors that ask for nobody, and windows that a clock change skips, are
 * left out.
 */
export function floorsOn(
  floors: readonly Floor[],
  date: LocalDate,
  dayIndex: number,
  isHoliday: boolean,
  axis: TimeAxis,
): ProblemFloor[] {
  return floors.flatMap((floor): ProblemFloor[] => {
    const people = needOn(floor, date, isHoliday);
    const startMinute = axis.minuteOf(date, floor.startMinute);
    const endMinute = axis.minuteOf(date, floor.endMinute);
    if (people === 0 || endMinute <= startMinute) return [];
    const { id: floorId, skillId, counting, priceCentsPerHour } = floor;
    const window = { dayIndex, startMinute, endMinute };
    return [{ floorId, ...window, skillId, people, counting, priceCentsPerHour, priority: 1 }];
  });
}
