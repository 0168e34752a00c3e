import { Button } from '@/app/_ui/button';
import { dateRange, dateRangeWithYear } from '@/app/_ui/clock';
import type { HoursView } from '@/modules/hours';
import type { HoursChoice } from './hours-address';

export interface NothingPublishedProps {
  readonly view: HoursView;
  readonly onShow: (next: Partial<HoursChoice>) => void;
}

/** Stands in place of the table when nothing is planned or worked in the dates. */
export function NothingPublished({ view, onShow }: NothingPublishedProps) {
  const { from, to, allPeriods } = view;
  const newest = allPeriods.at(-1);
  return (
    <div className="line-cut flex flex-col items-start gap-3 pt-6">
      <p className="max-w-[46rem] text-body">
        No roster is published for {dateRange(from, to)}, and no work is recorded there.{' '}
        {newest
          ? 'Choose other dates.'
          : 'Hours appear here once a supervisor has published a roster of this team.'}
      </p>
      {newest ? (
        <Button onClick={() => onShow({ range: { from: newest.startsOn, to: newest.endsOn } })}>
          Show {dateRangeWithYear(newest.startsOn, newest.endsOn)}, the newest published
        </Button>
      ) : null}
    </div>
  );
}
