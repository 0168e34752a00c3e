import type { Metadata } from 'next';
import { requireActor } from '@/app/_session';
import { rangeOf } from '@/app/_ui/calendar/view-range';
import { Shell } from '@/app/_ui/shell';
import { Verdict } from '@/app/_ui/verdict';
import { readOwnCalendar, readOwnShifts } from '@/modules/roster/server';
import { MonthView } from './month-view';

export const metadata: Metadata = { title: 'Month' };

export default async function Page() {
  const actor = await requireActor('own-shifts.read');
  const own = readOwnShifts(actor);
  const range = own.ok ? rangeOf('month', own.value.today) : null;
  const entries = range ? readOwnCalendar(actor, range) : null;
  return (
    <Shell actor={actor}>
      {own.ok && range && entries?.ok ? (
        <MonthView own={own.value} first={{ range, entries: entries.value }} />
      ) : (
        <Verdict lead={own.ok ? undefined : own.error.detail}>No shifts here</Verdict>
      )}
    </Shell>
  );
}
