import type { HoursPerson } from '@/modules/hours';
import { signed } from './format-hours';
import { groupStart } from './hours-head';
import { type HoursFormats, sumPeople } from './sum-hours';

interface Props {
  readonly people: readonly HoursPerson[];
  readonly isFiltered: boolean;
  readonly formats: HoursFormats;
}

/** Totals of the rows above. */
export function HoursFoot({ people, isFiltered, formats }: Props) {
  const sums = sumPeople(people);
  const count = people.length === 1 ? '1 person' : `${people.length} people`;
  return (
    <tfoot>
      <tr>
        <th scope="row">{isFiltered ? `${count} with a difference` : count}</th>
        <td />
        <td data-figure>{formats.contractMinutes(sums.contractMinutes)}</td>
        <td />
        <td data-figure className={groupStart}>
          {formats.plannedMinutes(sums.plannedMinutes)}
        </td>
        <td data-figure>{formats.workedMinutes(sums.workedMinutes)}</td>
        <td data-figure>{signed(sums.differenceMinutes, formats.differenceMinutes)}</td>
        <td data-figure className={groupStart}>
          {formats.nightMinutes(sums.nightMinutes)}
        </td>
        <td data-figure>{formats.weekendMinutes(sums.weekendMinutes)}</td>
        <td data-figure>{formats.holidayMinutes(sums.holidayMinutes)}</td>
        <td data-figure className={groupStart}>
          {formats.leaveMinutes(sums.leaveMinutes)}
        </td>
      </tr>
    </tfoot>
  );
}
