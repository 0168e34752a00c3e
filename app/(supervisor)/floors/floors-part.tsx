import { useRef } from 'react';
import { ProblemNote } from '@/app/_ui/problem-note';
import { type Coverage, isInForce } from '@/modules/coverage';
import { addDays, formatDay } from '@/modules/units';
import type { OpenDialog } from './floor-dialogs';
import type { FloorRow } from './floor-rows';
import { FloorsTable } from './floors-table';
import { NoFloors } from './no-floors';
import { normalWeek } from './normal-week';
import type { Period } from './period';
import type { FloorEdits } from './use-floor-edits';
import type { FloorNeedsState } from './use-floor-needs';
import { WeekDrawing } from './week-drawing';

/** What the parts of the sheet share. */
export interface SheetParts {
  readonly coverage: Coverage;
  readonly period: Period;
  readonly rows: readonly FloorRow[];
  readonly needs: FloorNeedsState;
  readonly edits: FloorEdits;
  readonly onOpen: (dialog: OpenDialog) => void;
}

/** The drawing of a normal week above the table, or what to do while there are no floors. */
export function FloorsPart({ coverage, period, rows, needs, edits, onOpen }: SheetParts) {
  const { team, skills, kinds } = coverage;
  const part = useRef<HTMLElement>(null);
  const place = {
    ref: part,
    tabIndex: -1,
    'aria-label': 'Weekly pattern',
    className: 'min-w-0 outline-none',
  };
  const steps = normalWeek(
    rows.map(({ floor }) => floor),
    skills.map(({ id }) => id),
    team.dayStartsAtMinute,
    period.startsOn,
  );
  const drawing = (
    <WeekDrawing
      steps={steps}
      dayStartsAtMinute={team.dayStartsAtMinute}
      hasFloors={rows.length > 0}
    />
  );
  const dayBefore = addDays(period.startsOn, -1);
  if (rows.length === 0) {
    return (
      <section {...place}>
        {drawing}
        <NoFloors
          period={period}
          dayBefore={dayBefore}
          hasFloorsBefore={needs.floors.some((floor) => isInForce(floor, dayBefore))}
          onContinue={() => {
            // The button gives way to the table: the keyboard needs another place.
            part.current?.focus();
            edits.carryOn.mutate({ from: dayBefore, to: period.endsOn });
          }}
          onAdd={() => onOpen({ kind: 'floor', floor: null })}
          isSaving={edits.carryOn.isPending}
          problem={edits.carryOn.error}
        />
      </section>
    );
  }
  return (
    <section {...place}>
      <FloorsTable
        rows={rows}
        kinds={kinds}
        needs={needs}
        onChange={(floor) => onOpen({ kind: 'floor', floor })}
      >
        {drawing}
      </FloorsTable>
      <p className="mt-1 text-second text-ink2">{sayReach(rows, period)}</p>
      <ProblemNote problem={edits.remove.error} kept="The floor is as it was." />
    </section>
  );
}

/** Where else the numbers of the table hold: a change here is a change there. */
function sayReach(rows: readonly FloorRow[], period: Period): string {
  const earliest = rows.map(({ floor }) => floor.effectiveFrom).sort()[0] ?? period.startsOn;
  const isOpenEnded = rows.some(({ floor }) => floor.effectiveTo === null);
  const latest =
    rows
      .map(({ floor }) => floor.effectiveTo ?? '')
      .sort()
      .at(-1) ?? '';
  const parts = [
    ...(earliest < period.startsOn ? [`from ${formatDay(earliest)}`] : []),
    ...(isOpenEnded ? ['until you end them'] : []),
    ...(!isOpenEnded && latest > period.endsOn ? [`to ${formatDay(latest)}`] : []),
  ];
  if (parts.length === 0) return 'A number of the table holds on every such day of this period.';
  return `These floors hold ${parts.join(' ')}: a number changed here changes on all their dates. For one date, use “Dates that differ”.`;
}
