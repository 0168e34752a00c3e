import { ChoiceLetters } from './cell';
import { firstDays } from './line-row';

/** The columns of the table of patterns, each with a note on how to fill it in. */
export function LinesHead() {
  return (
    <thead>
      <tr>
        <th scope="col">Pattern</th>
        <th scope="col">Shift kind</th>
        <th scope="col">Skill</th>
        <Column head="Days on" note="in a row" />
        <th scope="col">
          First day of the run
          <ChoiceLetters choices={firstDays} />
        </th>
        <Column head="Weekday" note="pay of a day" />
        <Column head="Saturday" note="pay of a day" />
        <Column head="Sunday" note="pay of a day" />
        <Column head="Extra day" note="after 5 days" />
        <Column head="At most" note="people" />
        <Column head="At most" note="% of all" />
        <th scope="col">
          <span className="sr-only">Remove</span>
        </th>
      </tr>
    </thead>
  );
}

function Column({ head, note }: { readonly head: string; readonly note: string }) {
  return (
    <th scope="col">
      {head}
      <span className="block font-normal text-ink3">{note}</span>
    </th>
  );
}
