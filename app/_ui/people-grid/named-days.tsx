'use client';

import { inRem } from '../floor-graphic/use-width';
import { useGridFrame } from './grid-context';

/** Names of holidays above their columns, and a line with the word on today. */
export function NamedDays() {
  const { days, sizes } = useGridFrame();
  return days
    .filter(({ dayIndex, holidayName, isToday }) => dayIndex >= 0 && (holidayName || isToday))
    .map(({ date, dayIndex, holidayName, isToday }) => (
      <span
        key={date}
        className={`pointer-events-none absolute -top-9 -bottom-1 flex -translate-x-1/2 flex-col items-center whitespace-nowrap text-note leading-none font-[640] ${
          isToday ? 'text-act' : 'text-ink2'
        }`}
        style={{ left: inRem((dayIndex + 0.5) * sizes.dayWidth) }}
      >
        {isToday ? ['today', holidayName].filter(Boolean).join(', ') : holidayName}
        {isToday ? <span className="mt-0.5 w-0.5 flex-1 bg-act" /> : null}
      </span>
    ));
}
