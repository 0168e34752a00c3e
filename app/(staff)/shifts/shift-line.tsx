import { blockTimes, endsNote } from '@/app/_ui/calendar/block-words';
import { dayNumber, longDay, weekdayName } from '@/app/_ui/clock';
import { DayLine } from '@/app/_ui/day-line';
import type { OwnShift } from '@/modules/roster';
import { postWords } from '../post-words';

interface Props {
  readonly shift: OwnShift;
  readonly dayStartsAtMinute: number;
  readonly holidayName: string | null;
  readonly isToday: boolean;
  readonly isPast: boolean;
}

/** One shift: its date, kind and times, drawn on its day, its post and who shares it. */
export function ShiftLine({ shift, dayStartsAtMinute, holidayName, isToday, isPast }: Props) {
  const ends = endsNote(shift);
  const tone = isPast ? 'text-ink3' : 'text-ink';
  return (
    <li className={`line-row grid grid-cols-[3.75rem_1fr] gap-x-2 py-2 ${tone}`}>
      <p>
        <span className="sr-only">{longDay(shift.date)}: </span>
        <span aria-hidden="true">
          <span className="block text-second text-ink2">{weekdayName(shift.date)}</span>
          <span className="block text-verdict leading-tight font-[680]">
            {dayNumber(shift.date)}
          </span>
        </span>
        {isToday ? <span className="block text-note font-[660] text-act">today</span> : null}
      </p>
      <div className="min-w-0">
        <p className="flex flex-wrap items-baseline gap-x-2">
          <span className="text-head font-[680]">{shift.kindName}</span>
          <span>{blockTimes(shift)}</span>
          {ends ? <span className="text-second text-ink2">{ends}</span> : null}
          {holidayName ? (
            <span className="text-second text-ink2">{holidayName}, holiday</span>
          ) : null}
        </p>
        <DayLine shift={shift} dayStartsAtMinute={dayStartsAtMinute} className="my-1 max-w-100" />
        <p className="text-second text-ink2">{postWords(shift)}</p>
      </div>
    </li>
  );
}
