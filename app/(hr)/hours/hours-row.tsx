import { againstContract } from './against-contract';
import { ContractBarDrawing } from './contract-bar-drawing';
import { HoursCell } from './hours-cell';
import { groupStart } from './hours-head';
import { PersonHead, type PersonHeadProps } from './person-head';
import type { HoursFormats } from './sum-hours';
import { WorkedCells } from './worked-cells';

interface Props extends PersonHeadProps {
  /** Minutes at the right end of the bar. */
  readonly longest: number;
  readonly formats: HoursFormats;
}

/** One person: who, the bar against the contract with its word, and the hours. */
export function HoursRow({ person, longest, formats, isChosen, ...props }: Props) {
  return (
    <tr className={isChosen ? `*:bg-act-wash! ${chosenOutline}` : 'hover:*:bg-recess!'}>
      <PersonHead person={person} isChosen={isChosen} {...props} />
      <td className="tabular-nums">{person.staffNumber}</td>
      <HoursCell minutes={person.contractMinutes} format={formats.contractMinutes} />
      <td>
        <span className="flex gap-2 whitespace-nowrap">
          <ContractBarDrawing person={person} longest={longest} />
          <span className="self-baseline text-second text-ink2">{againstContract(person)}</span>
        </span>
      </td>
      <HoursCell
        minutes={person.plannedMinutes}
        format={formats.plannedMinutes}
        className={groupStart}
      />
      <WorkedCells person={person} formats={formats} />
      <HoursCell
        minutes={person.nightMinutes}
        format={formats.nightMinutes}
        className={groupStart}
      />
      <HoursCell minutes={person.weekendMinutes} format={formats.weekendMinutes} />
      <HoursCell minutes={person.holidayMinutes} format={formats.holidayMinutes} />
      <HoursCell
        minutes={person.leaveMinutes}
        format={formats.leaveMinutes}
        className={groupStart}
      />
    </tr>
  );
}

/** The outline of a selection, drawn inside each cell: one around the row would hide behind a held column. */
const chosenOutline =
  '*:shadow-[inset_0_2.5px_var(--act),inset_0_-2.5px_var(--act)] ' +
  '*:first:shadow-[inset_2.5px_2.5px_var(--act),inset_0_-2.5px_var(--act)] ' +
  '*:last:shadow-[inset_-2.5px_2.5px_var(--act),inset_0_-2.5px_var(--act)]';
