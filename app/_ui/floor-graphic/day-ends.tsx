import { formatDay } from '@/modules/units';
import { dayNumber, weekdayName } from '../clock';
import type { CoverDay } from './day-axis';

const mostNamedDays = 10;

/** Names under the drawing: every day of a week, first and last day of a longer period. */
export function DayEnds({ days }: { readonly days: readonly CoverDay[] }) {
  const first = days[0];
  const last = days.at(-1);
  if (!first || !last) return null;
  if (days.length > mostNamedDays) {
    return (
      <div className="flex justify-between pt-1 text-note text-ink2" aria-hidden="true">
        <span>{formatDay(first.date)}</span>
        <span>{formatDay(last.date)}</span>
      </div>
    );
  }
  return (
    <div className="flex pt-1 text-center text-note text-ink2" aria-hidden="true">
      {days.map(({ date }) => (
        <span key={date} className="min-w-0 flex-1">
          {weekdayName(date)} <span className="font-[660] text-ink">{dayNumber(date)}</span>
        </span>
      ))}
    </div>
  );
}
