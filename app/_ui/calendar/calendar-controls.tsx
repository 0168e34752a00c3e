import type { LocalDate } from '@/modules/units';
import { Button } from '../button';
import { ChoiceBar } from '../choice-bar';
import type { CalendarPlace } from './use-calendar-place';
import { type View, views } from './view-range';

interface Props {
  readonly place: CalendarPlace;
  readonly today: LocalDate;
}

const viewNames: Record<View, string> = {
  month: 'Month',
  week: 'Week',
  day: 'Day',
  agenda: 'Agenda',
};

const stepNames: Record<View, string> = {
  month: 'month',
  week: 'week',
  day: 'day',
  agenda: 'two weeks',
};

/** Moves through time, changes the view, and turns the drawing into a table and back. */
export function CalendarControls({ place, today }: Props) {
  const { view, date, isTable } = place;
  return (
    <>
      <div className="flex gap-2">
        <Button
          aria-label={`Previous ${stepNames[view]}`}
          className="min-w-8 phone:min-w-11"
          onClick={() => place.step(-1)}
        >
          ‹
        </Button>
        <Button onClick={() => place.show(view, today)}>Today</Button>
        <Button
          aria-label={`Next ${stepNames[view]}`}
          className="min-w-8 phone:min-w-11"
          onClick={() => place.step(1)}
        >
          ›
        </Button>
      </div>
      <Button onClick={() => place.setTable(!isTable)} aria-keyshortcuts="T">
        {isTable ? 'Show as calendar' : 'Show as table'}
      </Button>
      <ChoiceBar
        label="View"
        className="phone:w-full"
        choices={views.map((value) => ({ value, label: viewNames[value] }))}
        value={view}
        onChange={(next) => place.show(next, date)}
      />
    </>
  );
}
