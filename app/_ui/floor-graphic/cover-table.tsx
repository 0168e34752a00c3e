import { formatClock, formatDay } from '@/modules/units';
import { Table } from '../table';
import { coverSteps } from './cover-steps';
import { atLocalMinute, columnEdges } from './day-axis';
import type { CoverWords } from './sentence';

interface Props {
  readonly words: CoverWords;
  readonly whose: string;
}

/** The numbers of a floor graphic: one row for each stretch, cut at the day columns. */
export function CoverTable({ words, whose }: Props) {
  return (
    <Table label={`Cover by day and time, ${whose}`} maxHeight="24rem">
      <thead>
        <tr>
          <th scope="col">Day</th>
          <th scope="col">Time</th>
          <th scope="col" data-figure>
            Floor
          </th>
          <th scope="col" data-figure>
            Covered
          </th>
          <th scope="col" data-figure>
            Short
          </th>
          <th scope="col" data-figure>
            Spare
          </th>
        </tr>
      </thead>
      <tbody>
        {coverRows(words).map((row) => (
          <tr key={`${row.day} ${row.time}`}>
            <th scope="row">{row.day}</th>
            <td className="figures">{row.time}</td>
            <td data-figure>{row.need}</td>
            <td data-figure>{row.hold}</td>
            <td data-figure className={row.short > 0 ? 'font-[660] text-short' : 'text-ink3'}>
              {row.short > 0 ? `short ${row.short}` : '0'}
            </td>
            <td data-figure className={row.spare > 0 ? '' : 'text-ink3'}>
              {row.spare}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function coverRows({ lanes, days, dayStartsAtMinute }: CoverWords) {
  const edges = columnEdges(days, dayStartsAtMinute);
  const steps = coverSteps(lanes);
  return days.flatMap((day, index) => {
    const columnStart = edges[index] ?? 0;
    const columnEnd = edges[index + 1] ?? columnStart;
    const origin = atLocalMinute(days, index, dayStartsAtMinute);
    const clock = (minute: number) => formatClock(dayStartsAtMinute + minute - origin);
    return steps
      .filter((step) => step.endMinute > columnStart && step.startMinute < columnEnd)
      .map((step) => ({
        ...step,
        day: formatDay(day.date),
        time: `${clock(Math.max(columnStart, step.startMinute))}–${clock(Math.min(columnEnd, step.endMinute))}`,
      }));
  });
}
