import type { HoursPerson, HoursView } from '@/modules/hours';
import { BarKey } from './bar-key';
import { HoursNotes } from './hours-notes';
import { PersonDays } from './person-days';

interface Props extends Pick<HoursView, 'payRules'> {
  readonly chosen: HoursPerson | null;
  readonly panelId: string;
  readonly onClose: () => void;
}

/** Beside the table: the days of the chosen person, the key of the bars, how hours are counted. */
export function HoursAside({ chosen, panelId, payRules, onClose }: Props) {
  return (
    <aside
      aria-label="Days of one person, and notes"
      className="min-w-0 border-ink min-[78rem]:self-stretch min-[78rem]:border-l min-[78rem]:pl-5"
    >
      {chosen ? (
        <PersonDays key={chosen.personId} person={chosen} id={panelId} onClose={onClose} />
      ) : (
        <p className="line-cut pt-3 pb-6 text-body text-ink2">
          Choose a person in the table to see their days.
        </p>
      )}
      <BarKey />
      <HoursNotes payRules={payRules} />
    </aside>
  );
}
