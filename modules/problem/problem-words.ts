import { formatClock, formatDay, type LocalDate, toInstant, toLocal } from '../units';
import type { Problem } from './problem';

interface Window {
  readonly startMinute: number;
  readonly endMinute: number;
}

/** `Thu 11 Feb`. */
export const dayOf = ({ days }: Problem, dayIndex: number): string =>
  formatDay(days[dayIndex]?.date ?? '');

/** `Night` when a shift has just these times, otherwise the clock times, `07:00-15:00`. */
export function windowWords(problem: Problem, { startMinute, endMinute }: Window): string {
  const shift = problem.shifts.find(
    (one) => one.startMinute === startMinute && one.endMinute === endMinute,
  );
  if (shift) return shift.kindName;
  const clock = (minute: number): string => formatClock(localOf(problem, minute).minute);
  return `${clock(startMinute)}-${clock(endMinute)}`;
}

/** The dates that a stretch touches, `15-19 Feb`, `27 Feb-2 Mar` or `15 Feb`. */
export function daysWords(problem: Problem, { startMinute, endMinute }: Window): string {
  const first = shortDay(localOf(problem, startMinute).date);
  const last = shortDay(localOf(problem, endMinute - 1).date);
  if (first === last) return first;
  const [day, month] = first.split(' ');
  return last.endsWith(` ${month}`) ? `${day}-${last}` : `${first}-${last}`;
}

/** `15 Feb`. */
export const shortDay = (date: LocalDate): string => formatDay(date).slice(4);

function localOf(problem: Problem, minute: number) {
  const origin = toInstant(problem.days[0]?.date ?? '', 0, problem.zone);
  return toLocal(origin + minute * 60_000, problem.zone);
}
