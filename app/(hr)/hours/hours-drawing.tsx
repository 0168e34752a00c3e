import { useId, useState } from 'react';
import { CheckField } from '@/app/_ui/check-field';
import type { HoursView } from '@/modules/hours';
import type { PersonId } from '@/modules/units';
import { BarKey } from './bar-key';
import type { HoursChoice } from './hours-address';
import { HoursNotes } from './hours-notes';
import { HoursTable } from './hours-table';
import { NothingPublished } from './nothing-published';
import { PersonDays } from './person-days';
import { focusRow, revealPerson } from './place-focus';
import { hasDifference } from './sum-hours';
import { UnpublishedNote } from './unpublished-note';

interface Props {
  readonly view: HoursView;
  readonly onShow: (next: Partial<HoursChoice>) => void;
}

/** The table of people with the chosen person's days beside it, below it where there is no room. */
export function HoursDrawing({ view, onShow }: Props) {
  const [isFiltered, setFiltered] = useState(false);
  const [chosenId, setChosenId] = useState<PersonId | null>(null);
  const panelId = useId();
  const people = isFiltered ? view.people.filter(hasDifference) : view.people;
  const chosen = people.find(({ personId }) => personId === chosenId);
  const choose = (personId: PersonId) => {
    setChosenId(personId);
    requestAnimationFrame(() => revealPerson(panelId));
  };
  const close = () => {
    if (chosenId) focusRow(chosenId);
    setChosenId(null);
  };
  if (view.people.every(({ days }) => days.length === 0))
    return <NothingPublished view={view} onShow={onShow} />;
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
      <aside
        aria-label="Days of one person, and notes"
        className="min-w-0 border-ink min-[78rem]:self-stretch min-[78rem]:border-l min-[78rem]:pl-5"
      >
        {chosen ? (
          <PersonDays key={chosen.personId} person={chosen} id={panelId} onClose={close} />
        ) : (
          <p className="line-cut pt-3 pb-6 text-body text-ink2">
            Choose a person in the table to see their days.
          </p>
        )}
        <BarKey />
        <HoursNotes payRules={view.payRules} />
      </aside>
    </div>
  );
}
