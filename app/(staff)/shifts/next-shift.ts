import type { OwnShift } from '@/modules/roster';
import { addDays, daysBetween, formatDay, type LocalDate } from '@/modules/units';

/** Shifts that start at 18:00 or later are tonight's. */
const eveningMinute = 1080;

/** The shift that goes on now or comes next; null when none is ahead. */
export interface NextShift {
  readonly shift: OwnShift;
  readonly isOn: boolean;
}

/** The first shift that has not ended yet by the team's clock, from shifts in any order. */
export function findNextShift(
  shifts: readonly OwnShift[],
  today: LocalDate,
  nowMinute: number,
): NextShift | null {
  const now = (shift: OwnShift) => nowMinute + 1440 * daysBetween(shift.date, today);
  const [next] = shifts
    .filter((shift) => now(shift) < shift.endMinute)
    .sort((a, b) => a.startsAtUtc - b.startsAtUtc);
  return next ? { shift: next, isOn: now(next) >= next.startMinute } : null;
}

/** What comes next as a title: `Tonight, Night`, `Next: Late tomorrow`, `On now: Early`. */
export function nextShiftTitle({ shift, isOn }: NextShift, today: LocalDate): string {
  const { kindName, date, startMinute } = shift;
  if (isOn) return `On now: ${kindName}`;
  if (date === today) return `${startMinute >= eveningMinute ? 'Tonight' : 'Today'}, ${kindName}`;
  if (date === addDays(today, 1)) return `Next: ${kindName} tomorrow`;
  return `Next: ${kindName} on ${formatDay(date)}`;
}
