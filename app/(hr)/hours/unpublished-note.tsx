import { dateRange } from '@/app/_ui/clock';
import type { HoursView } from '@/modules/hours';
import { unpublishedDays } from './unpublished-days';

/** Says which of the dates no published roster covers: they hold no planned hours. */
export function UnpublishedNote({ view }: { readonly view: HoursView }) {
  const gaps = unpublishedDays(view, view.periods);
  if (gaps.length === 0) return null;
  const names = gaps.map(({ from, to }) => dateRange(from, to)).join(', ');
  return (
    <p className="mb-2 max-w-[46rem] text-body">
      <strong className="font-[660]">No roster is published for {names}.</strong> These days hold no
      planned hours.
    </p>
  );
}
