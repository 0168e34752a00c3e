'use client';

import type { ReactNode } from 'react';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import { type Floor, type ShiftKind, toneOf } from '@/modules/coverage';
import { weekdayNames } from '@/modules/units';
import { FloorRowHead } from './floor-row-head';
import type { FloorRow } from './floor-rows';
import { GridHints } from './grid-hints';
import { buttonColumn, numberColumns } from './grid-selection';
import { GridToolbar } from './grid-toolbar';
import { NumberCell } from './number-cell';
import { TypedProblem } from './number-editor';
import { RowButton } from './row-button';
import { useFloorGrid } from './use-floor-grid';
import type { FloorNeedsState } from './use-floor-needs';

interface Props {
  readonly rows: readonly FloorRow[];
  readonly kinds: readonly ShiftKind[];
  readonly needs: FloorNeedsState;
  readonly onChange: (floor: Floor) => void;
  /** The drawing above the columns of the weekdays. */
  readonly children: ReactNode;
}

const columns = Array.from({ length: numberColumns }, (_, column) => column);

/** The weekly pattern of every floor as a grid to type into. */
export function FloorsTable({ rows, kinds, needs, onChange, children }: Props) {
  const grid = useFloorGrid(rows, needs.save);
  // The buttons of the problem go away with it: the keyboard goes back to the table.
  const leaveTo = (solve: () => void) => {
    grid.takeFocus();
    solve();
  };
  return (
    <div>
      <GridToolbar grid={grid} />
      <div className="relative overflow-x-auto print:overflow-visible">
        <div className="min-w-[44rem] pt-4 phone:min-w-[39rem]">
          {children}
          <table
            ref={grid.table}
            // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: a table to type into is a grid (ARIA 1.2)
            role="grid"
            aria-label="Least people on duty, by floor and weekday"
            aria-multiselectable
            className="w-full table-fixed border-collapse border-b border-rule text-body"
          >
            <GridHead />
            <tbody>
              {rows.map((row, index) => (
                <tr key={row.floor.id} className="h-8 phone:h-11">
                  <FloorRowHead row={row} tone={row.kind ? toneOf(row.kind, kinds) : null} />
                  {columns.map((column) => (
                    <NumberCell
                      key={column}
                      grid={grid}
                      row={row}
                      place={{ row: index, column }}
                      state={needs.stateOf(row.floor.id, column)}
                    />
                  ))}
                  <RowButton
                    grid={grid}
                    row={row}
                    place={{ row: index, column: buttonColumn }}
                    onPress={() => onChange(row.floor)}
                  />
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </div>
      <div className="mt-2 grid gap-2">
        <TypedProblem typed={grid.typing.typed} />
        <ProblemNote
          problem={needs.problem}
          kept="Numbers that are not saved are marked with ! in the table."
          action={
            <div className="flex flex-wrap gap-2">
              <Button onClick={() => leaveTo(needs.sendAgain)}>Save again</Button>
              <Button onClick={() => leaveTo(needs.giveUp)}>Go back to what is saved</Button>
            </div>
          }
        />
        <GridHints rows={rows} />
      </div>
    </div>
  );
}

function GridHead() {
  return (
    <thead>
      <tr className="border-b-[1.5px] border-ink text-second">
        <th
          scope="col"
          className="sticky left-0 z-2 w-[15.5rem] bg-paper pb-1 text-left phone:w-[9.5rem]"
        >
          <span className="sr-only">Floor</span>
        </th>
        {weekdayNames.map((name, day) => (
          <th key={name} scope="col" className={`pb-1 font-[640] ${day > 4 ? 'bg-recess' : ''}`}>
            {name}
          </th>
        ))}
        <th scope="col" className="w-16 border-l border-ink pb-1 font-[640]">
          Holiday
        </th>
        <th scope="col" className="w-[4.75rem]">
          <span className="sr-only">Change the floor</span>
        </th>
      </tr>
    </thead>
  );
}
