'use client';

import { useMemo } from 'react';
import { dateRangeWithYear } from '../clock';
import { coverSteps } from '../floor-graphic/cover-steps';
import { highestStack } from '../floor-graphic/drawing';
import { inRem } from '../floor-graphic/use-width';
import type { BoardGroup } from './board-rows';
import { gridWidth } from './day-columns';
import { useGridFrame } from './grid-context';
import { GridHead } from './grid-head';
import { GroupRows } from './group-rows';
import { TotalStrip } from './total-strip';
import type { GridFocus } from './use-grid-focus';

interface Props {
  readonly groups: readonly BoardGroup[];
  readonly focus: GridFocus;
  /** Element that says which keys move. */
  readonly helpId: string;
}

/** Cover, day heads and people as one grid, so that columns line up and heads stay in view. */
export function GridTable({ groups, focus, helpId }: Props) {
  const { board, days, sizes } = useGridFrame();
  const highest = useMemo(
    () => Math.max(1, ...board.lanes.map((lane) => highestStack(coverSteps([lane])))),
    [board.lanes],
  );
  return (
    <table
      // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: a table of cells to move in is the grid pattern of ARIA
      role="grid"
      aria-label={`Roster ${dateRangeWithYear(board.startsOn, board.endsOn)}, people and days`}
      aria-describedby={helpId}
      aria-readonly="true"
      className="table-fixed border-separate border-spacing-0"
      style={{ width: inRem(gridWidth(sizes, days.length)) }}
      onKeyDown={focus.onKeyDown}
      onFocus={focus.onFocus}
    >
      <colgroup>
        <col style={{ width: inRem(sizes.nameWidth) }} />
        <col span={days.length} style={{ width: inRem(sizes.dayWidth) }} />
      </colgroup>
      <thead className="sticky top-0 z-3 bg-paper">
        <TotalStrip />
        <GridHead />
      </thead>
      {groups.map((group) => (
        <GroupRows
          key={`${group.skillId} ${group.name}`}
          group={group}
          tabStop={focus.tabStop}
          selected={focus.selected}
          highest={highest}
        />
      ))}
    </table>
  );
}
