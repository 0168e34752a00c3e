import type { HoursPerson } from '@/modules/hours';
import { signed } from './format-hours';
import { HoursCell } from './hours-cell';
import { type HoursFormats, hasDifference, isRecorded } from './sum-hours';

interface Props {
  readonly person: HoursPerson;
  readonly formats: HoursFormats;
}

/** Worked hours and their difference from the plan, or that nothing is recorded. */
export function WorkedCells({ person, formats }: Props) {
  if (!isRecorded(person)) {
    return (
      <td colSpan={2} data-figure className="text-second text-ink3">
        not recorded
      </td>
    );
  }
  return (
    <>
      <HoursCell minutes={person.workedMinutes} format={formats.workedMinutes} />
      <td data-figure className={hasDifference(person) ? 'font-[660]' : 'text-ink3'}>
        {signed(person.differenceMinutes, formats.differenceMinutes)}
      </td>
    </>
  );
}
