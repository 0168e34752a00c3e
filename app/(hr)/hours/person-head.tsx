import type { KeyboardEvent } from 'react';
import { Button } from '@/app/_ui/button';
import type { HoursPerson } from '@/modules/hours';
import { rowId } from './place-focus';

export interface PersonHeadProps {
  readonly person: HoursPerson;
  /** The one name that takes the Tab key. */
  readonly isTabStop: boolean;
  readonly isChosen: boolean;
  readonly panelId: string;
  readonly onFocus: () => void;
  readonly onKeyDown: (event: KeyboardEvent) => void;
  readonly onChoose: () => void;
}

/** The head of a row: the name, which opens the days, and the home skill. */
export function PersonHead({ person, isTabStop, isChosen, panelId, ...props }: PersonHeadProps) {
  return (
    <th scope="row" className="whitespace-nowrap phone:min-w-40 phone:whitespace-normal">
      <Button
        look="quiet"
        id={rowId(person.personId)}
        tabIndex={isTabStop ? 0 : -1}
        aria-expanded={isChosen}
        aria-controls={isChosen ? panelId : undefined}
        onFocus={props.onFocus}
        onKeyDown={props.onKeyDown}
        onClick={props.onChoose}
        className="text-left"
      >
        {person.name}
      </Button>{' '}
      <span className="font-normal text-ink2">{person.homeSkill}</span>
    </th>
  );
}
