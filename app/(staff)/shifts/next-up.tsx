import { blockTimes } from '@/app/_ui/calendar/block-words';
import { weekdayName } from '@/app/_ui/clock';
import { DayLine } from '@/app/_ui/day-line';
import { Verdict } from '@/app/_ui/verdict';
import type { OwnPeriod, OwnShift, OwnShifts } from '@/modules/roster';
import { addDays, formatClock, formatDay } from '@/modules/units';
import { postWords } from '../post-words';
import { findNextShift, nextShiftTitle } from './next-shift';

interface Props {
  readonly own: OwnShifts;
  /** Published periods that are not over. */
  readonly periods: readonly OwnPeriod[];
}

/** What comes next, as the title of the sheet. */
export function NextUp({ own, periods }: Props) {
  const shifts = periods.flatMap((period) => period.shifts);
  const next = findNextShift(shifts, own.today, own.nowMinute);
  if (!next) {
    return (
      <Verdict lead={periods.length > 0 ? nothingAhead : nothingPublished}>No shifts ahead</Verdict>
    );
  }
  return (
    <>
      <Verdict lead={`${nextTimes(next.shift)}. ${postWords(next.shift)}.`}>
        {nextShiftTitle(next, own.today)}
      </Verdict>
      <DayLine
        shift={next.shift}
        dayStartsAtMinute={own.dayStartsAtMinute}
        className="mb-6 h-6! max-w-120"
      />
    </>
  );
}

const nothingAhead = 'You have no shift in what is published. Later rosters appear here.';
const nothingPublished =
  'No roster has been published for these days yet. You get a mail as soon as one is.';

/** `Fri 15 Jan, 23:00 to Sat 07:00`, or `Fri 15 Jan, 07:00–15:00` within one day. */
function nextTimes(shift: OwnShift): string {
  const { date, startMinute, endMinute } = shift;
  const day = formatDay(date);
  if (endMinute <= 1440) return `${day}, ${blockTimes(shift)}`;
  const endDay = weekdayName(addDays(date, Math.floor(endMinute / 1440)));
  return `${day}, ${formatClock(startMinute)} to ${endDay} ${formatClock(endMinute)}`;
}
