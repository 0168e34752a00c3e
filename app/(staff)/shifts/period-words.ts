import { hours } from '@/app/_ui/clock';
import type { OwnPeriod } from '@/modules/roster';
import { formatDay, type LocalDate } from '@/modules/units';
import { isWhole, type Week, type WeekLine } from './week-lines';

/** Off days or leave in one line: `off Mon 1`, `leave Mon 8 to Fri 12`. */
export function freeWords({ is, from, to }: Exclude<WeekLine, { is: 'shift' }>): string {
  return from === to ? `${is} ${shortDay(from)}` : `${is} ${shortDay(from)} to ${shortDay(to)}`;
}

/**
 * What a week adds up to: `5 shifts, 40 h`. A whole week without leave that differs from the contract says
 * what is usual: `6 shifts, 48 h (usual 40)`.
 */
export function weekTotal(week: Week, weeklyMinutes: number): string {
  const { shiftCount, paidMinutes, leaveDays } = week;
  const isUnusual =
    isWhole(week) && leaveDays === 0 && weeklyMinutes > 0 && paidMinutes !== weeklyMinutes;
  const usual = isUnusual ? ` (usual ${hours(weeklyMinutes).replace(/ h$/, '')})` : '';
  const leave = leaveDays > 0 ? `, leave ${counted(leaveDays, 'day')}` : '';
  return `${counted(shiftCount, 'shift')}, ${hours(paidMinutes)}${usual}${leave}`;
}

/** What is asked of a person who has not confirmed, and what follows if they do not. */
export function confirmSentence({ confirmBy }: OwnPeriod, today: LocalDate): string {
  const after = 'your supervisor sees who has not confirmed.';
  if (confirmBy === null) return `Please confirm soon: ${after}`;
  if (confirmBy < today) {
    return `The day to confirm was ${formatDay(confirmBy)}; you still can. Until then ${after}`;
  }
  return `Please confirm by ${formatDay(confirmBy)}. After that ${after}`;
}

/** `1 shift`, `20 shifts`. */
export const counted = (count: number, noun: string): string =>
  `${count} ${count === 1 ? noun : `${noun}s`}`;

/** `Mon 1`: inside a week the month is known. */
const shortDay = (date: LocalDate): string => formatDay(date).replace(/ \p{L}+$/u, '');
