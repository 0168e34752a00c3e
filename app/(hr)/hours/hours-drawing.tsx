import { useId, useState } from 'react';
import { CheckField } from '@/app/_ui/check-field';
import type { HoursView } from '@/modules/hours';
import type { PersonId } from '@/modules/units';
import { HoursAside } from './hours-aside';
import { HoursTable } from './hours-table';
import { focusRow, revealPerson } from './place-focus';
import { hasDifference } from './sum-hours';
import { UnpublishedNote } from './unpublished-note';

/** The table of people with the chosen person's days beside it, below it where there is no room. */
export function HoursDrawing({ view }: { readonly view: HoursView }) {
  const [isFiltered, setFiltered] = useState(false);
  const [chosenId, setChosenId] = useState<PersonId | null>(null);
  const panelId = useId();
  const people = isFiltered ? view.people.filter(hasDifference) : view.people;
  const chosen = people.find(({ personId }) => personId === chosenId) ?? null;
  const choose = (personId: PersonId) => {
    setChosenId(personId);
    requestAnimationFrame(() => revealPerson(panelId));
  };
  const close = () => {
    if (chosenId) focusRow(chosenId);
    setChosenId(null);
  };
  return (
    <div className="grid items-start gap-x-6 gap-y-6 min-[78rem]:grid-cols-[minmax(0,1fr)_24.5rem]">
      <div className="min-w-0">
        <UnpublishedNote view={view} />
        <CheckField
          label="Only people whose worked hours differ from the plan"
          checked={isFiltered}
          onChange={(event) => setFiltered(event.target.checked)}
          className="mb-1"
        />
        <HoursTable
          people={people}
          everybody={view.people}
          isFiltered={isFiltered}
          chosenId={chosen?.personId ?? null}
          panelId={panelId}
          onChoose={choose}
          onFollow={(personId) => chosen && setChosenId(personId)}
          onClose={close}
        />
      </div>
      <HoursAside chosen={chosen} panelId={panelId} payRules={view.payRules} onClose={close} />
    </div>
  );
}
