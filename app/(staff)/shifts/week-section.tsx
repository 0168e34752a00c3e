import { dateRange } from '@/app/_ui/clock';
import type { OwnShifts } from '@/modules/roster';
import { freeWords, weekTotal } from './period-words';
import { ShiftLine } from './shift-line';
import type { Week } from './week-lines';

interface Props {
  readonly week: Week;
  readonly own: OwnShifts;
}

/** A week: its total in the head, then every day in order. */
export function WeekSection({ week, own }: Props) {
  return (
    <section className="mt-4">
      <div className="line-group flex flex-wrap items-baseline justify-between gap-x-3 pb-1">
        <h3 className="text-body font-[660]">{dateRange(week.from, week.to)}</h3>
        <p className="text-second text-ink2">{weekTotal(week, own.weeklyMinutes)}</p>
      </div>
      <ol>
        {week.lines.map((line) =>
          line.is === 'shift' ? (
            <ShiftLine
              key={line.shift.startsAtUtc}
              shift={line.shift}
              dayStartsAtMinute={own.dayStartsAtMinute}
              holidayName={own.holidays.find(({ date }) => date === line.shift.date)?.name ?? null}
              isToday={line.shift.date === own.today}
              isPast={line.shift.date < own.today}
            />
          ) : (
            <li key={line.from} className="line-row py-2 pl-17 text-second text-ink3">
              {freeWords(line)}
            </li>
          ),
        )}
      </ol>
    </section>
  );
}
