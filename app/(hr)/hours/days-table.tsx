import { Table } from '@/app/_ui/table';
import type { HoursPerson } from '@/modules/hours';
import { DayRow, dayColumns } from './day-row';
import { columnFormats } from './format-hours';

/** The days of one person, the sums at the foot. */
export function DaysTable({ person }: { readonly person: HoursPerson }) {
  const { days } = person;
  const formats = columnFormats(dayColumns, days);
  return (
    <Table label={`Days of ${person.name}`} maxHeight="34rem">
      <thead>
        <tr>
          <th scope="col">Day, shift, post</th>
          {['Planned', 'Worked', 'Night', 'Weekend', 'Holiday'].map((head) => (
            <th key={head} scope="col" data-figure className="px-1!">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {days.map((day) => (
          <DayRow key={day.date} day={day} formats={formats} />
        ))}
      </tbody>
      <tfoot>
        <tr>
          <th scope="row">{days.length === 1 ? '1 day' : `${days.length} days`}</th>
          {dayColumns.map((column) => (
            <td key={column} data-figure>
              {formats[column](person[column])}
            </td>
          ))}
        </tr>
      </tfoot>
    </Table>
  );
}
