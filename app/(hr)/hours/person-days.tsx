import { Button } from '@/app/_ui/button';
import type { HoursPerson } from '@/modules/hours';
import { againstContract } from './against-contract';
import { DaysTable } from './days-table';
import { columnFormat, signed } from './format-hours';

interface Props {
  readonly person: HoursPerson;
  /** Id of the heading: it takes the focus where the panel lies out of view. */
  readonly id: string;
  readonly onClose: () => void;
}

/** The days behind one person's figures. */
export function PersonDays({ person, id, onClose }: Props) {
  const { days, differenceMinutes } = person;
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
        <DaysTable person={person} />
      )}
      {differenceMinutes === 0 ? null : (
        <p className="mt-2 text-second text-ink2">
          Worked less planned, on the days with a record:{' '}
          <strong className="font-[660] text-ink">
            {signed(differenceMinutes, columnFormat([differenceMinutes]))} h
          </strong>
          .
        </p>
      )}
    </section>
  );
}
