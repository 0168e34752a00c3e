import { useRef } from 'react';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import { SectionHead } from '@/app/_ui/section-head';
import { formatDay } from '@/modules/units';
import { type Difference, type DifferingDate, differenceName } from './differing-dates';

interface Props {
  readonly dates: readonly DifferingDate[];
  readonly onAdd: () => void;
  readonly onChange: (difference: Difference) => void;
  readonly onClear: (difference: Difference) => void;
  /** What the last clearing threw. */
  readonly problem: unknown;
}

/** Dates of the period on which floors differ from the weekly pattern, with the reason. */
export function DatesThatDiffer({ dates, onAdd, onChange, onClear, problem }: Props) {
  const addButton = useRef<HTMLButtonElement>(null);
  const clear = (difference: Difference) => {
    // The line goes away with its buttons: the keyboard needs another place.
    addButton.current?.focus();
    onClear(difference);
  };
  return (
    <section aria-labelledby="dates-head">
      <SectionHead
        id="dates-head"
        aside={
          <Button ref={addButton} onClick={onAdd}>
            Add a date…
          </Button>
        }
      >
        Dates that differ
      </SectionHead>
      {dates.length === 0 ? (
        <p className="text-ink2">None: every day of this period follows the table.</p>
      ) : null}
      <ul>
        {dates.map((entry) => (
          <li key={entry.date} className="line-row flex flex-wrap gap-x-4 py-1.5">
            <span className="w-24 shrink-0 font-[660]">{formatDay(entry.date)}</span>
            <div className="min-w-0 flex-1 phone:basis-full">
              {entry.holidayName ? <p>{entry.holidayName}: the holiday column holds.</p> : null}
              {entry.differences.map((difference) => (
                <DifferenceLine
                  key={difference.row.floor.id}
                  difference={difference}
                  onChange={() => onChange(difference)}
                  onClear={() => clear(difference)}
                />
              ))}
            </div>
          </li>
        ))}
      </ul>
      <ProblemNote problem={problem} kept="The date is as it was." />
    </section>
  );
}

interface LineProps {
  readonly difference: Difference;
  readonly onChange: () => void;
  readonly onClear: () => void;
}

function DifferenceLine({ difference, onChange, onClear }: LineProps) {
  const { row, entry, usual } = difference;
  const name = differenceName(difference);
  return (
    <div className="flex items-baseline justify-between gap-x-4 phone:flex-wrap">
      <p className="min-w-0 flex-1 phone:basis-full">
        {row.skillName} {row.kind?.name ?? row.times} {usual} to{' '}
        <span className="font-[660]">{entry.people}</span>
        {entry.reason ? <span className="text-ink2">, {entry.reason}</span> : null}
      </p>
      <span className="flex gap-4">
        <Button look="quiet" aria-label={`Change ${name}`} onClick={onChange}>
          Change…
        </Button>
        <Button look="quiet" aria-label={`Clear ${name}`} onClick={onClear}>
          Clear
        </Button>
      </span>
    </div>
  );
}
