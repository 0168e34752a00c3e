'use client';

import type { BoardGroup } from './board-rows';
import { GroupHead } from './group-head';
import type { GridPlace } from './move-focus';
import { PersonRowView } from './person-row';
import { VisitRow } from './visit-row';

interface Props {
  readonly group: BoardGroup;
  readonly tabStop: GridPlace;
  readonly selected: GridPlace | null;
  /** Highest stack of any lane, so that all lanes share one scale. */
  readonly highest: number;
}

/** A home skill: its head with a small floor graphic, who comes from other groups, and its people. */
export function GroupRows({ group, tabStop, selected, highest }: Props) {
  return (
    <tbody>
      <GroupHead group={group} highest={highest} />
      {group.visits.length > 0 ? <VisitRow visits={group.visits} /> : null}
      {group.rows.map((row) => (
        <PersonRowView
          key={row.person.id}
          row={row}
          tabColumn={tabStop.row === row.index ? tabStop.column : null}
          selectedColumn={selected?.row === row.index ? selected.column : null}
        />
      ))}
    </tbody>
  );
}
