import { type KeyboardEvent, useState } from 'react';
import { KeyCap } from '@/app/_ui/key-cap';
import { Table } from '@/app/_ui/table';
import type { HoursPerson } from '@/modules/hours';
import type { PersonId } from '@/modules/units';
import { longestMinutes } from './against-contract';
import { columnFormats } from './format-hours';
import { HoursFoot } from './hours-foot';
import { HoursHead } from './hours-head';
import { HoursRow } from './hours-row';
import { focusRow } from './place-focus';
import { rowAfterKey } from './row-keys';
import { hoursColumns } from './sum-hours';

interface Props {
  /** The rows. */
  readonly people: readonly HoursPerson[];
  /** Also those left out: bars and figures keep their scale when the table is filtered. */
  readonly everybody: readonly HoursPerson[];
  readonly isFiltered: boolean;
  readonly chosenId: PersonId | null;
  readonly panelId: string;
  readonly onChoose: (personId: PersonId) => void;
  /** The focus moved on to another row. */
  readonly onFollow: (personId: PersonId) => void;
  readonly onClose: () => void;
}

/**
 * People and their hours, totals at the foot. The names are one stop of the Tab key: arrow keys, Home
 * and End move among them, Enter opens the days, Escape closes them.
 */
export function HoursTable({ people, everybody, isFiltered, chosenId, ...props }: Props) {
  const [focusedId, setFocusedId] = useState<PersonId | null>(null);
  const stop = people.find(({ personId }) => personId === focusedId) ?? people[0];
  const longest = longestMinutes(everybody);
  const formats = columnFormats(hoursColumns, everybody);
  const onKeyDown = (event: KeyboardEvent, index: number) => {
    if (event.key === 'Escape') return props.onClose();
    const next = people[rowAfterKey(event.key, index, people.length) ?? -1];
    if (!next) return;
    event.preventDefault();
    focusRow(next.personId);
    props.onFollow(next.personId);
  };
  return (
    <>
      <Table label="Hours of each person">
        <HoursHead />
        <tbody>
          {people.map((person, index) => (
            <HoursRow
              key={person.personId}
              person={person}
              longest={longest}
              formats={formats}
              isTabStop={person === stop}
              isChosen={person.personId === chosenId}
              panelId={props.panelId}
              onFocus={() => setFocusedId(person.personId)}
              onKeyDown={(event) => onKeyDown(event, index)}
              onChoose={() => props.onChoose(person.personId)}
            />
          ))}
        </tbody>
        <HoursFoot people={people} isFiltered={isFiltered} formats={formats} />
      </Table>
      <p className="mt-2 text-note text-ink2 phone:hidden" data-print="off">
        Among the names <KeyCap>↑↓</KeyCap> <KeyCap>Home</KeyCap> <KeyCap>End</KeyCap> move,{' '}
        <KeyCap>Enter</KeyCap> opens the days, <KeyCap>Esc</KeyCap> closes them.
      </p>
    </>
  );
}
