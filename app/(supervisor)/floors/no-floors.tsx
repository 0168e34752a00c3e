import { Button } from '@/app/_ui/button';
import { dateRange } from '@/app/_ui/clock';
import { ProblemNote } from '@/app/_ui/problem-note';
import { formatDay, type LocalDate } from '@/modules/units';
import type { Period } from './period';

interface Props {
  readonly period: Period;
  readonly dayBefore: LocalDate;
  /** Whether floors hold on the day before the period. */
  readonly hasFloorsBefore: boolean;
  readonly onContinue: () => void;
  readonly onAdd: () => void;
  readonly isSaving: boolean;
  readonly problem: unknown;
}

/** Where the table will stand: one sentence and one action. */
export function NoFloors(props: Props) {
  const { period, dayBefore, hasFloorsBefore, onContinue, onAdd, isSaving, problem } = props;
  const range = dateRange(period.startsOn, period.endsOn);
  return (
    <div className="line-cut mt-4 pt-4">
      <p className="text-head">
        No floors yet.{' '}
        {hasFloorsBefore
          ? `Those of ${formatDay(dayBefore)} can hold through ${range} too; dates that differ are not copied.`
          : 'Add the first: a skill, its hours, and how many people they need at least.'}
      </p>
      <div className="mt-3">
        {hasFloorsBefore ? (
          <Button look="primary" disabled={isSaving} onClick={onContinue}>
            Use these floors
          </Button>
        ) : (
          <Button look="primary" onClick={onAdd}>
            Add a floor…
          </Button>
        )}
      </div>
      <ProblemNote problem={problem} kept="The floors are as they were." />
    </div>
  );
}
