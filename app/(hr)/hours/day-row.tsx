import type { HoursDay } from '@/modules/hours';
import { formatDay } from '@/modules/units';
import { HoursCell } from './hours-cell';

interface Props {
  readonly day: HoursDay;
  readonly format: (minutes: number) => string;
}

/** One day: its shift and post, the hours, and why work differs from the plan. */
export function DayRow({ day, format }: Props) {
  const { workedMinutes, plannedMinutes, reason } = day;
  const differs = workedMinutes !== null && workedMinutes !== plannedMinutes;
  return (
    <tr>
      <th scope="row">
        <span className="whitespace-nowrap">{formatDay(day.date)}</span>
        <span className="block text-second font-normal text-ink2">
          {day.shift ? `${day.shift}, ${day.post}` : 'Not planned'}
        </span>
        {reason ? <span className="block text-second font-normal">{reason}</span> : null}
      </th>
      <HoursCell minutes={plannedMinutes} format={format} />
      {workedMinutes === null ? (
        <td data-figure className="text-note text-ink3">
          not yet
        </td>
      ) : (
        <HoursCell
          minutes={workedMinutes}
          format={format}
          {...(differs ? { className: 'font-[660]' } : {})}
        />
      )}
      <HoursCell minutes={day.nightMinutes} format={format} />
      <HoursCell minutes={day.weekendMinutes} format={format} />
      <HoursCell minutes={day.holidayMinutes} format={format} />
    </tr>
  );
}
