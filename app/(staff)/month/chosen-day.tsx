import { blockTimes, endsNote } from '@/app/_ui/calendar/block-words';
import { hours } from '@/app/_ui/clock';
import { restAround } from '@/app/_ui/people-grid/rest-around';
import type { OwnShift, OwnShifts } from '@/modules/roster';
import { formatDay, type LocalDate } from '@/modules/units';
import { postWords } from '../post-words';
import { ownPeriodOn } from './own-frame';

interface Props {
  readonly own: OwnShifts;
  readonly date: LocalDate;
}

/** The chosen day in words: times, post, who shares it, rest before and after. */
export function ChosenDay({ own, date }: Props) {
  const period = ownPeriodOn(own, date);
  const shifts = own.periods.flatMap((one) => one.shifts);
  const ofDay = shifts.filter((shift) => shift.date === date);
  const isLeave = period?.leave.some((one) => one.startsOn <= date && date <= one.endsOn);
  const holiday = own.holidays.find((one) => one.date === date);
  return (
    <section aria-live="polite" aria-label="The chosen day" className="py-3">
      {ofDay.map((shift) => (
        <ShiftWords key={shift.startsAtUtc} shift={shift} shifts={shifts} />
      ))}
      {ofDay.length === 0 ? (
        <h2 className="text-head font-[660]">
          {formatDay(date)}, {isLeave ? 'leave' : period ? 'off' : 'no roster published'}
        </h2>
      ) : null}
      {holiday ? <p>{holiday.name}, public holiday.</p> : null}
    </section>
  );
}

function ShiftWords({
  shift,
  shifts,
}: {
  readonly shift: OwnShift;
  readonly shifts: readonly OwnShift[];
}) {
  const { beforeMinutes, afterMinutes } = restAround(shifts.map(elapsed), elapsed(shift));
  const rest = [
    beforeMinutes === null ? [] : `Rest before: ${hours(beforeMinutes)}.`,
    afterMinutes === null ? [] : `Rest after: ${hours(afterMinutes)}.`,
  ].flat();
  const ends = endsNote(shift);
  return (
    <>
      <h2 className="text-head font-[660]">
        {formatDay(shift.date)}, {shift.kindName}
      </h2>
      <p>
        {[blockTimes(shift), ends, hours(shift.paidMinutes)].filter(Boolean).join(', ')}.{' '}
        {postWords(shift)}.
      </p>
      <p className="text-second text-ink2">{rest.join(' ')}</p>
    </>
  );
}

/** Elapsed minutes, so that rest across a clock change is what passes. */
const elapsed = ({ startsAtUtc, endsAtUtc }: OwnShift) => ({
  startMinute: startsAtUtc / 60_000,
  endMinute: endsAtUtc / 60_000,
});
