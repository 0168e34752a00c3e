import type { HoursPerson } from '@/modules/hours';
import { signed } from './format-hours';
import { groupStart } from './hours-head';
import { sumPeople } from './sum-hours';

interface Props {
  readonly people: readonly HoursPerson[];
  readonly isFiltered: boolean;
  readonly format: (minutes: number) => string;
}

/** Totals of the rows above. */
export function HoursFoot({ people, isFiltered, format }: Props) {
  const sums = sumPeople(people);
  const count = people.length === 1 ? '1 person' : `${people.length} people`;
  return (
    <tfoot>
      <tr>
        <th scope="row">{isFiltered ? `${count} with a difference` : count}</th>
        <td />
        <td data-figure>{format(sums.contractMinutes)}</td>
        <td />
        <td data-figure className={groupStart}>
          {format(sums.plannedMinutes)}
        </td>
        <td data-figure>{format(sums.workedMinutes)}</td>
        <td data-figure>{signed(sums.differenceMinutes, format)}</td>
        <td data-figure className={groupStart}>
          {format(sums.nightMinutes)}
        </td>
        <td data-figure>{format(sums.weekendMinutes)}</td>
        <td data-figure>{format(sums.holidayMinutes)}</td>
        <td data-figure className={groupStart}>
          {format(sums.leaveMinutes)}
        </td>
      </tr>
    </tfoot>
  );
}
