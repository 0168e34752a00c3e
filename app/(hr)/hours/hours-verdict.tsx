import { buttonClass } from '@/app/_ui/button';
import { dateRange, dateRangeWithYear } from '@/app/_ui/clock';
import { Verdict } from '@/app/_ui/verdict';
import { type HoursChoice, hoursPath } from './hours-address';

interface Props {
  readonly choice: HoursChoice;
  readonly teamName: string;
}

/** The title with the dates that were asked for, and their file. */
export function HoursVerdict({ choice, teamName }: Props) {
  const { from, to } = choice.range;
  return (
    <Verdict
      lead={`${teamName}. Open: nothing is locked, so these figures can still change.`}
      actions={
        <a
          href={`/api/v1/${hoursPath(choice, '.csv')}`}
          download
          className={buttonClass('outline')}
        >
          Download CSV, {dateRangeWithYear(from, to)}
        </a>
      }
    >
      Hours, {dateRange(from, to)}
    </Verdict>
  );
}
