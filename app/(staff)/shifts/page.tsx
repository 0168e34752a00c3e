import type { Metadata } from 'next';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { Verdict } from '@/app/_ui/verdict';
import { readOwnShifts } from '@/modules/roster/server';
import { ShiftsView } from './shifts-view';

export const metadata: Metadata = { title: 'Shifts' };

export default async function Page() {
  const actor = await requireActor('own-shifts.read');
  const own = readOwnShifts(actor);
  return (
    <Shell actor={actor}>
      {own.ok ? (
        <ShiftsView first={own.value} />
      ) : (
        <Verdict lead={own.error.detail}>No shifts here</Verdict>
      )}
    </Shell>
  );
}
