'use client';

import type { ReactNode } from 'react';
import { dateRange } from '@/app/_ui/clock';
import { SectionHead } from '@/app/_ui/section-head';
import type { OwnPeriod, OwnShifts } from '@/modules/roster';
import { formatDay } from '@/modules/units';
import { StandingStrip } from '../standing-strip';
import { confirmId } from './confirm-box';
import { splitWeeks } from './order-periods';
import { counted } from './period-words';
import { WeekSection } from './week-section';

interface Props {
  readonly period: OwnPeriod;
  readonly own: OwnShifts;
  /** The question to confirm: it stands after the list. */
  readonly children: ReactNode;
}

/** One published period: figures, the shifts by week, then the question to confirm. */
export function PeriodSection({ period, own, children }: Props) {
  const { past, ahead } = splitWeeks(period, own.today);
  const isRunning = period.startsOn <= own.today;
  const headId = `period-${period.versionId}`;
  return (
    <section aria-labelledby={headId} className="mb-9 min-w-0">
      <SectionHead id={headId} aside={<State period={period} />}>
        {isRunning ? 'Now' : 'Next'}: {dateRange(period.startsOn, period.endsOn)}
      </SectionHead>
      <StandingStrip period={period} />
      {period.shifts.length === 0 ? (
        <p className="line-group py-3">You have no shifts in this period.</p>
      ) : (
        <>
          {past.length > 0 ? (
            <details className="mt-2">
              <summary className="flex min-h-8 items-center text-act underline underline-offset-3 phone:min-h-11">
                Earlier:{' '}
                {counted(
                  past.reduce((sum, week) => sum + week.shiftCount, 0),
                  'shift',
                )}{' '}
                before {formatDay(ahead[0]?.from ?? period.endsOn)}
              </summary>
              {past.map((week) => (
                <WeekSection key={week.from} week={week} own={own} />
              ))}
            </details>
          ) : null}
          {ahead.map((week) => (
            <WeekSection key={week.from} week={week} own={own} />
          ))}
          {children}
        </>
      )}
    </section>
  );
}

/** Whether the period is confirmed; if not, a way down to the question. */
function State({ period }: { readonly period: OwnPeriod }) {
  if (period.shifts.length === 0) return null;
  if (period.confirmedAtUtc !== null) return <p className="text-second text-holds">confirmed</p>;
  return (
    <a
      href={`#${confirmId(period)}`}
      className="inline-flex min-h-6 items-center text-second text-act underline underline-offset-3 phone:min-h-11"
    >
      Not confirmed yet
    </a>
  );
}
