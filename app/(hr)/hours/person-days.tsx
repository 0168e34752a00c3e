import { Button } from '@/app/_ui/button';
import { Table } from '@/app/_ui/table';
import type { HoursPerson } from '@/modules/hours';
import { againstContract } from './against-contract';
import { DayRow } from './day-row';
import { columnFormat, signed } from './format-hours';

interface Props {
  readonly person: HoursPerson;
  /** Id of the heading: it takes the focus where the panel lies out of view. */
  readonly id: string;
  readonly onClose: () => void;
}

/** The days behind one person's figures. */
export function PersonDays({ person, id, onClose }: Props) {
  const { days } = person;
  const format = columnFormat(
    days.flatMap((day) => [
      day.plannedMinutes,
      day.workedMinutes ?? 0,
      day.nightMinutes,
      day.weekendMinutes,
      day.holidayMinutes,
    ]),
  );
  return (
    <section
      aria-labelledby={id}
      className="line-cut mb-6 pt-3"
      onKeyDown={(event) => event.key === 'Escape' && onClose()}
    >
      <div className="flex items-start justify-between gap-4">
        <h2 id={id} tabIndex={-1} className="text-verdict font-[660]">
          {person.name}
        </h2>
        <Button look="quiet" onClick={onClose}>
          Close
        </Button>
      </div>
      <p className="mb-2 text-second text-ink2">
        {person.homeSkill}, staff no. {person.staffNumber}. Against contract:{' '}
        {againstContract(person)}.
      </p>
      {days.length === 0 ? (
        <p className="text-body">Nothing is planned or worked in these dates.</p>
      ) : (
        <Table label={`Days of ${person.name}`} maxHeight="34rem">
          <DaysHead />
          <tbody>
            {days.map((day) => (
              <DayRow key={day.date} day={day} format={format} />
            ))}
          </tbody>
          <tfoot>
            <tr>
              <th scope="row">{days.length === 1 ? '1 day' : `${days.length} days`}</th>
              <td data-figure>{format(person.plannedMinutes)}</td>
              <td data-figure>{format(person.workedMinutes)}</td>
              <td data-figure>{format(person.nightMinutes)}</td>
              <td data-figure>{format(person.weekendMinutes)}</td>
              <td data-figure>{format(person.holidayMinutes)}</td>
            </tr>
          </tfoot>
        </Table>
      )}
      {person.differenceMinutes === 0 ? null : (
        <p className="mt-2 text-second text-ink2">
          Worked less planned, on the days with a record:{' '}
          <strong className="font-[660] text-ink">
            {signed(person.differenceMinutes, format)} h
          </strong>
          .
        </p>
      )}
    </section>
  );
}

function DaysHead() {
  return (
    <thead>
      <tr>
        <th scope="col">Day, shift, post</th>
        {['Planned', 'Worked', 'Night', 'Weekend', 'Holiday'].map((head) => (
          <th key={head} scope="col" data-figure>
            {head}
          </th>
        ))}
      </tr>
    </thead>
  );
}
