import { Button } from '@/app/_ui/button';
import { dateRangeWithYear } from '@/app/_ui/clock';
import type { PublishedPeriod } from '@/modules/hours';
import type { DateRange } from '@/modules/units';
import type { HoursChoice } from './hours-address';

interface Props {
  readonly periods: readonly PublishedPeriod[];
  readonly shown: DateRange;
  readonly onShow: (next: Partial<HoursChoice>) => void;
}

/** Older periods are reached by their dates. */
const most = 6;

/** The newest published periods, each shown at one press. */
export function PeriodButtons({ periods, shown, onShow }: Props) {
  if (periods.length === 0) return null;
  return (
    <fieldset className="mt-3 flex flex-wrap items-center gap-2">
      <legend className="float-left mr-2 flex min-h-8 items-center text-second font-[640] phone:min-h-0 phone:w-full">
        Published periods
      </legend>
      {periods.slice(-most).map(({ startsOn, endsOn }) => (
        <Button
          key={startsOn}
          aria-pressed={shown.from === startsOn && shown.to === endsOn}
          onClick={() => onShow({ range: { from: startsOn, to: endsOn } })}
          className="text-second! aria-pressed:border-[2.5px] aria-pressed:border-act aria-pressed:bg-act-wash"
        >
          {dateRangeWithYear(startsOn, endsOn)}
        </Button>
      ))}
    </fieldset>
  );
}
