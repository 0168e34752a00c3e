import type { HoursDay } from '@/modules/hours';
import { formatDay } from '@/modules/units';
import type { FormatHours } from './format-hours';
import { HoursCell } from './hours-cell';

/** The columns of figures of a day, in order. */
export const dayColumns = [
  'plannedMinutes',
  'workedMinutes',
  'nightMinutes',
  'weekendMinutes',
  'holidayMinutes',
] as const satisfies readonly (keyof HoursDay)[];
export type DayFormats = Readonly<Record<(typeof dayColumns)[number], FormatHours>>;

interface Props {
  readonly day: HoursDay;
  readonly formats: DayFormats;
}

/** One day: its shift and post, the hours, and below them why work differs from the plan. */
export function DayRow({ day, formats }: Props) {
  const { workedMinutes, plannedMinutes, reason } = day;
  const differs = workedMinutes !== null && workedMinutes !== plannedMinutes;
  return (
    <>
      <tr className={reason ? '*:border-b-0!' : ''}>
        <th scope="row">
          <span className="whitespace-nowrap">{formatDay(day.date)}</span>
          <span className="block text-second font-normal text-ink2">
            {day.shift ? `${day.shift}, ${day.post}` : 'Not planned'}
          </span>
        </th>
        <HoursCell minutes={plannedMinutes} format={formats.plannedMinutes} />
        {workedMinutes === null ? (
          <td data-figure className="text-note text-ink3">
            not yet
          </td>
        ) : (
          <HoursCell
            minutes={workedMinutes}
            format={formats.workedMinutes}
            {...(differs ? { className: 'font-[660]' } : {})}
          />
        )}
        <HoursCell minutes={day.nightMinutes} format={formats.nightMinutes} />
        <HoursCell minutes={day.weekendMinutes} format={formats.weekendMinutes} />
        <HoursCell minutes={day.holidayMinutes} format={formats.holidayMinutes} />
      </tr>
      {reason ? (
        <tr>
          <td colSpan={6} className="pt-0! text-second">
            <span className="text-ink2">Reason: </span>
            {reason}
          </td>
        </tr>
      ) : null}
    </>
  );
}
