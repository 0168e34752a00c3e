import type { KeyboardEvent } from 'react';
import { Button } from '@/app/_ui/button';
import type { HoursPerson } from '@/modules/hours';
import { againstContract } from './against-contract';
import { ContractBarDrawing } from './contract-bar-drawing';
import { HoursCell } from './hours-cell';
import { groupStart } from './hours-head';
import { rowId } from './place-focus';
import { WorkedCells } from './worked-cells';

interface Props {
  readonly person: HoursPerson;
  /** Minutes at the right end of the bar. */
  readonly longest: number;
  readonly format: (minutes: number) => string;
  readonly isTabStop: boolean;
  readonly isChosen: boolean;
  readonly panelId: string;
  readonly onFocus: () => void;
  readonly onKeyDown: (event: KeyboardEvent) => void;
  readonly onChoose: () => void;
}

/** One person: who, the bar against the contract with its word, and the hours. */
export function HoursRow({ person, longest, format, isTabStop, isChosen, ...props }: Props) {
  return (
    <tr
      className={
        isChosen
          ? 'outline-[2.5px] -outline-offset-[2.5px] outline-act *:bg-act-wash!'
          : 'hover:*:bg-recess!'
      }
    >
      <th scope="row" className="whitespace-nowrap phone:min-w-40 phone:whitespace-normal">
        <Button
          look="quiet"
          id={rowId(person.personId)}
          tabIndex={isTabStop ? 0 : -1}
          aria-expanded={isChosen}
          aria-controls={isChosen ? props.panelId : undefined}
          onFocus={props.onFocus}
          onKeyDown={props.onKeyDown}
          onClick={props.onChoose}
          className="text-left"
        >
          {person.name}
        </Button>{' '}
        <span className="font-normal text-ink2">{person.homeSkill}</span>
      </th>
      <td className="tabular-nums">{person.staffNumber}</td>
      <HoursCell minutes={person.contractMinutes} format={format} />
      <td>
        <span className="flex items-center gap-2 whitespace-nowrap">
          <ContractBarDrawing person={person} longest={longest} />
          <span className="text-second text-ink2">{againstContract(person)}</span>
        </span>
      </td>
      <HoursCell minutes={person.plannedMinutes} format={format} className={groupStart} />
      <WorkedCells person={person} format={format} />
      <HoursCell minutes={person.nightMinutes} format={format} className={groupStart} />
      <HoursCell minutes={person.weekendMinutes} format={format} />
      <HoursCell minutes={person.holidayMinutes} format={format} />
      <HoursCell minutes={person.leaveMinutes} format={format} className={groupStart} />
    </tr>
  );
}
