import { buttonClass } from '@/app/_ui/button';
import { dateRange } from '@/app/_ui/clock';
import type { OwnPeriod } from '@/modules/roster';
import { formatDay, type LocalDate } from '@/modules/units';
import { counted } from './period-words';

interface Props {
  readonly periods: readonly OwnPeriod[];
  readonly today: LocalDate;
}

/** Published periods that wait for a confirmation, named on the first screen with the way to them. */
export function ConfirmNotice({ periods, today }: Props) {
  const waiting = periods.filter(
    ({ confirmedAtUtc, shifts }) => confirmedAtUtc === null && shifts.length > 0,
  );
  return waiting.map(({ versionId, startsOn, endsOn, shifts, confirmBy }) => (
    <div key={versionId} className="mt-3 mb-4 border-[1.25px] border-ink p-3">
      <p className="font-[660]">
        {dateRange(startsOn, endsOn)} is published: {counted(shifts.length, 'shift')}.
      </p>
      <p className="text-ink2">
        Please read and confirm{confirmBy ? dueWords(confirmBy, today) : ''}.
      </p>
      <a href={`#period-${versionId}`} className={buttonClass('primary', 'mt-2 phone:w-full')}>
        See the shifts of {dateRange(startsOn, endsOn)}
      </a>
    </div>
  ));
}

const dueWords = (confirmBy: LocalDate, today: LocalDate): string =>
  confirmBy < today ? `; it was due ${formatDay(confirmBy)}` : ` by ${formatDay(confirmBy)}`;
