import type { UseQueryResult } from '@tanstack/react-query';
import type { Footing } from '@/modules/problem';
import { ContinueFloors } from './continue-floors';
import { DatesThatDiffer } from './dates-that-differ';
import { differingDates } from './differing-dates';
import type { SheetParts } from './floors-part';
import { FootingPanel } from './footing-panel';
import { nextPeriod } from './period';

interface Props extends SheetParts {
  readonly footing: UseQueryResult<Footing>;
}

/** Beside the table: whether contracts give the hours, dates that differ, and the next period. */
export function FloorsAside({ coverage, period, rows, edits, onOpen, footing }: Props) {
  const next = nextPeriod(period, coverage.team.periodDays);
  const floors = rows.map(({ floor }) => floor);
  return (
    <div className="grid gap-y-6">
      <FootingPanel
        footing={footing.data}
        problem={footing.error}
        onTryAgain={() => footing.refetch()}
        leavesOut={floors.some(
          ({ counting, priceCentsPerHour }) => counting === 'shared' || priceCentsPerHour !== null,
        )}
      />
      <DatesThatDiffer
        dates={differingDates(rows, coverage.holidays, period)}
        onAdd={() => onOpen({ kind: 'date', difference: null })}
        onChange={(difference) => onOpen({ kind: 'date', difference })}
        onClear={({ row, entry }) =>
          edits.clearDate.mutate({ floorId: row.floor.id, date: entry.date })
        }
        problem={edits.clearDate.error}
      />
      <ContinueFloors
        floors={floors}
        period={period}
        next={next}
        onContinue={() => edits.carryOn.mutate({ from: period.endsOn, to: next.endsOn })}
        isSaving={edits.carryOn.isPending}
        problem={edits.carryOn.error}
      />
    </div>
  );
}
